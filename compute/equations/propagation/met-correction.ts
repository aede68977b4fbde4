import { height } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Subtracted from the A-weighted total for a long-term average; 0 for downwind levels. */
export const metCorrection = equation({
  id: "met-correction",
  title: "meteorological correction",
  version: 1,
  tex: String.raw`C_{\text{met}} = \begin{cases} 0 & d_{\text{p}} \le 10 \left(h_{\text{s}} + h_{\text{r}}\right) \\ C_0 \left( 1 - \frac{10 \left(h_{\text{s}} + h_{\text{r}}\right)}{d_{\text{p}}} \right) & d_{\text{p}} > 10 \left(h_{\text{s}} + h_{\text{r}}\right) \end{cases}`,
  value: { symbol: String.raw`C_{\text{met}}`, unit: "dB" },
  inputs: {
    planDistanceM: { kind: "one", symbol: String.raw`d_{\text{p}}`, unit: "m", min: 0, max: 10000 },
    sourceHeightM: { kind: "one", symbol: String.raw`h_{\text{s}}`, ...height },
    receptorHeightM: { kind: "one", symbol: String.raw`h_{\text{r}}`, ...height },
    c0Db: { kind: "one", symbol: "C_0", unit: "dB", min: 0, max: 5 },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "8, eqs. (21) and (22)", checked: "read-secondary" },
  work: ({ planDistanceM, sourceHeightM, receptorHeightM, c0Db }) => {
    const nearM = 10 * (sourceHeightM + receptorHeightM);
    return planDistanceM <= nearM ? 0 : c0Db * (1 - nearM / planDistanceM);
  },
});
