import { type EquationId, equations } from "../../compute/equations/registry.ts";

/** A calculation short enough to follow on paper. */
export interface HandCalculation {
  readonly equation: EquationId;
  /** How the expected value comes about. */
  readonly how: string;
  readonly computed: () => number;
  /** As written down: the digits shown set the tolerance. */
  readonly printed: string;
  readonly mark: "read" | "derived" | "common practice, no source";
}

const worst = (onTimePct: number, longestRunMin: number, shortestStopMin: number, averagingMin: number) => () =>
  equations["worst-share"].of({ onTimePct, longestRunMin, shortestStopMin, averagingMin });
const edge = (valueDba: number, exchangeFactorDb: number, shiftH: number) => () =>
  equations["zone-edge-level"].of({ valueDba, exchangeFactorDb, shiftH, uncertaintyDb: 3 });
const intensityAt = (distanceM: number) =>
  equations["intensity-of-level"].of({
    levelDb: equations["point-source-level"].of({ powerDb: 100, distanceM, directivityFactor: 1 }),
  });
const levelOf = (intensityWm2: number) => equations["level-of-intensity"].of({ intensityWm2 });

const derived: readonly Omit<HandCalculation, "mark">[] = [
  {
    equation: "angle-of-view",
    how: "half a straight angle: 10 lg 0.5",
    computed: () => equations["angle-of-view"].of({ angleDeg: 90 }),
    printed: "-3.0103",
  },
  {
    equation: "angle-of-view",
    how: "a tenth of a straight angle: 10 lg 0.1",
    computed: () => equations["angle-of-view"].of({ angleDeg: 18 }),
    printed: "-10.0000",
  },
  {
    equation: "mean-absorption",
    how: "(10 × 0.5 + 30 × 0.1) / 40",
    computed: () => equations["mean-absorption"].of({ areasM2: [10, 30], absorptions: [0.5, 0.1] }),
    printed: "0.2000",
  },
  {
    equation: "mean-absorption",
    how: "1 counts as 0.95: (10 × 0.95 + 10 × 0.05) / 20",
    computed: () => equations["mean-absorption"].of({ areasM2: [10, 10], absorptions: [1, 0.05] }),
    printed: "0.5000",
  },
  {
    equation: "room-constant",
    how: "30 × 0.3 / 0.7",
    computed: () => equations["room-constant"].of({ areaM2: 30, absorption: 0.3 }),
    printed: "12.8571",
  },
  {
    equation: "room-constant",
    how: "40 × 0.5 / 0.5",
    computed: () => equations["room-constant"].of({ areaM2: 40, absorption: 0.5 }),
    printed: "40.0000",
  },
  {
    equation: "zone-edge-level",
    how: "85 − 0 − 3; a shift under 8 h counts as 8 h",
    computed: edge(85, 10, 6),
    printed: "82.0000",
  },
  {
    equation: "zone-edge-level",
    how: "85 − 10 lg 1.25 − 3 = 85 − 0.9691 − 3",
    computed: edge(85, 10, 10),
    printed: "81.0309",
  },
  {
    equation: "zone-edge-level",
    how: "90 − 16 lg 2 − 3 = 90 − 4.8165 − 3",
    computed: edge(90, 16, 16),
    printed: "82.1835",
  },
  {
    equation: "period-level",
    how: "half of the time in half of the period: 80 + 10 lg 0.25 = 80 − 6.0206",
    computed: () => equations["period-level"].of({ levelDb: 80, onTimePct: 50, windowH: 5, periodH: 10 }),
    printed: "73.9794",
  },
  {
    equation: "power-of-pressure",
    how: "10 m over hard ground: 72 + 10 lg(2π × 100) = 72 + 27.9818",
    computed: () => equations["power-of-pressure"].of({ levelDb: 72, distanceM: 10, directivityFactor: 2 }),
    printed: "99.9818",
  },
  {
    equation: "shape-shift",
    how: "70 + (98 − 78)",
    computed: () => equations["shape-shift"].of({ shapeDb: 70, shapeTotalDba: 78, levelDba: 98 }),
    printed: "90.0000",
  },
  {
    equation: "worst-share",
    how: "runs of 10 min, stops of 5: four whole pairs fill the hour, 40 min of 60",
    computed: worst(1, 10, 5, 60),
    printed: "0.6667",
  },
  {
    equation: "worst-share",
    how: "runs and stops of 20 min: one pair, then a whole run, 40 min of 60",
    computed: worst(1, 20, 20, 60),
    printed: "0.6667",
  },
  {
    equation: "worst-share",
    how: "a run longer than the averaging time fills it",
    computed: worst(1, 10, 60, 5),
    printed: "1.0000",
  },
  {
    equation: "worst-share",
    how: "never less than the running time: 90 %",
    computed: worst(90, 1, 60, 60),
    printed: "0.9000",
  },
  {
    equation: "air-attenuation",
    how: "10 dB/km over 250 m",
    computed: () => equations["air-attenuation"].of({ absorptionDbKm: 10, distanceM: 250 }),
    printed: "2.5000",
  },
  {
    equation: "ground-factor",
    how: "middle region of the three-patch scene: (10.6435 × 0.2 + 32.5741 × 0.5) / 43.2176",
    computed: () => equations["ground-factor"].of({ lengthsM: [10.6435, 32.5741], groundFactors: [0.2, 0.5] }),
    printed: "0.4261",
  },
  {
    equation: "ground-factor",
    how: "receptor region of the three-patch scene: (67.4259 × 0.5 + 50 × 0.9) / 117.4259",
    computed: () => equations["ground-factor"].of({ lengthsM: [67.4259, 50], groundFactors: [0.5, 0.9] }),
    printed: "0.6703",
  },
  {
    equation: "fresnel-number",
    how: "a detour of half a wavelength: 2 × 1 × 170 / 340",
    computed: () => equations["fresnel-number"].of({ pathDifferenceM: 1, frequencyHz: 170, soundSpeedMs: 340 }),
    printed: "1.0000",
  },
  {
    equation: "least-reflector",
    how: "500 Hz, 20 m there and 20 m back, square on: √(2 × 0.68 × 20 × 20 / 40) = √13.6",
    computed: () => equations["least-reflector"].of({ bandHz: 500, toSurfaceM: 20, fromSurfaceM: 20, incidenceRad: 0 }),
    printed: "3.6878",
  },
  {
    equation: "least-reflector",
    how: "1 kHz, 10 m there and 40 m on, at 60°: √(2 × 0.34 × 400 / 50) / 0.5 = √5.44 / 0.5",
    computed: () =>
      equations["least-reflector"].of({ bandHz: 1000, toSurfaceM: 10, fromSurfaceM: 40, incidenceRad: Math.PI / 3 }),
    printed: "4.6648",
  },
  {
    equation: "reflected-power",
    how: "walls with windows: 100 + 10 lg 0.8 = 100 − 0.9691",
    computed: () => equations["reflected-power"].of({ powerDb: 100, reflection: 0.8 }),
    printed: "99.0309",
  },
  {
    equation: "reflected-power",
    how: "walls half open: 100 + 10 lg 0.4 = 100 − 3.9794",
    computed: () => equations["reflected-power"].of({ powerDb: 100, reflection: 0.4 }),
    printed: "96.0206",
  },
  {
    equation: "met-level",
    how: "C0 = 2 dB, hs + hr = 3 m, 100 m off: 60 − 2 × (1 − 30/100)",
    computed: () => equations["met-level"].of({ levelDb: 60, metDb: 1.4 }),
    printed: "58.6000",
  },
  {
    equation: "composite-index",
    how: "20 dB with 1 % of gaps: −10 lg(0.99 × 0.01 + 0.01) = −10 lg 0.0199",
    computed: () => equations["composite-index"].of({ areasM2: [99, 1], reductionIndexesDb: [20, 0] }),
    printed: "17.0115",
  },
  {
    equation: "unscreened-limit",
    how: "two paths of 50 dB make 53.0103, over an open level of 51: 50 − 2.0103",
    computed: () => equations["unscreened-limit"].of({ levelDb: 50, pathLevelsDb: [50, 50], unscreenedDb: 51 }),
    printed: "47.9897",
  },
  {
    equation: "unscreened-limit",
    how: "two paths of 50 dB stay under an open level of 54",
    computed: () => equations["unscreened-limit"].of({ levelDb: 50, pathLevelsDb: [50, 50], unscreenedDb: 54 }),
    printed: "50.0000",
  },
];

