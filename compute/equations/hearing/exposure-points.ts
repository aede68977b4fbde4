import { exposureLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** British duty set only. */
export const exposurePoints = equation({
  id: "exposure-points",
  title: "exposure points: 100 for 85 dB(A) over 8 h",
  version: 1,
  tex: String.raw`P = 100 \cdot \frac{T}{8} \cdot 10^{\left(L - 85\right)/10}`,
  value: { symbol: "P", unit: "1", decimals: 0 },
  inputs: {
    levelDb: { kind: "one", symbol: "L", ...exposureLevel },
    durationH: { kind: "one", symbol: "T", unit: "h", min: 0, aboveMin: true, max: 24 },
  },
  source: {
    document: "HSE noise exposure ready-reckoners",
    edition: "2020",
    clause: "daily and weekly points",
    checked: "read",
  },
  work: ({ levelDb, durationH }) => 100 * (durationH / 8) * 10 ** ((levelDb - 85) / 10),
});
