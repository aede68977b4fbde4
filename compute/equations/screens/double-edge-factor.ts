import { octaveBand } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const doubleEdgeFactor = equation({
  id: "double-edge-factor",
  title: "factor for diffraction over two edges",
  version: 1,
  tex: String.raw`\begin{aligned}
C_3 &= \begin{cases} 1 & e = 0 \\ \frac{1 + \left(\frac{5 \lambda}{e}\right)^2}{\frac{1}{3} + \left(\frac{5 \lambda}{e}\right)^2} & e > 0 \end{cases} \\
\lambda &= \frac{340}{f}
\end{aligned}`,
  value: { symbol: "C_3", unit: "1", decimals: 3 },
  inputs: {
    bandHz: { kind: "one", symbol: "f", ...octaveBand },
    betweenEdgesM: { kind: "one", symbol: "e", unit: "m", min: 0, max: 10000 },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "7.4, eq. (15)", checked: "read-secondary" },
  // Multiplied by e²: edges a hair apart would overflow in the printed form.
  work: ({ bandHz, betweenEdgesM }) => {
    const spread = (5 * (340 / bandHz)) ** 2;
    return (betweenEdgesM ** 2 + spread) / (betweenEdgesM ** 2 / 3 + spread);
  },
});
