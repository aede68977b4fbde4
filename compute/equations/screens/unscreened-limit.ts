import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Level of one path past a screen, lowered with its fellows so that together they never exceed the unscreened level. */
export const unscreenedLimit = equation({
  id: "unscreened-limit",
  title: "level past a screen, never above the unscreened level",
  version: 1,
  tex: String.raw`L' = L - \max\left(0,\; 10 \lg \sum_{i=1}^{n} 10^{0.1 L_i} - L_0\right)`,
  value: { symbol: "L'", unit: "dB", decimals: 1 },
  inputs: {
    levelDb: { kind: "one", symbol: "L", ...anyLevel, decimals: 1 },
    pathLevelsDb: { kind: "many", symbol: "L_i", ...anyLevel, decimals: 1 },
    unscreenedDb: { kind: "one", symbol: "L_0", ...anyLevel, decimals: 1 },
  },
  source: {
    document: "ISO 9613-2",
    edition: "1996",
    clause: "7.4, with the rule of ISO/TR 17534-3:2015, 5.6 that screening never raises a level",
    checked: "read-secondary",
  },
  work: ({ levelDb, pathLevelsDb, unscreenedDb }) => {
    const together = 10 * Math.log10(pathLevelsDb.reduce((sum, level) => sum + 10 ** (0.1 * level), 0));
    return levelDb - Math.max(0, together - unscreenedDb);
  },
});
