import { crossing, isBetweenEnds } from "../../geometry/crossing.ts";
import type { Place } from "../../geometry/place.ts";
import { along, planDistanceM, side } from "../../geometry/place.ts";
import type { Point } from "../site.ts";
import { levelM, slantDistanceM } from "../site.ts";
import type { Facet } from "./facet.ts";

/** A first-order reflection that can be constructed: the mirrored source and where the sound meets the surface. */
export interface Image {
  readonly facet: Facet;
  /** The source mirrored in the surface. */
  readonly source: Point;
  /** Share of the way from the mirrored source at which the surface is met. */
  readonly share: number;
  readonly at: Place;
  /** Distances source to surface and surface to receptor point [m]. */
  readonly toSurfaceM: number;
  readonly fromSurfaceM: number;
  /** Angle between the sound and the surface's normal [rad], 0 to under π/2. */
  readonly incidenceRad: number;
  /** Smallest dimension of the surface [m]. */
  readonly smallestM: number;
}

/**
 * The reflection of a source in a surface towards a receptor point, if one can be constructed (ISO 9613-2:1996, 7.5, condition 1):
 * both lie on one side of it, that reflects, and the mirrored line meets it inside its edges.
 */
export function imageIn(facet: Facet, source: Point, receptor: Point): Image | undefined {
  const ofSource = side(facet.from, facet.to, source.at);
  const ofReceptor = side(facet.from, facet.to, receptor.at);
  const lengthM = planDistanceM(facet.from, facet.to);
  // A source or point closer than 1 cm to the surface's plane has no image worth the name.
  if (ofSource * ofReceptor <= 0 || Math.min(Math.abs(ofSource), Math.abs(ofReceptor)) < 0.01 * lengthM)
    return undefined;
  if (facet.reflects === "left" && ofSource < 0) return undefined;
  const mirrored: Point = { ...source, at: mirror(facet, source.at) };
  const met = crossing(mirrored.at, receptor.at, facet.from, facet.to);
  if (!met || !isBetweenEnds(met)) return undefined;
  const metLevelM = levelM(source) + met.onFirst * (levelM(receptor) - levelM(source));
  if (metLevelM < facet.bottomM || metLevelM > facet.topM) return undefined;
  const distanceM = slantDistanceM(mirrored, receptor);
  const squareM = (Math.abs(ofSource) + Math.abs(ofReceptor)) / lengthM;
  return {
    facet,
    source: mirrored,
    share: met.onFirst,
    at: along(mirrored.at, receptor.at, met.onFirst),
    toSurfaceM: met.onFirst * distanceM,
    fromSurfaceM: (1 - met.onFirst) * distanceM,
    incidenceRad: Math.acos(Math.min(1, squareM / distanceM)),
    smallestM: Math.min(lengthM, facet.topM - facet.bottomM),
  };
}

/** A place mirrored in the line of a surface. */
export function mirror(facet: Facet, place: Place): Place {
  const [dx, dy] = [facet.to.xM - facet.from.xM, facet.to.yM - facet.from.yM];
  const offset = (2 * side(facet.from, facet.to, place)) / (dx ** 2 + dy ** 2);
  return { xM: place.xM + offset * dy, yM: place.yM - offset * dx };
}
