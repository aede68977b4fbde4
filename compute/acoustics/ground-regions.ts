import { groundFactor } from "../equations/propagation/ground-factor.ts";
import type { Working } from "../equations/working.ts";
import { isInside, outlineCrossings } from "../geometry/outline.ts";
import type { Place } from "../geometry/place.ts";
import { along, planDistanceM } from "../geometry/place.ts";
import type { Ground, Point } from "./site.ts";

export interface GroundFactors {
  readonly source: number;
  readonly middle: number;
  readonly receptor: number;
}

/**
 * Ground factors of the three regions between source and receptor point, each the length-weighted share of the
 * ground crossed (ISO 9613-2:1996, 7.3.1; the weighting by length is the reading of ISO/TR 17534-3, 6.2.5).
 *
 * @param working  what works the equations out
 * @param ground   ground areas of the site
 * @param source, receptor  the two ends, heights above ground [m]
 * @returns        G of each region [1]; where there is no middle region its factor is 0 and has no effect
 */
export function groundFactors(working: Working, ground: Ground, source: Point, receptor: Point): GroundFactors {
  const planM = planDistanceM(source.at, receptor.at);
  const sourceEnd = Math.min(1, (30 * source.heightM) / planM);
  const receptorStart = Math.max(0, 1 - (30 * receptor.heightM) / planM);
  const factor = (from: number, to: number, term: string) =>
    regionFactor(working, ground, source.at, receptor.at, from, to, term);
  return {
    source: factor(0, sourceEnd, "ground-source"),
    middle: sourceEnd < receptorStart ? factor(sourceEnd, receptorStart, "ground-middle") : 0,
    receptor: factor(receptorStart, 1, "ground-receptor"),
  };
}

function regionFactor(
  working: Working,
  ground: Ground,
  a: Place,
  b: Place,
  from: number,
  to: number,
  term: string,
): number {
  const planM = planDistanceM(a, b);
  const cuts = ground.areas.flatMap((area) => outlineCrossings(a, b, area.outline)).filter((t) => t > from && t < to);
  const ends = [from, ...cuts.sort((s, t) => s - t), to];
  const pieces = ends.slice(1).map((end, index) => {
    const start = ends[index] as number;
    return { lengthM: (end - start) * planM, groundFactor: factorAt(ground, along(a, b, (start + end) / 2)) };
  });
  const crossed = pieces.filter((piece) => piece.lengthM > 0);
  if (crossed.length === 0) return factorAt(ground, along(a, b, from));
  return working.work(
    groundFactor,
    { lengthsM: crossed.map((piece) => piece.lengthM), groundFactors: crossed.map((piece) => piece.groundFactor) },
    term,
  );
}

function factorAt(ground: Ground, place: Place): number {
  return ground.areas.findLast((area) => isInside(place, area.outline))?.groundFactor ?? ground.elsewhere;
}
