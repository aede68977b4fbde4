import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

/** Positive over the limit, negative below it. */
export const exceedance = equation({
  id: "exceedance",
  title: "level less the limit",
  version: 1,
  tex: String.raw`\Delta L = L - L_{\text{lim}}`,
  value: { symbol: String.raw`\Delta L`, unit: "dB" },
  inputs: {
    levelDb: { kind: "one", symbol: "L", ...anyLevel },
    limitDb: { kind: "one", symbol: String.raw`L_{\text{lim}}`, unit: "dB", min: 0, max: 200 },
  },
  source: { document: "Stillboard", edition: "own rule", clause: "exceedance", checked: "derived" },
  work: ({ levelDb, limitDb }) => levelDb - limitDb,
});
