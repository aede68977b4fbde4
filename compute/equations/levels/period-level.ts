import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";
import { InputError } from "../input-error.ts";

export const periodLevel = equation({
  id: "period-level",
  title: "level over the period of a limit",
  version: 1,
  tex: String.raw`L_{\text{period}} = L + 10 \lg\left( \frac{t}{100} \cdot \frac{h}{H} \right)`,
  value: { symbol: String.raw`L_{\text{period}}`, unit: "dB" },
  inputs: {
    levelDb: { kind: "one", symbol: "L", ...anyLevel },
    onTimePct: { kind: "one", symbol: "t", unit: "%", min: 0, aboveMin: true, max: 100 },
    windowH: { kind: "one", symbol: "h", unit: "h", min: 0, aboveMin: true, max: 168 },
    periodH: { kind: "one", symbol: "H", unit: "h", min: 0, aboveMin: true, max: 168 },
  },
  source: { document: "Stillboard", edition: "own rule", clause: "on-time and averaging", checked: "derived" },
  refuse: ({ windowH, periodH }) =>
    windowH <= periodH
      ? undefined
      : new InputError(
          "windowH",
          windowH,
          `no more hours than periodH has (${periodH} h)`,
          "Count only the hours inside the period",
        ),
  work: ({ levelDb, onTimePct, windowH, periodH }) =>
    levelDb + 10 * Math.log10((onTimePct / 100) * (windowH / periodH)),
});
