import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const sumLevels = equation({
  id: "sum-levels",
  title: "energetic sum of levels",
  version: 1,
  tex: String.raw`L = 10 \lg \sum_{i=1}^{n} 10^{0.1 L_i}`,
  value: { symbol: "L", unit: "dB" },
  inputs: { levelsDb: { kind: "many", symbol: "L_i", ...anyLevel } },
  source: {
    document: "ISO/TR 25417",
    edition: "2007",
    clause: "definition of the level, energies added",
    checked: "derived",
  },
  work: ({ levelsDb }) => 10 * Math.log10(levelsDb.reduce((sum, level) => sum + 10 ** (0.1 * level), 0)),
});
