import { equation } from "../equation.ts";

export const edgesCombined = equation({
  id: "edges-combined",
  title: "insertion loss when sound passes several edges",
  version: 1,
  tex: String.raw`D = \max\left( 0, -10 \lg \sum_{i=1}^{n} 10^{-0.1 D_i} \right)`,
  value: { symbol: "D", unit: "dB" },
  inputs: { lossesDb: { kind: "many", symbol: "D_i", unit: "dB", min: 0, max: 99 } },
  source: {
    document: "Stillboard",
    edition: "own rule",
    clause: "energies round the edges of a screen added",
    checked: "derived",
  },
  work: ({ lossesDb }) => Math.max(0, -10 * Math.log10(lossesDb.reduce((sum, loss) => sum + 10 ** (-0.1 * loss), 0))),
});
