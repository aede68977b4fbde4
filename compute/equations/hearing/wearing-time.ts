import { equation } from "../equation.ts";

export const wearingTime = equation({
  id: "wearing-time",
  title: "protection left when worn part of the time",
  version: 1,
  tex: String.raw`P_w = -10 \lg\left( 1 - \frac{w}{100} + \frac{w}{100} \cdot 10^{-P/10} \right)`,
  value: { symbol: "P_w", unit: "dB" },
  inputs: {
    protectionDb: { kind: "one", symbol: "P", unit: "dB", min: 0, max: 60 },
    wornPct: { kind: "one", symbol: "w", unit: "%", min: 0, max: 100 },
  },
  source: {
    document: "Stillboard",
    edition: "own rule",
    clause: "energy at the ear with and without protector",
    checked: "derived",
  },
  work: ({ protectionDb, wornPct }) =>
    -10 * Math.log10(1 - wornPct / 100 + (wornPct / 100) * 10 ** (-protectionDb / 10)),
});
