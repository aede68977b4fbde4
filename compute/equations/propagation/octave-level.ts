import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const octaveLevel = equation({
  id: "octave-level",
  title: "octave band level of one source over one path",
  version: 1,
  tex: String.raw`L = L_W - D_{\text{con}} + D_{\text{c}} - \left( A_{\text{div}} + A_{\text{atm}} + A_{\text{gr}} + A_{\text{bar}} \right)`,
  value: { symbol: "L", unit: "dB" },
  inputs: {
    powerDb: { kind: "one", symbol: "L_W", ...anyLevel },
    controlLossDb: { kind: "one", symbol: String.raw`D_{\text{con}}`, unit: "dB", min: -50, max: 150 },
    directivityDb: { kind: "one", symbol: String.raw`D_{\text{c}}`, unit: "dB", min: -50, max: 50 },
    divergenceDb: { kind: "one", symbol: String.raw`A_{\text{div}}`, unit: "dB", min: -100, max: 100 },
    airDb: { kind: "one", symbol: String.raw`A_{\text{atm}}`, unit: "dB", min: 0, max: 10000 },
    groundDb: { kind: "one", symbol: String.raw`A_{\text{gr}}`, unit: "dB", min: -20, max: 40 },
    screenDb: { kind: "one", symbol: String.raw`A_{\text{bar}}`, unit: "dB", min: 0, max: 300 },
  },
  source: { document: "ISO 9613-2", edition: "1996", clause: "6, eqs. (3) and (4)", checked: "read-secondary" },
  work: ({ powerDb, controlLossDb, directivityDb, divergenceDb, airDb, groundDb, screenDb }) =>
    powerDb - controlLossDb + directivityDb - (divergenceDb + airDb + groundDb + screenDb),
});
