import { reductionIndex } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Full or partial enclosure. A floor, or the machine itself, lets nothing through: index 99. */
export const enclosureBalance = equation({
  id: "enclosure-balance",
  title: "insertion loss of an enclosure by its power balance",
  version: 1,
  tex: String.raw`D = 10 \lg \frac{S_{\text{o}} + \sum_{i=1}^{n} S_i \left( \alpha_i + 10^{-0.1 R_i} \right)}{S_{\text{o}} + \sum_{i=1}^{n} S_i 10^{-0.1 R_i}}`,
  value: { symbol: "D", unit: "dB" },
  inputs: {
    openAreaM2: { kind: "one", symbol: String.raw`S_{\text{o}}`, unit: "m²", min: 0, max: 100000 },
    areasM2: { kind: "many", symbol: "S_i", unit: "m²", min: 0, aboveMin: true, max: 100000 },
    absorptions: { kind: "many", symbol: String.raw`\alpha_i`, unit: "1", min: 0, max: 1, sameLengthAs: "areasM2" },
    reductionIndexesDb: { kind: "many", symbol: "R_i", ...reductionIndex, sameLengthAs: "areasM2" },
  },
  source: { document: "Stillboard", edition: "own rule", clause: "power balance of an enclosure", checked: "derived" },
  work: ({ openAreaM2, areasM2, absorptions, reductionIndexesDb }) => {
    let absorbed = 0;
    let passed = 0;
    for (const [i, area] of areasM2.entries()) {
      const share = 10 ** (-0.1 * (reductionIndexesDb[i] ?? 0));
      absorbed += area * ((absorptions[i] ?? 0) + share);
      passed += area * share;
    }
    return 10 * Math.log10((openAreaM2 + absorbed) / (openAreaM2 + passed));
  },
});
