import { describe, expect, test } from "vitest";
import { crossingEdges } from "../../compute/geometry/crossing-edges.ts";
import { distanceToLineM } from "../../compute/geometry/distance-to-line.ts";
import {
  distanceToOutlineM,
  distanceToSegmentM,
  isInside,
  isInsideOrOnEdge,
  outlineCrossings,
  rectangle,
  sides,
} from "../../compute/geometry/outline.ts";
import { along, lineLengthM, planDistanceM, side } from "../../compute/geometry/place.ts";

const at = (xM: number, yM: number) => ({ xM, yM });
// [derived] An L of two arms, 2 m wide and 4 m long.
const CORNER = [at(0, 0), at(4, 0), at(4, 2), at(2, 2), at(2, 4), at(0, 4)];

describe("an L", () => {
  test("has as many sides as corners, the last back to the first", () => {
    expect(sides(CORNER)).toHaveLength(6);
    expect(sides(CORNER).at(-1)).toEqual([at(0, 4), at(0, 0)]);
  });
  test("holds both arms and not the notch", () => {
    expect([at(1, 1), at(3, 1), at(1, 3)].map((place) => isInside(place, CORNER))).toEqual([true, true, true]);
    expect([at(3, 3), at(5, 1), at(-1, 1), at(2.001, 3)].map((place) => isInside(place, CORNER))).toEqual([
      false,
      false,
      false,
      false,
    ]);
  });
  test("holds its edges and corners where the edge counts", () => {
    expect([at(4, 1), at(2, 3), at(0, 0), at(2, 2)].map((place) => isInsideOrOnEdge(place, CORNER))).toEqual([
      true,
      true,
      true,
      true,
    ]);
    expect([at(4.001, 1), at(3, 3)].map((place) => isInsideOrOnEdge(place, CORNER))).toEqual([false, false]);
  });
  test("gives each place to one of two outlines that share an edge, never to both or neither", () => {
    const left = [at(0, 0), at(2, 0), at(2, 4), at(0, 4)];
    const right = [at(2, 0), at(4, 0), at(4, 4), at(2, 4)];
    for (const place of [at(2, 1), at(2, 0), at(2, 3.999)])
      expect([left, right].filter((outline) => isInside(place, outline))).toHaveLength(1);
  });
  test("does not cross itself, in either direction; an hourglass does", () => {
    expect(crossingEdges(CORNER)).toBeUndefined();
    expect(crossingEdges([...CORNER].reverse())).toBeUndefined();
    expect(crossingEdges([at(0, 0), at(2, 2), at(2, 0), at(0, 2)])).toEqual([0, 2]);
  });
});

test("a corner that touches another edge counts as crossing, a corner on a straight run does not", () => {
  expect(crossingEdges([at(0, 0), at(4, 0), at(4, 4), at(2, 0), at(0, 4)])).toEqual([0, 2]);
  expect(crossingEdges([at(0, 0), at(2, 0), at(4, 0), at(4, 4)])).toBeUndefined();
});

test("an edge that runs straight back along the one before counts as crossing", () => {
  expect(crossingEdges([at(0, 0), at(4, 0), at(2, 0), at(2, 3)])).toEqual([0, 1]);
});

describe("distances", () => {
  // [derived] 3-4-5 triangles beyond an end; the foot of the perpendicular beside a piece.
  test("to a segment: beside it, beyond either end, and to a segment that is a point", () => {
    expect(distanceToSegmentM(at(5, 2), at(0, 0), at(10, 0))).toBe(2);
    expect(distanceToSegmentM(at(13, 4), at(0, 0), at(10, 0))).toBe(5);
    expect(distanceToSegmentM(at(-3, -4), at(0, 0), at(10, 0))).toBe(5);
    expect(distanceToSegmentM(at(3, 4), at(0, 0), at(0, 0))).toBe(5);
  });
  test("to a line of two pieces", () => {
    const line = [at(0, 0), at(10, 0), at(10, 10)];
    expect(distanceToLineM(at(13, 14), line)).toBe(5);
    expect(distanceToLineM(at(5, -1), line)).toBe(1);
    expect(lineLengthM(line)).toBe(20);
  });
  test("to an outline: 0 inside, else to the nearest side or corner", () => {
    expect(distanceToOutlineM(at(1, 3), CORNER)).toBe(0);
    expect(distanceToOutlineM(at(3, 3), CORNER)).toBe(1);
    expect(distanceToOutlineM(at(7, 6), CORNER)).toBe(5);
  });
  test("on the plane, and the position at a share of the way", () => {
    expect(planDistanceM(at(1, 2), at(4, 6))).toBe(5);
    expect(along(at(1, 2), at(5, 10), 0.25)).toEqual(at(2, 4));
  });
});

test("left of a line is above 0, right below, twice the area of the triangle", () => {
  expect(side(at(0, 0), at(4, 0), at(1, 3))).toBe(12);
  expect(side(at(0, 0), at(4, 0), at(1, -3))).toBe(-12);
  expect(side(at(0, 0), at(4, 0), at(9, 0))).toBe(0);
});

describe("a rectangle round a position", () => {
  const near = (corners: readonly { xM: number; yM: number }[]) =>
    corners.map(({ xM, yM }) => [Math.round(xM * 1e6) / 1e6, Math.round(yM * 1e6) / 1e6]);
  // [derived] Bearings run clockwise from north, so a length of 4 m at 0° spans y, at 90° spans x.
  test("bearing 0: length along north", () => {
    expect(near(rectangle(at(10, 20), 4, 2, 0))).toEqual([
      [9, 22],
      [11, 22],
      [11, 18],
      [9, 18],
    ]);
  });
  test("bearing 90: length along east", () => {
    expect(near(rectangle(at(10, 20), 4, 2, 90))).toEqual([
      [12, 21],
      [12, 19],
      [8, 19],
      [8, 21],
    ]);
  });
  test("bearing 30: the middle of the front lies half the length along 30°", () => {
    const [left, right] = rectangle(at(0, 0), 4, 2, 30);
    // [derived] 2·(sin 30°, cos 30°) = (1, √3).
    expect(((left?.xM ?? 0) + (right?.xM ?? 0)) / 2).toBeCloseTo(1, 12);
    expect(((left?.yM ?? 0) + (right?.yM ?? 0)) / 2).toBeCloseTo(Math.sqrt(3), 12);
  });
});

test("a line through a square crosses its outline at a quarter and three quarters of the way", () => {
  const square = [at(1, -1), at(3, -1), at(3, 1), at(1, 1)];
  expect(outlineCrossings(at(0, 0), at(4, 0), square)).toEqual([0.25, 0.75]);
  expect(outlineCrossings(at(4, 0), at(0, 0), square)).toEqual([0.25, 0.75]);
  expect(outlineCrossings(at(2, 0), at(4, 0), square)).toEqual([0.5]);
  expect(outlineCrossings(at(0, 2), at(4, 2), square)).toEqual([]);
});
