import { anyLevel } from "../common-ranges.ts";
import { equation } from "../equation.ts";

export const reflectedPower = equation({
  id: "reflected-power",
  title: "sound power level of a mirrored source",
  version: 1,
  tex: String.raw`L_{W,\text{im}} = L_W + 10 \lg \rho`,
  value: { symbol: String.raw`L_{W,\text{im}}`, unit: "dB", decimals: 1 },
  inputs: {
    powerDb: { kind: "one", symbol: "L_W", ...anyLevel },
    reflection: { kind: "one", symbol: String.raw`\rho`, unit: "1", min: 0.2, aboveMin: true, max: 1, decimals: 2 },
  },
  source: {
    document: "ISO 9613-2",
    edition: "1996",
    clause: "7.5, eq. (20), without directivity of the source",
    checked: "memory",
  },
  work: ({ powerDb, reflection }) => powerDb + 10 * Math.log10(reflection),
});
