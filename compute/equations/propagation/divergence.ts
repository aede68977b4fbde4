import { pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const divergence = equation({
  id: "divergence",
  title: "attenuation by geometrical divergence",
  version: 1,
  tex: String.raw`\begin{aligned}
A_{\text{div}} &= 20 \lg \frac{d}{d_0} + 11 \\
d_0 &= 1
\end{aligned}`,
  value: { symbol: String.raw`A_{\text{div}}`, unit: "dB" },
  inputs: { distanceM: { kind: "one", symbol: "d", ...pathLength } },
  source: { document: "ISO 9613-2", edition: "1996", clause: "7.1, eq. (7)", checked: "read-secondary" },
  work: ({ distanceM }) => 20 * Math.log10(distanceM) + 11,
});
