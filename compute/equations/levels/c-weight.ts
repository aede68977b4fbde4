import { equation } from "../equation.ts";

export const cWeight = equation({
  id: "c-weight",
  title: "frequency weighting C",
  version: 1,
  tex: String.raw`\begin{aligned}
C(f) &= 20 \lg \frac{f_4^2 f^2}{\left(f^2 + f_1^2\right) \left(f^2 + f_4^2\right)} - C_{1000} \\
f_1 &= 20.598997 \\
f_4 &= 12194.217148 \\
C_{1000} &= -0.062
\end{aligned}`,
  value: { symbol: "C(f)", unit: "dB" },
  inputs: { frequencyHz: { kind: "one", symbol: "f", unit: "Hz", min: 10, max: 20000 } },
  source: { document: "IEC 61672-1", edition: "2013", clause: "Annex E, eq. (E.1)", checked: "read-secondary" },
  work: ({ frequencyHz }) => {
    const f2 = frequencyHz ** 2;
    const below = (f2 + 20.598997 ** 2) * (f2 + 12194.217148 ** 2);
    return 20 * Math.log10((12194.217148 ** 2 * f2) / below) + 0.062;
  },
});
