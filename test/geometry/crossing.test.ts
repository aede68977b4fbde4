import { describe, expect, test } from "vitest";
import { crossing } from "../../compute/geometry/crossing.ts";
import { TIE_M } from "../../compute/geometry/place.ts";

const at = (xM: number, yM: number) => ({ xM, yM });

// [derived] All of these follow from the drawing: shares are read off the coordinates.
describe("crossing of two segments", () => {
  test("shares along each", () => {
    expect(crossing(at(0, 0), at(4, 0), at(1, -1), at(1, 3))).toEqual({ onFirst: 0.25, onSecond: 0.25 });
    expect(crossing(at(4, 0), at(0, 0), at(1, 3), at(1, -1))).toEqual({ onFirst: 0.75, onSecond: 0.75 });
  });
  test("touching an end counts, at either segment", () => {
    expect(crossing(at(0, 0), at(4, 0), at(2, 0), at(2, 5))).toEqual({ onFirst: 0.5, onSecond: 0 });
    expect(crossing(at(0, 0), at(4, 0), at(4, -1), at(4, 1))).toEqual({ onFirst: 1, onSecond: 0.5 });
    expect(crossing(at(0, 0), at(4, 0), at(4, 0), at(4, 1))).toEqual({ onFirst: 1, onSecond: 0 });
  });
  test("a gap up to the tie counts as touching, whatever the lengths; a wider one does not", () => {
    for (const lengthM of [1, 100, 10000]) {
      const meets = (gapM: number) => crossing(at(0, 0), at(10, 0), at(5, gapM), at(5, lengthM)) !== undefined;
      expect([meets(0.9 * TIE_M), meets(1.1 * TIE_M)]).toEqual([true, false]);
      const reaches = (gapM: number) =>
        crossing(at(0, 0), at(lengthM, 0), at(lengthM + gapM, -1), at(lengthM + gapM, 1)) !== undefined;
      expect([reaches(0.9 * TIE_M), reaches(1.1 * TIE_M)]).toEqual([true, false]);
    }
  });
  test("parallel segments do not cross, on one line or beside each other; nor does a point", () => {
    expect(crossing(at(0, 0), at(4, 0), at(2, 0), at(6, 0))).toBeUndefined();
    expect(crossing(at(0, 0), at(4, 0), at(0, 1), at(4, 1))).toBeUndefined();
    expect(crossing(at(0, 0), at(3, 3), at(1, 1), at(2, 2))).toBeUndefined();
    expect(crossing(at(2, 2), at(2, 2), at(0, 0), at(4, 4))).toBeUndefined();
  });
  test("lines that would cross beyond an end do not", () => {
    expect(crossing(at(0, 0), at(4, 0), at(5, -1), at(5, 1))).toBeUndefined();
    expect(crossing(at(0, 0), at(4, 0), at(2, 1), at(2, 3))).toBeUndefined();
  });
});
