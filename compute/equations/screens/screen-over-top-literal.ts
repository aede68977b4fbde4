import { equation } from "../equation.ts";

export const screenOverTopLiteral = equation({
  id: "screen-over-top-literal",
  title: "screen term over the top edge, as printed",
  version: 1,
  tex: String.raw`A_{\text{bar}} = \max\left( 0, D_z - A_{\text{gr}} \right)`,
  value: { symbol: String.raw`A_{\text{bar}}`, unit: "dB" },
  inputs: {
    diffractionDb: { kind: "one", symbol: "D_z", unit: "dB", min: 0, max: 40 },
    groundDb: { kind: "one", symbol: String.raw`A_{\text{gr}}`, unit: "dB", min: -20, max: 40 },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "7.4, eq. (12)", checked: "read-secondary" },
  work: ({ diffractionDb, groundDb }) => Math.max(0, diffractionDb - groundDb),
});
