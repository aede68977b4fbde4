import { reductionIndex } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** A gap counts with index 0. */
export const compositeIndex = equation({
  id: "composite-index",
  title: "sound reduction index of several parts together",
  version: 1,
  tex: String.raw`R = -10 \lg \frac{\sum_{i=1}^{n} S_i 10^{-0.1 R_i}}{\sum_{i=1}^{n} S_i}`,
  value: { symbol: "R", unit: "dB" },
  inputs: {
    areasM2: { kind: "many", symbol: "S_i", unit: "m²", min: 0, aboveMin: true, max: 100000 },
    reductionIndexesDb: { kind: "many", symbol: "R_i", ...reductionIndex, sameLengthAs: "areasM2" },
  },
  source: { document: "Hopkins, Sound Insulation", edition: "2007", clause: "eq. (4.92)", checked: "read-secondary" },
  work: ({ areasM2, reductionIndexesDb }) => {
    const passed = areasM2.reduce((sum, area, i) => sum + area * 10 ** (-0.1 * (reductionIndexesDb[i] ?? 0)), 0);
    return -10 * Math.log10(passed / areasM2.reduce((sum, area) => sum + area, 0));
  },
});
