import { describe, expect, test } from "vitest";
import { silently } from "../../compute/equations/working.ts";
import { goodPracticeCounts, valueEdgeDba, zoneEdgeDba } from "../../compute/hearing/edge-level.ts";

// [derived] design.md 7: edge = value − K lg(max(shift, 8)/8) − U, K = 10 for equal energy, q/lg 2 for an exchange rate q.
const ENERGY = { kind: "equal-energy" } as const;
const FIVE = { kind: "exchange-rate", rateDb: 5 } as const;
const shift = (shiftH: number, uncertaintyDb = 3) => ({ shiftH, uncertaintyDb });

describe("level at which a value is met over the shift", () => {
  test.each([
    [85, 8, 82],
    [85, 4, 82],
    [85, 9.5, 81.25366],
    [85, 12, 80.23909],
    [80, 12, 75.23909],
  ])("equal energy: %d dB(A), shift %d h: %d", (valueDba, shiftH, hand) => {
    expect(valueEdgeDba(silently, valueDba, ENERGY, shift(shiftH))).toBeCloseTo(hand, 5);
  });
  test.each([
    // K = 5/lg 2 = 16.60964; lg 1.5 = 0.176091; K·lg 1.5 = 2.92481.
    [90, 12, 84.07519],
    [90, 8, 87],
    [85, 12, 79.07519],
  ])("5 dB for each halving: %d dB(A), shift %d h: %d", (valueDba, shiftH, hand) => {
    expect(valueEdgeDba(silently, valueDba, FIVE, shift(shiftH))).toBeCloseTo(hand, 5);
  });
  test("3 dB for each halving is almost equal energy: 12 h cost 1.7549 dB, not 1.7609", () => {
    expect(valueEdgeDba(silently, 85, { kind: "exchange-rate", rateDb: 3 }, shift(12))).toBeCloseTo(85 - 1.7549 - 3, 4);
  });
  test("a larger uncertainty lowers it", () => {
    expect(valueEdgeDba(silently, 85, ENERGY, shift(8, 5))).toBe(80);
  });
  test("an uncertainty under 3 dB is refused", () => {
    expect(() => valueEdgeDba(silently, 85, ENERGY, shift(8, 2.9))).toThrowError(
      /^uncertaintyDb: expected .*3.*, received 2.9/,
    );
  });
});

describe("edge of the zone", () => {
  test.each([
    ["the law's 85 stands alone", 85, 8, 82],
    ["the law's 80 stands alone", 80, 8, 77],
    ["without a law 85 stands as good practice", undefined, 8, 82],
    ["a law at 87 does not keep the zone smaller", 87, 8, 82],
    ["a law at 90 neither, over a long shift", 90, 12, 80.23909],
  ])("%s", (_, lawDba, shiftH, hand) => {
    expect(zoneEdgeDba(silently, lawDba, ENERGY, shift(shiftH))).toBeCloseTo(hand, 5);
  });
  test("a law at 90 with 5 dB per halving: the lower of 84.07519 and, as good practice by equal energy, 80.23909", () => {
    expect(zoneEdgeDba(silently, 90, FIVE, shift(12))).toBeCloseTo(80.23909, 5);
  });
  test("a law at 86 with 5 dB per halving over 24 h lies lower than 85 by equal energy", () => {
    // K·lg 3 = 7.92481 against 4.77121: 86 − 7.92481 − 3 = 75.07519, 85 − 4.77121 − 3 = 77.22879.
    expect(zoneEdgeDba(silently, 86, FIVE, shift(24))).toBeCloseTo(75.07519, 5);
  });
  test("good practice counts without a value and above 85, not at it", () => {
    expect([undefined, 80, 85, 85.1, 90].map(goodPracticeCounts)).toEqual([true, false, false, true, true]);
  });
});
