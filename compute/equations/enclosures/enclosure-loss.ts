import { reductionIndex } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Full enclosure, large enough for a diffuse field inside. The inner area counts machine and floor. */
export const enclosureLoss = equation({
  id: "enclosure-loss",
  title: "insertion loss of a full enclosure",
  version: 1,
  tex: String.raw`\begin{aligned}
D &= \max\left( 0, R - 10 \lg\left( 0.3 + \frac{S_{\text{E}}}{R_{\text{i}}} \right) \right) \\
R_{\text{i}} &= \frac{S_{\text{i}} \alpha}{1 - \alpha}
\end{aligned}`,
  value: { symbol: "D", unit: "dB" },
  inputs: {
    reductionIndexDb: { kind: "one", symbol: "R", ...reductionIndex },
    externalAreaM2: { kind: "one", symbol: String.raw`S_{\text{E}}`, unit: "m²", min: 0, aboveMin: true, max: 100000 },
    internalAreaM2: { kind: "one", symbol: String.raw`S_{\text{i}}`, unit: "m²", min: 0, aboveMin: true, max: 100000 },
    absorption: { kind: "one", symbol: String.raw`\alpha`, unit: "1", min: 0, aboveMin: true, max: 0.95 },
  },
  source: {
    document: "Bies, Hansen and Howard, Engineering Noise Control",
    edition: "5, 2017",
    clause: "7.4, eqs. (7.103) and (7.111)",
    checked: "read-secondary",
  },
  work: ({ reductionIndexDb, externalAreaM2, internalAreaM2, absorption }) => {
    const roomConstantM2 = (internalAreaM2 * absorption) / (1 - absorption);
    return Math.max(0, reductionIndexDb - 10 * Math.log10(0.3 + externalAreaM2 / roomConstantM2));
  },
});
