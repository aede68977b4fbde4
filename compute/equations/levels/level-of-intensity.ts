import { equation } from "../equation.ts";

export const levelOfIntensity = equation({
  id: "level-of-intensity",
  title: "level of a sound intensity, re 1 pW/m²",
  version: 1,
  tex: String.raw`L_I = 10 \lg \frac{I}{10^{-12}}`,
  value: { symbol: "L_I", unit: "dB" },
  inputs: { intensityWm2: { kind: "one", symbol: "I", unit: "W/m²", min: 0, aboveMin: true, max: 1e8 } },
  source: { document: "ISO/TR 25417", edition: "2007", clause: "sound intensity level", checked: "read-secondary" },
  work: ({ intensityWm2 }) => 10 * Math.log10(intensityWm2 / 1e-12),
});
