import { pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** From a level at 10 m. The curves join at 25 m to within 0.01 dB. */
export const distanceSoft = equation({
  id: "distance-soft",
  title: "distance attenuation over soft ground, from 10 m",
  version: 1,
  tex: String.raw`K_{\text{s}} = \begin{cases} 20 \lg \frac{R}{10} & R < 25 \\ 25 \lg \frac{R}{10} - 2 & R \ge 25 \end{cases}`,
  value: { symbol: String.raw`K_{\text{s}}`, unit: "dB" },
  inputs: { distanceM: { kind: "one", symbol: "R", ...pathLength } },
  source: { document: "BS 5228-1", edition: "2009+A1:2014", clause: "Annex F, F.2.2", checked: "memory" },
  work: ({ distanceM }) => (distanceM < 25 ? 20 * Math.log10(distanceM / 10) : 25 * Math.log10(distanceM / 10) - 2),
});
