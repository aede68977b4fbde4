import { octaveBand } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Never below 0 and never above the cap: 20 dB for one edge, 25 dB for two. */
export const screenAttenuation = equation({
  id: "screen-attenuation",
  title: "attenuation by diffraction over or round a screen",
  version: 1,
  tex: String.raw`\begin{aligned}
D_z &= \min\left( D_{\text{cap}}, 10 \lg \max\left( 1, 3 + \frac{C_2}{\lambda} C_3 z K_{\text{met}} \right) \right) \\
\lambda &= \frac{340}{f}
\end{aligned}`,
  value: { symbol: "D_z", unit: "dB" },
  inputs: {
    bandHz: { kind: "one", symbol: "f", ...octaveBand },
    pathDifferenceM: { kind: "one", symbol: "z", unit: "m", min: -30000, max: 30000, decimals: 3 },
    groundConstant: { kind: "one", symbol: "C_2", unit: "1", min: 20, max: 40, oneOf: [20, 40], decimals: 0 },
    edgeFactor: { kind: "one", symbol: "C_3", unit: "1", min: 1, max: 3, decimals: 3 },
    metFactor: { kind: "one", symbol: String.raw`K_{\text{met}}`, unit: "1", min: 0, max: 1, decimals: 3 },
    capDb: { kind: "one", symbol: String.raw`D_{\text{cap}}`, unit: "dB", min: 0, max: 25 },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "7.4, eq. (14)", checked: "read-secondary" },
  work: ({ bandHz, pathDifferenceM, groundConstant, edgeFactor, metFactor, capDb }) => {
    const argument = 3 + (groundConstant / (340 / bandHz)) * edgeFactor * pathDifferenceM * metFactor;
    return Math.min(capDb, 10 * Math.log10(Math.max(1, argument)));
  },
});
