import { equation } from "../equation.ts";

export const fresnelNumber = equation({
  id: "fresnel-number",
  title: "Fresnel number of a screen",
  version: 1,
  tex: String.raw`N = \frac{2 z f}{c}`,
  value: { symbol: "N", unit: "1", decimals: 3 },
  inputs: {
    pathDifferenceM: { kind: "one", symbol: "z", unit: "m", min: -1000, max: 1000, decimals: 3 },
    frequencyHz: { kind: "one", symbol: "f", unit: "Hz", min: 10, max: 20000 },
    soundSpeedMs: { kind: "one", symbol: "c", unit: "m/s", min: 300, max: 370 },
  },
  source: {
    document: "Bies, Hansen and Howard, Engineering Noise Control",
    edition: "5, 2017",
    clause: "5.3, eq. (5.134)",
    checked: "read-secondary",
  },
  work: ({ pathDifferenceM, frequencyHz, soundSpeedMs }) => (2 * pathDifferenceM * frequencyHz) / soundSpeedMs,
});
