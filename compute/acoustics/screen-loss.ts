import { doubleEdgeFactor } from "../equations/screens/double-edge-factor.ts";
import { pathDifference } from "../equations/screens/path-difference.ts";
import { screenAttenuation } from "../equations/screens/screen-attenuation.ts";
import { screenMetFactor } from "../equations/screens/screen-met-factor.ts";
import type { Working } from "../equations/working.ts";
import type { BandHz, Bands } from "./bands.ts";
import { perBand } from "./bands.ts";
import type { ScreenPath } from "./screen-paths.ts";

/** C2 of ISO 9613-2:1996, eq. (14): ground reflections are part of it. */
const GROUND_CONSTANT = 20;
/** Highest screen attenuation the standard credits at one edge and at two [dB] (ISO 9613-2:1996, 7.4). */
const CAP_DB = { single: 20, double: 25 } as const;
/** Speed of sound in λ = 340/f [m/s] (ISO 9613-2:1996, 7.4). */
export const SCREEN_SOUND_SPEED_MS = 340;

/** Path-length difference and screen attenuation of one path. */
export interface ScreenLoss {
  readonly pathDifferenceM: number;
  readonly lossDb: Bands;
}

/**
 * Attenuation Dz of one path past the edges of a screen, per octave band (ISO 9613-2:1996, eq. (14) to (18)).
 *
 * @param working    what works the equations out
 * @param path       lengths of the path [m]
 * @param distanceM  straight distance from source to receptor point [m], above 0
 * @returns          z [m] and Dz per band [dB], unrounded
 */
export function screenLoss(working: Working, path: ScreenPath, distanceM: number): ScreenLoss {
  const { sourceToEdgeM, betweenEdgesM, edgeToReceptorM, alongEdgeM } = path;
  const sightBlocked = path.sightBlocked ? 1 : 0;
  const pathDifferenceM = working.work(
    pathDifference,
    { sourceToEdgeM, betweenEdgesM, edgeToReceptorM, alongEdgeM, distanceM, sightBlocked },
    "path-difference",
  );
  const metFactor =
    path.kind === "over"
      ? working.work(screenMetFactor, { sourceToEdgeM, edgeToReceptorM, distanceM, pathDifferenceM }, "met-factor")
      : 1;
  const capDb = betweenEdgesM > 0 ? CAP_DB.double : CAP_DB.single;
  const loss = (bandHz: BandHz) => {
    const here = working.at(`band:${bandHz}`);
    const edgeFactor = here.work(doubleEdgeFactor, { bandHz, betweenEdgesM }, "edge-factor");
    return here.work(
      screenAttenuation,
      { bandHz, pathDifferenceM, groundConstant: GROUND_CONSTANT, edgeFactor, metFactor, capDb },
      "diffraction",
    );
  };
  return { pathDifferenceM, lossDb: perBand(loss) };
}
