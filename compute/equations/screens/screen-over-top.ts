import { equation } from "../equation.ts";

/**
 * The careful reading of eq. (12): a ground gain (negative attenuation) without the screen is not credited to the
 * screen, whose own formula holds the reflection already. Never above screen-over-top-literal.
 */
export const screenOverTop = equation({
  id: "screen-over-top",
  title: "screen term over the top edge, careful reading",
  version: 1,
  tex: String.raw`A_{\text{bar}} = \max\left( 0, D_z - \max\left( A_{\text{gr}}, 0 \right) \right)`,
  value: { symbol: String.raw`A_{\text{bar}}`, unit: "dB" },
  inputs: {
    diffractionDb: { kind: "one", symbol: "D_z", unit: "dB", min: 0, max: 40 },
    groundDb: { kind: "one", symbol: String.raw`A_{\text{gr}}`, unit: "dB", min: -20, max: 40 },
  },
  source: {
    document: "ISO 9613-2",
    edition: "1996",
    clause: "7.4, eq. (12), ground gain not credited",
    checked: "memory",
  },
  work: ({ diffractionDb, groundDb }) => Math.max(0, diffractionDb - Math.max(groundDb, 0)),
});
