import { equation } from "../equation.ts";

/** Mean absorption coefficient of the inside of an enclosure; no surface counts above 0.95. */
export const meanAbsorption = equation({
  id: "mean-absorption",
  title: "mean absorption coefficient inside an enclosure",
  version: 1,
  tex: String.raw`\bar{\alpha} = \frac{\sum_{i=1}^{n} S_i \min(\alpha_i, 0.95)}{\sum_{i=1}^{n} S_i}`,
  value: { symbol: String.raw`\bar{\alpha}`, unit: "1", decimals: 2 },
  inputs: {
    areasM2: { kind: "many", symbol: "S_i", unit: "m²", min: 0, aboveMin: true, max: 1e6, decimals: 1 },
    absorptions: {
      kind: "many",
      symbol: String.raw`\alpha_i`,
      unit: "1",
      min: 0,
      max: 1,
      decimals: 2,
      sameLengthAs: "areasM2",
    },
  },
  source: {
    document: "Bies, Hansen and Howard, Engineering Noise Control",
    edition: "5th, 2017",
    clause: "7.4, mean absorption; the cap at 0.95 is our own rule for formulas with 1 − α",
    checked: "derived",
  },
  work: ({ areasM2, absorptions }) => {
    const absorbing = areasM2.reduce((sum, area, i) => sum + area * Math.min(absorptions[i] as number, 0.95), 0);
    return absorbing / areasM2.reduce((sum, area) => sum + area, 0);
  },
});
