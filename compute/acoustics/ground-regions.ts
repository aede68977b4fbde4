import { groundFactor } from "../equations/propagation/ground-factor.ts";
import type { Working } from "../equations/working.ts";
import { isInside, outlineCrossings } from "../geometry/outline.ts";
import type { Place } from "../geometry/place.ts";
import type { Route } from "./route.ts";
import { placeOn, shareOfRoute } from "./route.ts";
import type { Ground } from "./site.ts";

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
 * @param route    the line in plan from source to receptor point, by way of a surface where it is reflected
 * @param sourceHeightM, receptorHeightM  heights above ground [m]
 * @returns        G of each region [1]; where there is no middle region its factor is 0 and has no effect
 */
export function groundFactors(
  working: Working,
  ground: Ground,
  route: Route,
  sourceHeightM: number,
  receptorHeightM: number,
): GroundFactors {
  const sourceEnd = Math.min(1, (30 * sourceHeightM) / route.lengthM);
  const receptorStart = Math.max(0, 1 - (30 * receptorHeightM) / route.lengthM);
  const factor = (from: number, to: number, term: string) => regionFactor(working, ground, route, from, to, term);
  return {
    source: factor(0, sourceEnd, "ground-source"),
    middle: sourceEnd < receptorStart ? factor(sourceEnd, receptorStart, "ground-middle") : 0,
    receptor: factor(receptorStart, 1, "ground-receptor"),
  };
}

function regionFactor(working: Working, ground: Ground, route: Route, from: number, to: number, term: string): number {
  const cuts = groundCuts(ground, route).filter((share) => share > from && share < to);
  const ends = [from, ...cuts, to];
  const pieces = ends.slice(1).map((end, index) => {
    const start = ends[index] as number;
    return {
      lengthM: (end - start) * route.lengthM,
      groundFactor: factorAt(ground, placeOn(route, (start + end) / 2)),
    };
  });
  const crossed = pieces.filter((piece) => piece.lengthM > 0);
  if (crossed.length === 0) return factorAt(ground, placeOn(route, from));
  return working.work(
    groundFactor,
    { lengthsM: crossed.map((piece) => piece.lengthM), groundFactors: crossed.map((piece) => piece.groundFactor) },
    term,
  );
}

/** Shares of a route at which the ground may change, in order. */
function groundCuts(ground: Ground, route: Route): readonly number[] {
  return route.legs
    .flatMap((leg) => [
      leg.toShare,
      ...ground.areas
        .flatMap(({ outline }) => outlineCrossings(leg.from, leg.to, outline))
        .map((share) => shareOfRoute(leg, share)),
    ])
    .sort((a, b) => a - b);
}

function factorAt(ground: Ground, place: Place): number {
  return ground.areas.findLast((area) => isInside(place, area.outline))?.groundFactor ?? ground.elsewhere;
}
