import { describe, expect, test } from "vitest";
import { decimals, levelBesideLimit, standing, tenthDb, wholeDb, zoneMetres } from "../../compute/figures/display.ts";

// [derived] Rounding done by hand: halves away from zero; a true minus sign (U+2212).
describe("decimals", () => {
  test.each([
    [64.44, 1, "64.4"],
    [64.45, 1, "64.5"],
    [64.449999, 1, "64.4"],
    [-64.45, 1, "−64.5"],
    [0.25, 1, "0.3"],
    [0.35, 1, "0.4"],
    [1.005, 2, "1.01"],
    [2.675, 2, "2.68"],
    [8.345, 2, "8.35"],
    [79.5, 0, "80"],
    [80.5, 0, "81"],
    [-0.5, 0, "−1"],
    [74.949999999, 1, "74.9"],
    [0, 1, "0.0"],
    [1e6 + 0.05, 1, "1000000.1"],
  ])("%d to %d places is %s", (value, places, text) => {
    expect(decimals(value, places)).toBe(text);
  });
  test("every tenth and half between −120 and 120 rounds as printed by hand", () => {
    for (let twentieths = -2400; twentieths <= 2400; twentieths++) {
      const value = twentieths / 20;
      const tenths = Math.sign(twentieths) * Math.floor((Math.abs(twentieths) + 1) / 2);
      const hand = `${Math.floor(Math.abs(tenths) / 10)}.${Math.abs(tenths) % 10}`;
      expect(decimals(value, 1)).toBe(tenths < 0 ? `−${hand}` : hand);
    }
  });
  test("never prints a minus before zero", () => {
    expect([decimals(-0.04, 1), decimals(-0, 1), decimals(-0.4, 0)]).toEqual(["0.0", "0.0", "0"]);
    expect(decimals(-0.05, 1)).toBe("−0.1");
  });
  test("refuses what is no number", () => {
    expect(() => decimals(Number.NaN, 1)).toThrowError("a page cannot print NaN");
    expect(() => decimals(Number.NEGATIVE_INFINITY, 1)).toThrowError("a page cannot print -Infinity");
  });
  test("whole decibels and tenths", () => {
    expect([wholeDb(74.5), wholeDb(74.49), tenthDb(74.449), tenthDb(-3.25)]).toEqual(["75", "74", "74.4", "−3.3"]);
  });
});

describe("metres of a zone", () => {
  test.each([
    [0.2, 1],
    [1, 1],
    [1.0000001, 1],
    [1.001, 2],
    [7.1, 8],
    [12.000002, 13],
  ])("%d m is marked at %d m", (distanceM, metres) => {
    expect(zoneMetres(distanceM)).toBe(metres);
  });
});

describe("how a level stands to its limit", () => {
  test.each([
    [75, "above", { kind: "at" }],
    [75, "at-or-above", { kind: "just-over", by: "0.1" }],
    [75.04, "above", { kind: "just-over", by: "0.1" }],
    [75.05, "above", { kind: "over", by: "0.1" }],
    [75.0000001, "above", { kind: "just-over", by: "0.1" }],
    [74.96, "above", { kind: "just-below", by: "0.1" }],
    [74.94, "above", { kind: "below", by: "0.1" }],
    [78.25, "above", { kind: "over", by: "3.3" }],
    [71.75, "at-or-above", { kind: "below", by: "3.3" }],
  ] as const)("%d against 75, %s", (levelDb, comparator, hand) => {
    expect(standing(levelDb, 75, comparator)).toEqual(hand);
  });
});

describe("a level beside its limit", () => {
  test.each([
    [75.04, 75, "above", 1, { text: "75.0", justOver: true }],
    [75.05, 75, "above", 1, { text: "75.1", justOver: false }],
    [75.4, 75, "above", 0, { text: "75", justOver: true }],
    [75.5, 75, "above", 0, { text: "76", justOver: false }],
    [75, 75, "above", 1, { text: "75.0", justOver: false }],
    [75, 75, "at-or-above", 1, { text: "75.0", justOver: true }],
    [74.96, 75, "above", 1, { text: "75.0", justOver: false }],
    [74.4, 75, "above", 0, { text: "74", justOver: false }],
    [-0.01, -0.04, "above", 1, { text: "0.0", justOver: false }],
  ] as const)("%d against %d, %s, %d places", (levelDb, limitDb, comparator, places, hand) => {
    expect(levelBesideLimit(levelDb, limitDb, comparator, places)).toEqual(hand);
  });
  test("a level over its limit is never printed as the limit or less without the words", () => {
    for (let thousandths = 1; thousandths <= 2000; thousandths++) {
      for (const places of [0, 1] as const) {
        const { text, justOver } = levelBesideLimit(65 + thousandths / 1000, 65, "above", places);
        expect(justOver || Number(text) > 65).toBe(true);
      }
    }
  });
});
