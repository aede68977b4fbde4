import { equation } from "../equation.ts";

export const levelOfPressure = equation({
  id: "level-of-pressure",
  title: "level of a sound pressure, re 20 µPa",
  version: 1,
  tex: String.raw`L_p = 20 \lg \frac{p}{2 \cdot 10^{-5}}`,
  value: { symbol: "L_p", unit: "dB" },
  inputs: { pressurePa: { kind: "one", symbol: "p", unit: "Pa", min: 0, aboveMin: true, max: 1e5 } },
  source: { document: "ISO/TR 25417", edition: "2007", clause: "sound pressure level", checked: "read-secondary" },
  work: ({ pressurePa }) => 20 * Math.log10(pressurePa / 2e-5),
});
