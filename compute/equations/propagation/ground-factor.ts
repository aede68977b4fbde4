import { groundFactor as range } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** The standard leaves the mean over a region open; ISO/TR 17534-3:2015, 6.2.5 settles it. */
export const groundFactor = equation({
  id: "ground-factor",
  title: "ground factor of a region with several surfaces",
  version: 1,
  tex: String.raw`G = \frac{\sum_{i=1}^{n} l_i G_i}{\sum_{i=1}^{n} l_i}`,
  value: { symbol: "G", unit: "1" },
  inputs: {
    lengthsM: { kind: "many", symbol: "l_i", unit: "m", min: 0, aboveMin: true, max: 10000 },
    groundFactors: { kind: "many", symbol: "G_i", ...range, sameLengthAs: "lengthsM" },
  },
  source: { document: "ISO/TR 17534-3", edition: "2015", clause: "6.2.5, mean by length", checked: "memory" },
  work: ({ lengthsM, groundFactors }) => {
    const weighted = lengthsM.reduce((sum, length, i) => sum + length * (groundFactors[i] ?? 0), 0);
    return weighted / lengthsM.reduce((sum, length) => sum + length, 0);
  },
});
