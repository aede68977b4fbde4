import { describe, expect, test } from "vitest";
import { BANDS_HZ } from "../../compute/acoustics/bands.ts";
import type { Way } from "../../compute/acoustics/obstacles/way.ts";
import { detourM } from "../../compute/acoustics/obstacles/way.ts";
import { screenLossDb } from "../../compute/acoustics/screen-loss.ts";
import { silently } from "../../compute/equations/working.ts";
import { expectCheckValue } from "../helpers/check-value.ts";

// The wall of the check values: source 1.5 m, top 3 m at 10 m, receptor point 1.5 m at 30 m beyond; 20 m long where it ends.
const over: Way = {
  kind: "over",
  obstacles: ["wall"],
  edgeCount: 1,
  sourceToEdgeM: Math.sqrt(102.25),
  betweenEdgesM: 0,
  edgeToReceptorM: Math.sqrt(902.25),
  alongEdgeM: 0,
  sightBlocked: true,
};
const round: Way = { ...over, kind: "left", sourceToEdgeM: Math.sqrt(200), edgeToReceptorM: Math.sqrt(1000) };
const lossDb = (path: Way, distanceM: number) =>
  BANDS_HZ.map((bandHz) => screenLossDb(silently, path, distanceM, bandHz));

describe("loss past an edge", () => {
  test("over one edge", () => {
    expectCheckValue("bar-z", detourM(over, 40));
    expectCheckValue("bar-dz-single", lossDb(over, 40));
  });
  test("over two edges 5 m apart, capped at 25 dB", () => {
    // [derived] bar-dz-double keeps z of the thin wall: the straight line is 5 m longer too.
    expectCheckValue("bar-dz-double", lossDb({ ...over, betweenEdgesM: 5, edgeCount: 2 }, 45));
  });
  test("round a vertical edge: no weather factor, capped at 20 dB", () => {
    expectCheckValue("bar-lateral-z", detourM(round, 40));
    // [derived] dossier 5.5 prints 13.87, 16.57, 19.43, then the cap.
    const hand = [13.87, 16.57, 19.43, 20, 20, 20, 20, 20];
    for (const [band, value] of lossDb(round, 40).entries())
      expect(Math.abs(value - (hand[band] ?? 0))).toBeLessThanOrEqual(0.005);
  });
  test("at grazing is 10 lg 3 in every band", () => {
    const grazing = lossDb({ ...over, sourceToEdgeM: 10, edgeToReceptorM: 30 }, 40);
    for (const value of grazing) expectCheckValue("bar-grazing", value);
  });
  test("above the edge falls to nothing at z = −λ/10 and stays there", () => {
    // [derived] z = −0.0085 m: 3 − 20·0.0085·f/340 = 3 − f/2000, so 10 lg 2.9685, 2.9375, 2.875, 2.75, 2.5, 2, 1 and, below 1, 0.
    const lengthM = 40 + 0.0085;
    const clear = { ...over, sourceToEdgeM: lengthM / 4, edgeToReceptorM: (3 * lengthM) / 4, sightBlocked: false };
    const hand = [2.9685, 2.9375, 2.875, 2.75, 2.5, 2, 1, 1].map((argument) => 10 * Math.log10(argument));
    for (const [band, value] of lossDb(clear, 40).entries()) expect(value).toBeCloseTo(hand[band] ?? Number.NaN, 9);
  });
});
