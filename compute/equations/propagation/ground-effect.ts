import { groundFactor, height, octaveBand, pathLength } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Sum of the source, receptor and middle regions. Negative values are a gain. Never together with solid-angle-index. */
export const groundEffect = equation({
  id: "ground-effect",
  title: "ground attenuation, general method",
  version: 1,
  tex: String.raw`\begin{aligned}
A_{\text{gr}} &= A_{\text{s}} + A_{\text{r}} + A_{\text{m}} \\
A_{\text{s}} &= A\left(h_{\text{s}}, G_{\text{s}}\right) \\
A_{\text{r}} &= A\left(h_{\text{r}}, G_{\text{r}}\right) \\
A_{\text{m}} &= \begin{cases} -3 q & f = 63 \\ -3 q \left(1 - G_{\text{m}}\right) & f > 63 \end{cases} \\
q &= \begin{cases} 0 & d_{\text{p}} \le 30 \left(h_{\text{s}} + h_{\text{r}}\right) \\ 1 - \frac{30 \left(h_{\text{s}} + h_{\text{r}}\right)}{d_{\text{p}}} & d_{\text{p}} > 30 \left(h_{\text{s}} + h_{\text{r}}\right) \end{cases} \\
A\left(h, G\right) &= \begin{cases} -1.5 & f = 63 \\ -1.5 + G a'\left(h\right) & f = 125 \\ -1.5 + G b'\left(h\right) & f = 250 \\ -1.5 + G c'\left(h\right) & f = 500 \\ -1.5 + G d'\left(h\right) & f = 1000 \\ -1.5 \left(1 - G\right) & f \ge 2000 \end{cases} \\
a'\left(h\right) &= 1.5 + 3.0 \mathrm{e}^{-0.12 \left(h - 5\right)^2} \left(1 - \mathrm{e}^{-d_{\text{p}}/50}\right) + 5.7 \mathrm{e}^{-0.09 h^2} \left(1 - \mathrm{e}^{-2.8 \cdot 10^{-6} d_{\text{p}}^2}\right) \\
b'\left(h\right) &= 1.5 + 8.6 \mathrm{e}^{-0.09 h^2} \left(1 - \mathrm{e}^{-d_{\text{p}}/50}\right) \\
c'\left(h\right) &= 1.5 + 14.0 \mathrm{e}^{-0.46 h^2} \left(1 - \mathrm{e}^{-d_{\text{p}}/50}\right) \\
d'\left(h\right) &= 1.5 + 5.0 \mathrm{e}^{-0.9 h^2} \left(1 - \mathrm{e}^{-d_{\text{p}}/50}\right)
\end{aligned}`,
  value: { symbol: String.raw`A_{\text{gr}}`, unit: "dB" },
  inputs: {
    bandHz: { kind: "one", symbol: "f", ...octaveBand },
    sourceHeightM: { kind: "one", symbol: String.raw`h_{\text{s}}`, ...height },
    receptorHeightM: { kind: "one", symbol: String.raw`h_{\text{r}}`, ...height },
    planDistanceM: { kind: "one", symbol: String.raw`d_{\text{p}}`, ...pathLength },
    groundSource: { kind: "one", symbol: String.raw`G_{\text{s}}`, ...groundFactor },
    groundMiddle: { kind: "one", symbol: String.raw`G_{\text{m}}`, ...groundFactor },
    groundReceptor: { kind: "one", symbol: String.raw`G_{\text{r}}`, ...groundFactor },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "7.3.1, eq. (9) and Table 3", checked: "read-secondary" },
  work: ({ bandHz, sourceHeightM, receptorHeightM, planDistanceM, groundSource, groundMiddle, groundReceptor }) => {
    const endsM = 30 * (sourceHeightM + receptorHeightM);
    const q = planDistanceM <= endsM ? 0 : 1 - endsM / planDistanceM;
    const middle = bandHz === 63 ? -3 * q : -3 * q * (1 - groundMiddle);
    const source = endRegion(bandHz, sourceHeightM, planDistanceM, groundSource);
    return source + endRegion(bandHz, receptorHeightM, planDistanceM, groundReceptor) + middle;
  },
});

/** Source or receptor region, first column of Table 3. */
function endRegion(bandHz: number, h: number, dp: number, G: number): number {
  const far = 1 - Math.exp(-dp / 50);
  switch (bandHz) {
    case 63:
      return -1.5;
    case 125: {
      const near = 3.0 * Math.exp(-0.12 * (h - 5) ** 2) * far;
      return -1.5 + G * (1.5 + near + 5.7 * Math.exp(-0.09 * h ** 2) * (1 - Math.exp(-2.8e-6 * dp ** 2)));
    }
    case 250:
      return -1.5 + G * (1.5 + 8.6 * Math.exp(-0.09 * h ** 2) * far);
    case 500:
      return -1.5 + G * (1.5 + 14.0 * Math.exp(-0.46 * h ** 2) * far);
    case 1000:
      return -1.5 + G * (1.5 + 5.0 * Math.exp(-0.9 * h ** 2) * far);
    default:
      return -1.5 * (1 - G);
  }
}
