import { exposureLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";
import { InputError } from "../input-error.ts";

/** The divisor stays five days, however many are worked. */
export const weeklyExposure = equation({
  id: "weekly-exposure",
  title: "weekly noise exposure level",
  version: 1,
  tex: String.raw`L_{\text{EX,w}} = 10 \lg\left( \frac{1}{5} \sum_{i=1}^{m} 10^{0.1 L_i} \right)`,
  value: { symbol: String.raw`L_{\text{EX,w}}`, unit: "dB" },
  inputs: { dailyDb: { kind: "many", symbol: "L_i", ...exposureLevel } },
  source: { document: "S.I. 2005/1643", edition: "2005", clause: "Schedule 1, Part 2", checked: "memory" },
  refuse: ({ dailyDb }) =>
    dailyDb.length <= 7 ? undefined : new InputError("dailyDb", dailyDb.length, "the exposures of no more than 7 days"),
  work: ({ dailyDb }) => 10 * Math.log10(dailyDb.reduce((sum, level) => sum + 10 ** (0.1 * level), 0) / 5),
});