/** What equations without a row in the reference tables are held against, and what every acoustician knows. */
export const handCalculations: readonly HandCalculation[] = [
  ...derived.map((calculation) => ({ ...calculation, mark: "derived" as const })),
  {
    equation: "exchange-factor",
    how: "29 CFR 1910.95, Appendix A: 16.61 for an exchange rate of 5 dB",
    computed: () => equations["exchange-factor"].of({ exchangeRateDb: 5 }),
    printed: "16.61",
    mark: "read",
  },
  {
    equation: "intensity-of-level",
    how: "doubling the distance quarters the intensity",
    computed: () => intensityAt(10) / intensityAt(20),
    printed: "4.0000",
    mark: "common practice, no source",
  },
  {
    equation: "level-of-intensity",
    how: "0 dB is 1 pW/m²",
    computed: () => levelOf(1e-12),
    printed: "0.0000",
    mark: "common practice, no source",
  },
  {
    equation: "level-of-intensity",
    how: "120 dB is 1 W/m²",
    computed: () => levelOf(1),
    printed: "120.0000",
    mark: "common practice, no source",
  },
  {
    equation: "level-of-intensity",
    how: "ten times the intensity is 10 dB more",
    computed: () => levelOf(3e-5) - levelOf(3e-6),
    printed: "10.0000",
    mark: "common practice, no source",
  },
];
