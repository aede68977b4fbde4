import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";
import { InputError } from "../input-error.ts";

/** Spans may overlap, so that machines running at the same time add up; none may be longer than the period. */
export const averageLevel = equation({
  id: "average-level",
  title: "equivalent level over a period",
  version: 1,
  tex: String.raw`L_{\text{eq}} = 10 \lg\left( \frac{1}{T} \sum_{i=1}^{n} t_i 10^{0.1 L_i} \right)`,
  value: { symbol: String.raw`L_{\text{eq}}`, unit: "dB" },
  inputs: {
    levelsDb: { kind: "many", symbol: "L_i", ...anyLevel },
    durationsH: { kind: "many", symbol: "t_i", unit: "h", min: 0, aboveMin: true, max: 8784, sameLengthAs: "levelsDb" },
    periodH: { kind: "one", symbol: "T", unit: "h", min: 0, aboveMin: true, max: 8784 },
  },
  source: {
    document: "ISO 1996-1",
    edition: "2016",
    clause: "equivalent continuous sound pressure level",
    checked: "derived",
  },
  refuse: ({ durationsH, periodH }) => {
    const index = durationsH.findIndex((duration) => duration > periodH);
    return index < 0
      ? undefined
      : new InputError(`durationsH[${index}]`, durationsH[index], `a span no longer than periodH (${periodH} h)`);
  },
  work: ({ levelsDb, durationsH, periodH }) =>
    10 * Math.log10(levelsDb.reduce((sum, level, i) => sum + (durationsH[i] ?? 0) * 10 ** (0.1 * level), 0) / periodH),
});
