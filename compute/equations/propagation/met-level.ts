import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const metLevel = equation({
  id: "met-level",
  title: "long-term level from the downwind level",
  version: 1,
  tex: String.raw`L_{\text{AT}} = L_{\text{AT},\text{DW}} - C_{\text{met}}`,
  value: { symbol: String.raw`L_{\text{AT}}`, unit: "dB" },
  inputs: {
    levelDb: { kind: "one", symbol: String.raw`L_{\text{AT},\text{DW}}`, ...anyLevel },
    metDb: { kind: "one", symbol: String.raw`C_{\text{met}}`, unit: "dB", min: 0, max: 5 },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "8, eq. (6)", checked: "read-secondary" },
  work: ({ levelDb, metDb }) => levelDb - metDb,
});
