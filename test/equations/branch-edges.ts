import type { EquationId } from "../../compute/equations/registry.ts";
import type { AnyInputs } from "../helpers/valid-inputs.ts";

const bands = [63, 125, 250, 500, 1000, 2000, 4000, 8000];
const flat = { sourceHeightM: 1, receptorHeightM: 2, groundSource: 0.3, groundMiddle: 0.7, groundReceptor: 1 };
const detour = { sourceToEdgeM: 10, betweenEdgesM: 0, edgeToReceptorM: 20, alongEdgeM: 0 };

/** Inputs at, just below and just above each place where an equation changes its form. */
export const branchEdges: Partial<Record<EquationId, readonly AnyInputs[]>> = {
  "worst-share": [
    // T a multiple of r + p, a hair under and over it; r = T; the on-time share wins; no stop at all
    { onTimePct: 1, longestRunMin: 10, shortestStopMin: 5, averagingMin: 60 },
    { onTimePct: 1, longestRunMin: 10, shortestStopMin: 5.000001, averagingMin: 60 },
    { onTimePct: 1, longestRunMin: 10, shortestStopMin: 4.999999, averagingMin: 60 },
    { onTimePct: 1, longestRunMin: 60, shortestStopMin: 60, averagingMin: 60 },
    { onTimePct: 90, longestRunMin: 1, shortestStopMin: 60, averagingMin: 60 },
    { onTimePct: 50, longestRunMin: 7, shortestStopMin: 0, averagingMin: 60 },
    { onTimePct: 50, longestRunMin: 1440, shortestStopMin: 1440, averagingMin: 5 },
  ],
  "ground-effect": bands.flatMap((bandHz) =>
    // dp = 30 (hs + hr) = 90 m: the middle region begins; heights of 0; 5 m, where a'(h) peaks
    [
      { bandHz, ...flat, planDistanceM: 90 },
      { bandHz, ...flat, planDistanceM: 89.999999 },
      { bandHz, ...flat, planDistanceM: 90.000001 },
      { bandHz, ...flat, planDistanceM: 500, sourceHeightM: 0, receptorHeightM: 0 },
      { bandHz, ...flat, planDistanceM: 500, sourceHeightM: 5, receptorHeightM: 5 },
    ],
  ),
  "ground-effect-alternative": [
    // 2 hm/d (17 + 300/d) = 4.8 at d = 20, hm = 1.5
    { distanceM: 20, meanPathHeightM: 1.5 },
    { distanceM: 20, meanPathHeightM: 1.499999 },
    { distanceM: 20, meanPathHeightM: 1.500001 },
  ],
  "met-correction": [30, 29.999999, 30.000001, 0].map((planDistanceM) => ({
    planDistanceM,
    sourceHeightM: 1,
    receptorHeightM: 2,
    c0Db: 2,
  })),
  "path-difference": [
    { ...detour, distanceM: 30, sightBlocked: 1 },
    { ...detour, distanceM: 30, sightBlocked: 0 },
    { ...detour, distanceM: 29, sightBlocked: 0 },
    { ...detour, betweenEdgesM: 3, alongEdgeM: 4, distanceM: 31, sightBlocked: 1 },
  ],
  "screen-met-factor": [0, 1e-9, -1e-9, 0.1, -0.1].map((pathDifferenceM) => ({
    sourceToEdgeM: 10,
    edgeToReceptorM: 20,
    distanceM: 29,
    pathDifferenceM,
  })),
  "double-edge-factor": bands.flatMap((bandHz) => [0, 1e-6, 1e4].map((betweenEdgesM) => ({ bandHz, betweenEdgesM }))),
  "screen-attenuation": [
    // z = 0; the argument of lg at its floor of 1 (z = −0.1 λ); the cap; a factor of 0; a cap of 0
    { bandHz: 500, pathDifferenceM: 0, groundConstant: 20, edgeFactor: 1, metFactor: 1, capDb: 20 },
    { bandHz: 500, pathDifferenceM: -0.068, groundConstant: 20, edgeFactor: 1, metFactor: 1, capDb: 20 },
    { bandHz: 500, pathDifferenceM: -0.0680001, groundConstant: 20, edgeFactor: 1, metFactor: 1, capDb: 20 },
    { bandHz: 500, pathDifferenceM: -0.0679999, groundConstant: 20, edgeFactor: 1, metFactor: 1, capDb: 20 },
    { bandHz: 500, pathDifferenceM: 3.298, groundConstant: 20, edgeFactor: 1, metFactor: 1, capDb: 20 },
    { bandHz: 500, pathDifferenceM: 3.2981, groundConstant: 20, edgeFactor: 1, metFactor: 1, capDb: 20 },
    { bandHz: 8000, pathDifferenceM: 50, groundConstant: 40, edgeFactor: 3, metFactor: 1, capDb: 25 },
    { bandHz: 8000, pathDifferenceM: 50, groundConstant: 40, edgeFactor: 3, metFactor: 0, capDb: 25 },
    { bandHz: 63, pathDifferenceM: 1, groundConstant: 40, edgeFactor: 3, metFactor: 1, capDb: 0 },
  ],
  "screen-over-top": [
    { diffractionDb: 5, groundDb: 0 },
    { diffractionDb: 5, groundDb: -1e-9 },
    { diffractionDb: 5, groundDb: 5 },
    { diffractionDb: 5, groundDb: 5.000001 },
    { diffractionDb: 0, groundDb: -3 },
  ],
  "screen-over-top-literal": [
    { diffractionDb: 5, groundDb: 5 },
    { diffractionDb: 5, groundDb: 5.000001 },
    { diffractionDb: 0, groundDb: 0 },
  ],
  "unscreened-limit": [
    { levelDb: 50, pathLevelsDb: [50, 50], unscreenedDb: 53.010299956639813 },
    { levelDb: 50, pathLevelsDb: [50, 50], unscreenedDb: 53 },
    { levelDb: 50, pathLevelsDb: [50, 50], unscreenedDb: 54 },
  ],
  "kurze-anderson": [{ fresnelNumber: 0 }, { fresnelNumber: 1e-12 }, { fresnelNumber: 100000 }],
  "through-and-over": [
    { diffractedLossDb: 3.0102999566398, reductionIndexDb: 3.0102999566398 },
    { diffractedLossDb: 3, reductionIndexDb: 3 },
    { diffractedLossDb: 0, reductionIndexDb: 0 },
  ],
  "edges-combined": [{ lossesDb: [3.0102999566398, 3.0102999566398] }, { lossesDb: [3, 3] }, { lossesDb: [0] }],
  "mass-law": [
    // m f = 10^2.35
    { surfaceDensityKgm2: 10 ** 0.35, frequencyHz: 100 },
    { surfaceDensityKgm2: 2.2, frequencyHz: 100 },
    { surfaceDensityKgm2: 2.3, frequencyHz: 100 },
  ],
  "mean-absorption": [
    { areasM2: [10, 20], absorptions: [0.95, 0.1] },
    { areasM2: [10, 20], absorptions: [0.950001, 1] },
  ],
  "enclosure-loss": [
    // S_E/R_i = 0.7, so that C = 0; just under and over the panel's index
    { reductionIndexDb: 0, externalAreaM2: 7, internalAreaM2: 20, absorption: 1 / 3 },
    { reductionIndexDb: 3, externalAreaM2: 24, internalAreaM2: 30, absorption: 0.3 },
    { reductionIndexDb: 4, externalAreaM2: 24, internalAreaM2: 30, absorption: 0.3 },
  ],
  "distance-soft": [{ distanceM: 25 }, { distanceM: 24.999999 }, { distanceM: 25.000001 }],
  "protection-hml": [2, 1.999999, 2.000001, -2, 10].map((difference) => ({
    levelDba: 100,
    levelDbc: 100 + difference,
    highDb: 30,
    mediumDb: 24,
    lowDb: 22,
  })),
  "zone-edge-level": [8, 7.999999, 8.000001, 24].map((shiftH) => ({
    valueDba: 85,
    exchangeFactorDb: 10,
    shiftH,
    uncertaintyDb: 3,
  })),
};
