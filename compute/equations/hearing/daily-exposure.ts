import { exposureLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";
import { InputError } from "../input-error.ts";

/** The divisor stays 8 h whatever the shift. */
export const dailyExposure = equation({
  id: "daily-exposure",
  title: "daily noise exposure level",
  version: 1,
  tex: String.raw`L_{\text{EX,8h}} = 10 \lg\left( \frac{1}{8} \sum_{i=1}^{n} T_i 10^{0.1 L_i} \right)`,
  value: { symbol: String.raw`L_{\text{EX,8h}}`, unit: "dB" },
  inputs: {
    levelsDb: { kind: "many", symbol: "L_i", ...exposureLevel },
    durationsH: { kind: "many", symbol: "T_i", unit: "h", min: 0, aboveMin: true, max: 24, sameLengthAs: "levelsDb" },
  },
  source: {
    document: "ISO 9612",
    edition: "2009",
    clause: "task-based strategy; S.I. 2005/1643, Schedule 1",
    checked: "read-secondary",
  },
  refuse: ({ durationsH }) => {
    const totalH = durationsH.reduce((sum, duration) => sum + duration, 0);
    return totalH <= 24 + 1e-9
      ? undefined
      : new InputError("durationsH", totalH, "tasks of no more than 24 h together");
  },
  work: ({ levelsDb, durationsH }) =>
    10 * Math.log10(levelsDb.reduce((sum, level, i) => sum + (durationsH[i] ?? 0) * 10 ** (0.1 * level), 0) / 8),
});
