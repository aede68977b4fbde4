import { equation } from "../equation.ts";

/** Limp sheet well below its critical frequency only; stiff boards follow their tables. */
export const massLaw = equation({
  id: "mass-law",
  title: "sound reduction index by the mass law, field incidence",
  version: 1,
  tex: String.raw`R = \max\left( 0, 20 \lg\left( m f \right) - 47 \right)`,
  value: { symbol: "R", unit: "dB" },
  inputs: {
    surfaceDensityKgm2: { kind: "one", symbol: "m", unit: "kg/m²", min: 0, aboveMin: true, max: 100 },
    frequencyHz: { kind: "one", symbol: "f", unit: "Hz", min: 10, max: 20000 },
  },
  source: {
    document: "Bies, Hansen and Howard, Engineering Noise Control",
    edition: "5, 2017",
    clause: "7.2, field incidence mass law",
    checked: "read-secondary",
  },
  work: ({ surfaceDensityKgm2, frequencyHz }) => Math.max(0, 20 * Math.log10(surfaceDensityKgm2 * frequencyHz) - 47),
});
