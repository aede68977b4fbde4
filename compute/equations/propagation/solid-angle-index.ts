import { height, pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Always goes with ground-effect-alternative, never with ground-effect, which holds the reflection already. */
export const solidAngleIndex = equation({
  id: "solid-angle-index",
  title: "solid-angle index near the ground",
  version: 1,
  tex: String.raw`D_{\Omega} = 10 \lg\left( 1 + \frac{d_{\text{p}}^2 + \left(h_{\text{s}} - h_{\text{r}}\right)^2}{d_{\text{p}}^2 + \left(h_{\text{s}} + h_{\text{r}}\right)^2} \right)`,
  value: { symbol: String.raw`D_{\Omega}`, unit: "dB" },
  inputs: {
    planDistanceM: { kind: "one", symbol: String.raw`d_{\text{p}}`, ...pathLength },
    sourceHeightM: { kind: "one", symbol: String.raw`h_{\text{s}}`, ...height },
    receptorHeightM: { kind: "one", symbol: String.raw`h_{\text{r}}`, ...height },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "7.3.2, eq. (11)", checked: "read-secondary" },
  work: ({ planDistanceM, sourceHeightM, receptorHeightM }) => {
    const direct = planDistanceM ** 2 + (sourceHeightM - receptorHeightM) ** 2;
    return 10 * Math.log10(1 + direct / (planDistanceM ** 2 + (sourceHeightM + receptorHeightM) ** 2));
  },
});
