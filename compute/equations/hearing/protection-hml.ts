import { equation } from "../equation.ts";

/** The reduction is H at a difference of −2 dB, M at 2 dB, L at 10 dB. */
export const protectionHml = equation({
  id: "protection-hml",
  title: "level at the ear, HML method",
  version: 1,
  tex: String.raw`\begin{aligned}
L'_{\text{A}} &= L_{\text{A}} - \text{PNR} \\
\text{PNR} &= \begin{cases} M - \frac{H - M}{4} \left(x - 2\right) & x \le 2 \\ M - \frac{M - L}{8} \left(x - 2\right) & x > 2 \end{cases} \\
x &= L_{\text{C}} - L_{\text{A}}
\end{aligned}`,
  value: { symbol: String.raw`L'_{\text{A}}`, unit: "dB" },
  inputs: {
    levelDba: { kind: "one", symbol: String.raw`L_{\text{A}}`, unit: "dB", min: 0, max: 150 },
    levelDbc: { kind: "one", symbol: String.raw`L_{\text{C}}`, unit: "dB", min: 0, max: 150 },
    highDb: { kind: "one", symbol: "H", unit: "dB", min: 0, max: 60 },
    mediumDb: { kind: "one", symbol: "M", unit: "dB", min: 0, max: 60 },
    lowDb: { kind: "one", symbol: "L", unit: "dB", min: 0, max: 60 },
  },
  source: { document: "ISO 4869-2", edition: "2018", clause: "HML method", checked: "read-secondary" },
  work: ({ levelDba, levelDbc, highDb, mediumDb, lowDb }) => {
    const beyond = levelDbc - levelDba - 2;
    const slope = beyond <= 0 ? (highDb - mediumDb) / 4 : (mediumDb - lowDb) / 8;
    return levelDba - (mediumDb - slope * beyond);
  },
});
