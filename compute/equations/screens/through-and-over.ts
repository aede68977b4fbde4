import { reductionIndex } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const throughAndOver = equation({
  id: "through-and-over",
  title: "insertion loss when sound also passes through the panel",
  version: 1,
  tex: String.raw`D = \max\left( 0, -10 \lg\left( 10^{-0.1 D_{\text{d}}} + 10^{-0.1 R} \right) \right)`,
  value: { symbol: "D", unit: "dB" },
  inputs: {
    diffractedLossDb: { kind: "one", symbol: String.raw`D_{\text{d}}`, unit: "dB", min: 0, max: 99 },
    reductionIndexDb: { kind: "one", symbol: "R", ...reductionIndex },
  },
  source: {
    document: "Stillboard",
    edition: "own rule",
    clause: "energies over and through a screen added",
    checked: "derived",
  },
  work: ({ diffractedLossDb, reductionIndexDb }) =>
    Math.max(0, -10 * Math.log10(10 ** (-0.1 * diffractedLossDb) + 10 ** (-0.1 * reductionIndexDb))),
});
