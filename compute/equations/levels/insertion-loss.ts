import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Negative when the control makes it louder. */
export const insertionLoss = equation({
  id: "insertion-loss",
  title: "insertion loss of a control",
  version: 1,
  tex: String.raw`D = L_{\text{without}} - L_{\text{with}}`,
  value: { symbol: "D", unit: "dB" },
  inputs: {
    withoutDb: { kind: "one", symbol: String.raw`L_{\text{without}}`, ...anyLevel },
    withDb: { kind: "one", symbol: String.raw`L_{\text{with}}`, ...anyLevel },
  },
  source: { document: "Stillboard", edition: "own rule", clause: "insertion loss", checked: "derived" },
  work: ({ withoutDb, withDb }) => withoutDb - withDb,
});
