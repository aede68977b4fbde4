import { equation } from "../equation.ts";

/** Poles to six decimals; the standard prints them as 20.60, 107.7, 737.9 and 12194 Hz. */
export const aWeight = equation({
  id: "a-weight",
  title: "frequency weighting A",
  version: 1,
  tex: String.raw`\begin{aligned}
A(f) &= 20 \lg \frac{f_4^2 f^4}{\left(f^2 + f_1^2\right) \sqrt{f^2 + f_2^2} \sqrt{f^2 + f_3^2} \left(f^2 + f_4^2\right)} - A_{1000} \\
f_1 &= 20.598997 \\
f_2 &= 107.652649 \\
f_3 &= 737.862231 \\
f_4 &= 12194.217148 \\
A_{1000} &= -2.000
\end{aligned}`,
  value: { symbol: "A(f)", unit: "dB" },
  inputs: { frequencyHz: { kind: "one", symbol: "f", unit: "Hz", min: 10, max: 20000 } },
  source: { document: "IEC 61672-1", edition: "2013", clause: "Annex E, eq. (E.6)", checked: "read-secondary" },
  work: ({ frequencyHz }) => {
    const f2 = frequencyHz ** 2;
    const root = Math.sqrt(f2 + 107.652649 ** 2) * Math.sqrt(f2 + 737.862231 ** 2);
    const below = (f2 + 20.598997 ** 2) * root * (f2 + 12194.217148 ** 2);
    return 20 * Math.log10((12194.217148 ** 2 * f2 ** 2) / below) + 2.0;
  },
});
