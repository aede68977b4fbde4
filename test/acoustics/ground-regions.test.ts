import { describe, expect, test } from "vitest";
import { groundFactors } from "../../compute/acoustics/ground-regions.ts";
import type { Ground } from "../../compute/acoustics/site.ts";
import { silently } from "../../compute/equations/working.ts";

// [derived] ISO 9613-2:1996, 7.3.1: source region 30·hs from the source, receptor region 30·hr from the receptor point, the rest
// between; the share of each length is read off the drawing. All paths run along y = 0 from x = 0.
const strip = (fromM: number, toM: number, groundFactor: number) => ({
  outline: [
    { xM: fromM, yM: -10 },
    { xM: toM, yM: -10 },
    { xM: toM, yM: 10 },
    { xM: fromM, yM: 10 },
  ],
  groundFactor,
});
const factors = (areas: Ground["areas"], lengthM: number, sourceM = 1, receptorM = 1, elsewhere = 0) => {
  const { source, middle, receptor } = groundFactors(
    silently,
    { elsewhere, areas },
    { lengthM, legs: [{ fromShare: 0, toShare: 1, from: { xM: 0, yM: 0 }, to: { xM: lengthM, yM: 0 } }] },
    sourceM,
    receptorM,
  );
  return [source, middle, receptor].map((factor) => Number(factor.toFixed(12)));
};
const third = Number((1 / 3).toFixed(12));

describe("ground factors of the three regions", () => {
  test("of one ground are that ground's", () => {
    expect(factors([], 100, 1, 1, 0.3)).toEqual([0.3, 0.3, 0.3]);
  });
  test("are shares of length: 20 to 50 m lies 10 m in the first 30, 20 m in the middle 40", () => {
    expect(factors([strip(20, 50, 1)], 100)).toEqual([third, 0.5, 0]);
  });
  test("mix what areas and the ground elsewhere give: (10·0.6 + 20·0.3)/30 at the source", () => {
    expect(factors([strip(20, 50, 0.6)], 100, 1, 1, 0.3)).toEqual([0.4, 0.45, 0.3]);
  });
  test("an area that ends where a region ends belongs to one region only", () => {
    expect(factors([strip(30, 70, 1)], 100)).toEqual([0, 1, 0]);
    expect(factors([strip(0, 30, 1)], 100)).toEqual([1, 0, 0]);
    expect(factors([strip(70, 100, 1)], 100)).toEqual([0, 0, 1]);
  });
  test("of two areas that overlap the later counts", () => {
    const [wide, narrow] = [strip(30, 70, 1), strip(40, 60, 0.2)];
    // [derived] (20·1 + 20·0.2)/40.
    expect(factors([wide, narrow], 100)).toEqual([0, 0.6, 0]);
    expect(factors([narrow, wide], 100)).toEqual([0, 1, 0]);
  });
  test("regions that overlap each take their own length; no middle region is left", () => {
    // [derived] 40 m: source region 0–30, receptor region 10–40; grass 20–40.
    expect(factors([strip(20, 40, 1)], 40)).toEqual([third, 0, Number((2 / 3).toFixed(12))]);
  });
  test("a region is never longer than the way: 20 m at heights of 1 m is all source and all receptor region", () => {
    expect(factors([strip(5, 15, 1)], 20)).toEqual([0.5, 0, 0.5]);
  });
  test("regions that just meet leave no middle region", () => {
    expect(factors([strip(0, 60, 1)], 60)).toEqual([1, 0, 1]);
  });
  test("at height 0 the region has no length and takes the ground under the point", () => {
    expect(factors([strip(-5, 5, 1)], 100, 0, 1)).toEqual([1, Number((5 / 70).toFixed(12)), 0]);
    expect(factors([strip(95, 105, 0.8)], 100, 1, 0)).toEqual([0, Number(((5 * 0.8) / 70).toFixed(12)), 0.8]);
  });
  test("an area that is left and entered again counts each time", () => {
    // [derived] A comb open to the north: teeth 35–45 and 55–65 on the line, 20 m of the middle 40.
    const comb = [
      [35, -10],
      [65, -10],
      [65, 10],
      [55, 10],
      [55, -5],
      [45, -5],
      [45, 10],
      [35, 10],
    ].map(([xM = 0, yM = 0]) => ({ xM, yM }));
    expect(factors([{ outline: comb, groundFactor: 1 }], 100)).toEqual([0, 0.5, 0]);
  });
  test("a corner that only touches the line adds nothing", () => {
    const corner = [
      { xM: 50, yM: 0 },
      { xM: 60, yM: 10 },
      { xM: 40, yM: 10 },
    ];
    expect(factors([{ outline: corner, groundFactor: 1 }], 100)).toEqual([0, 0, 0]);
  });
  test("straight above the source the ground under it counts at both ends", () => {
    expect(factors([strip(-5, 5, 0.7)], 0, 1, 5)).toEqual([0.7, 0, 0.7]);
  });
});
