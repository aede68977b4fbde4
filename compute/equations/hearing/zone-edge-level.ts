import { equation } from "../equation.ts";

/** The level at which the zone ends, for a bystander who stays the whole shift, at least 8 h. */
export const zoneEdgeLevel = equation({
  id: "zone-edge-level",
  title: "level at the edge of the ear-protection zone",
  version: 1,
  tex: String.raw`L_{\text{edge}} = v - K \lg \frac{\max\left( s, 8 \right)}{8} - U`,
  value: { symbol: String.raw`L_{\text{edge}}`, unit: "dB" },
  inputs: {
    valueDba: { kind: "one", symbol: "v", unit: "dB", min: 50, max: 140 },
    exchangeFactorDb: { kind: "one", symbol: "K", unit: "dB", min: 9, max: 17, decimals: 2 },
    shiftH: { kind: "one", symbol: "s", unit: "h", min: 0, aboveMin: true, max: 24 },
    uncertaintyDb: { kind: "one", symbol: "U", unit: "dB", min: 3, max: 20 },
  },
  source: { document: "Stillboard", edition: "own rule", clause: "zone rule", checked: "derived" },
  work: ({ valueDba, exchangeFactorDb, shiftH, uncertaintyDb }) =>
    valueDba - exchangeFactorDb * Math.log10(Math.max(shiftH, 8) / 8) - uncertaintyDb,
});
