import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const facadeLevel = equation({
  id: "facade-level",
  title: "level in front of a reflecting facade",
  version: 1,
  tex: String.raw`L_{\text{facade}} = L + \Delta L`,
  value: { symbol: String.raw`L_{\text{facade}}`, unit: "dB" },
  inputs: {
    levelDb: { kind: "one", symbol: "L", ...anyLevel },
    facadeDb: { kind: "one", symbol: String.raw`\Delta L`, unit: "dB", min: 0, max: 6 },
  },
  source: { document: "BS 5228-1", edition: "2009+A1:2014", clause: "Annex F, facade correction", checked: "memory" },
  work: ({ levelDb, facadeDb }) => levelDb + facadeDb,
});
