import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const aWeightedSum = equation({
  id: "a-weighted-sum",
  title: "A-weighted sum of octave band levels",
  version: 1,
  tex: String.raw`L_{\text{A}} = 10 \lg \sum_{j=1}^{n} 10^{0.1 \left(L_j + A_j\right)}`,
  value: { symbol: String.raw`L_{\text{A}}`, unit: "dB" },
  inputs: {
    levelsDb: { kind: "many", symbol: "L_j", ...anyLevel },
    weightsDb: { kind: "many", symbol: "A_j", unit: "dB", min: -80, max: 5, sameLengthAs: "levelsDb" },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "6, eq. (5), one source and path", checked: "memory" },
  work: ({ levelsDb, weightsDb }) =>
    10 * Math.log10(levelsDb.reduce((sum, level, j) => sum + 10 ** (0.1 * (level + (weightsDb[j] ?? 0))), 0)),
});
