import { anyLevel, pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const powerOfPressure = equation({
  id: "power-of-pressure",
  title: "sound power level from a level at a distance",
  version: 1,
  tex: String.raw`L_W = L_p - 10 \lg \frac{Q}{4 \pi r^2}`,
  value: { symbol: "L_W", unit: "dB" },
  inputs: {
    levelDb: { kind: "one", symbol: "L_p", ...anyLevel },
    distanceM: { kind: "one", symbol: "r", ...pathLength },
    directivityFactor: { kind: "one", symbol: "Q", unit: "1", min: 1, max: 8, oneOf: [1, 2, 4, 8], decimals: 0 },
  },
  source: {
    document: "ISO/TR 25417",
    edition: "2007",
    clause: "definition of the levels; power spread over the sphere",
    checked: "derived",
  },
  work: ({ levelDb, distanceM, directivityFactor }) =>
    levelDb - 10 * Math.log10(directivityFactor / (4 * Math.PI * distanceM ** 2)),
});
