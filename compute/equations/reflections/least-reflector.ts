import { octaveBand, pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const leastReflector = equation({
  id: "least-reflector",
  title: "smallest dimension of a surface that reflects in a band",
  version: 1,
  tex: String.raw`\begin{aligned}
l_{\text{min}} &= \frac{1}{\cos \beta} \sqrt{\frac{2 \lambda d_{\text{so}} d_{\text{or}}}{d_{\text{so}} + d_{\text{or}}}} \\
\lambda &= \frac{340}{f}
\end{aligned}`,
  value: { symbol: String.raw`l_{\text{min}}`, unit: "m", decimals: 2 },
  inputs: {
    bandHz: { kind: "one", symbol: "f", ...octaveBand },
    toSurfaceM: { kind: "one", symbol: String.raw`d_{\text{so}}`, ...pathLength },
    fromSurfaceM: { kind: "one", symbol: String.raw`d_{\text{or}}`, ...pathLength },
    incidenceRad: { kind: "one", symbol: String.raw`\beta`, unit: "rad", min: 0, max: 1.570796, decimals: 3 },
  },
  source: {
    document: "ISO 9613-2",
    edition: "1996",
    clause: "7.5, eq. (19), solved for the dimension",
    checked: "memory",
  },
  work: ({ bandHz, toSurfaceM, fromSurfaceM, incidenceRad }) =>
    Math.sqrt((2 * (340 / bandHz) * toSurfaceM * fromSurfaceM) / (toSurfaceM + fromSurfaceM)) / Math.cos(incidenceRad),
});
