import { anyLevel, pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const pointSourceLevel = equation({
  id: "point-source-level",
  title: "level of a point source at a distance",
  version: 1,
  tex: String.raw`L_p = L_W + 10 \lg \frac{Q}{4 \pi r^2}`,
  value: { symbol: "L_p", unit: "dB" },
  inputs: {
    powerDb: { kind: "one", symbol: "L_W", ...anyLevel },
    distanceM: { kind: "one", symbol: "r", ...pathLength },
    directivityFactor: { kind: "one", symbol: "Q", unit: "1", min: 1, max: 8, oneOf: [1, 2, 4, 8], decimals: 0 },
  },
  source: {
    document: "ISO/TR 25417",
    edition: "2007",
    clause: "definition of the levels; power spread over the sphere",
    checked: "derived",
  },
  work: ({ powerDb, distanceM, directivityFactor }) =>
    powerDb + 10 * Math.log10(directivityFactor / (4 * Math.PI * distanceM ** 2)),
});
