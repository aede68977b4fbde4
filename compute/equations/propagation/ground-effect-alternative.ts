import { pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Only for A-weighted levels over mostly porous ground and no pure tones; goes with solid-angle-index. */
export const groundEffectAlternative = equation({
  id: "ground-effect-alternative",
  title: "ground attenuation, alternative method",
  version: 1,
  tex: String.raw`A_{\text{gr}} = \max\left( 0, 4.8 - \frac{2 h_{\text{m}}}{d} \left( 17 + \frac{300}{d} \right) \right)`,
  value: { symbol: String.raw`A_{\text{gr}}`, unit: "dB" },
  inputs: {
    distanceM: { kind: "one", symbol: "d", ...pathLength },
    meanPathHeightM: { kind: "one", symbol: String.raw`h_{\text{m}}`, unit: "m", min: 0, max: 1000 },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "7.3.2, eq. (10)", checked: "read-secondary" },
  work: ({ distanceM, meanPathHeightM }) =>
    Math.max(0, 4.8 - ((2 * meanPathHeightM) / distanceM) * (17 + 300 / distanceM)),
});
