import { doubleEdgeFactor } from "../equations/screens/double-edge-factor.ts";
import { pathDifference } from "../equations/screens/path-difference.ts";
import { screenAttenuation } from "../equations/screens/screen-attenuation.ts";
import { screenMetFactor } from "../equations/screens/screen-met-factor.ts";
import type { Working } from "../equations/working.ts";
import type { BandHz } from "./bands.ts";
import type { Way } from "./obstacles/way.ts";

/** C2 of ISO 9613-2:1996, eq. (14): ground reflections are part of it. */
const GROUND_CONSTANT = 20;
/** Highest screen attenuation the standard credits at one edge and at two [dB] (ISO 9613-2:1996, 7.4). */
const CAP_DB = { 1: 20, 2: 25 } as const;

/**
 * Attenuation Dz of one way past edges in one octave band (ISO 9613-2:1996, eq. (14) to (18)).
 *
 * @param working    what works the equations out
 * @param way        lengths of the way [m]
 * @param distanceM  straight distance from source to receptor point [m], above 0
 * @param bandHz     nominal octave band [Hz]
 * @returns          Dz [dB], unrounded
 */
export function screenLossDb(working: Working, way: Way, distanceM: number, bandHz: BandHz): number {
  const { sourceToEdgeM, betweenEdgesM, edgeToReceptorM, alongEdgeM, sightBlocked } = way;
  const lengths = { sourceToEdgeM, betweenEdgesM, edgeToReceptorM, alongEdgeM, distanceM };
  const pathDifferenceM = working.work(
    pathDifference,
    { ...lengths, sightBlocked: sightBlocked ? 1 : 0 },
    "path-difference",
  );
  const metFactor =
    way.kind === "over"
      ? working.work(screenMetFactor, { sourceToEdgeM, edgeToReceptorM, distanceM, pathDifferenceM }, "met-factor")
      : 1;
  const edgeFactor = working.work(doubleEdgeFactor, { bandHz, betweenEdgesM }, "edge-factor");
  return working.work(
    screenAttenuation,
    { bandHz, pathDifferenceM, groundConstant: GROUND_CONSTANT, edgeFactor, metFactor, capDb: CAP_DB[way.edgeCount] },
    "diffraction",
  );
}
