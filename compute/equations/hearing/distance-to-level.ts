import { pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Point source outdoors over hard ground; not inside the near field, not indoors, not in trenches. */
export const distanceToLevel = equation({
  id: "distance-to-level",
  title: "distance at which a level is reached",
  version: 1,
  tex: String.raw`r = r_0 10^{\left(L_0 - L_{\text{t}}\right)/20}`,
  value: { symbol: "r", unit: "m" },
  inputs: {
    levelDb: { kind: "one", symbol: "L_0", unit: "dB", min: 0, max: 160 },
    atDistanceM: { kind: "one", symbol: "r_0", ...pathLength },
    targetDb: { kind: "one", symbol: String.raw`L_{\text{t}}`, unit: "dB", min: 0, max: 160 },
  },
  source: {
    document: "Stillboard",
    edition: "own rule",
    clause: "point source law, solved for the distance",
    checked: "derived",
  },
  work: ({ levelDb, atDistanceM, targetDb }) => atDistanceM * 10 ** ((levelDb - targetDb) / 20),
});
