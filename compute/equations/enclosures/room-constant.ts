import { equation } from "../equation.ts";

export const roomConstant = equation({
  id: "room-constant",
  title: "room constant",
  version: 1,
  tex: String.raw`R_{\text{i}} = \frac{S \alpha}{1 - \alpha}`,
  value: { symbol: String.raw`R_{\text{i}}`, unit: "m²" },
  inputs: {
    areaM2: { kind: "one", symbol: "S", unit: "m²", min: 0, aboveMin: true, max: 100000 },
    absorption: { kind: "one", symbol: String.raw`\alpha`, unit: "1", min: 0, aboveMin: true, max: 0.95 },
  },
  source: {
    document: "Bies, Hansen and Howard, Engineering Noise Control",
    edition: "5, 2017",
    clause: "7.4, with eq. (7.111)",
    checked: "read-secondary",
  },
  work: ({ areaM2, absorption }) => (areaM2 * absorption) / (1 - absorption),
});
