import { crossing } from "./crossing.ts";
import type { Place } from "./place.ts";
import { planDistanceM } from "./place.ts";

type Side = readonly [Place, Place];

/** Sides already made: distances to one outline are asked for at thousands of positions. */
const known = new WeakMap<readonly Place[], readonly Side[]>();

/** The sides of a closed outline, each as its two ends. */
export function sides(outline: readonly Place[]): readonly Side[] {
  const made =
    known.get(outline) ??
    outline.map((corner, index): Side => [corner, outline[(index + 1) % outline.length] as Place]);
  known.set(outline, made);
  return made;
}

/** Above 0 for an outline given anticlockwise, below 0 for one given clockwise: twice its area [m²]. */
export function orientation(outline: readonly Place[]): number {
  return sides(outline).reduce((sum, [a, b]) => sum + (a.xM * b.yM - b.xM * a.yM), 0);
}

/** Whether a position lies inside a closed outline (even-odd rule). */
export function isInside(place: Place, outline: readonly Place[]): boolean {
  let inside = false;
  for (const [a, b] of sides(outline)) {
    if (a.yM > place.yM === b.yM > place.yM) continue;
    const crossingX = a.xM + ((place.yM - a.yM) / (b.yM - a.yM)) * (b.xM - a.xM);
    if (place.xM < crossingX) inside = !inside;
  }
  return inside;
}

/** Distance from a position to a segment [m]. */
export function distanceToSegmentM(place: Place, a: Place, b: Place): number {
  const lengthSquared = (b.xM - a.xM) ** 2 + (b.yM - a.yM) ** 2;
  if (lengthSquared === 0) return planDistanceM(place, a);
  const raw = ((place.xM - a.xM) * (b.xM - a.xM) + (place.yM - a.yM) * (b.yM - a.yM)) / lengthSquared;
  const t = Math.min(1, Math.max(0, raw));
  return planDistanceM(place, { xM: a.xM + t * (b.xM - a.xM), yM: a.yM + t * (b.yM - a.yM) });
}

/** Distance from a position to the nearest point of an outline, 0 inside it [m]. */
export function distanceToOutlineM(place: Place, outline: readonly Place[]): number {
  if (isInside(place, outline)) return 0;
  return Math.min(...sides(outline).map(([a, b]) => distanceToSegmentM(place, a, b)));
}

/** What floating point leaves of a position that stands on an edge [m]. */
const ON_EDGE_M = 1e-9;

/** Whether a position lies inside a closed outline or on one of its sides. */
export function isInsideOrOnEdge(place: Place, outline: readonly Place[]): boolean {
  return distanceToOutlineM(place, outline) <= ON_EDGE_M;
}

/** Shares of the way from `a` to `b` at which an outline is crossed, in ascending order. */
export function outlineCrossings(a: Place, b: Place, outline: readonly Place[]): readonly number[] {
  return sides(outline)
    .flatMap(([c, d]) => crossing(a, b, c, d)?.onFirst ?? [])
    .sort((s, t) => s - t);
}

/**
 * Corners of a rectangle round a position.
 *
 * @param centre      middle of the rectangle [m]
 * @param lengthM     side along the bearing [m], above 0
 * @param widthM      side across it [m], above 0
 * @param bearingDeg  direction of the length, clockwise from north [°]
 */
export function rectangle(centre: Place, lengthM: number, widthM: number, bearingDeg: number): readonly Place[] {
  const bearing = (bearingDeg * Math.PI) / 180;
  const corner = (forward: number, right: number): Place => ({
    xM: centre.xM + forward * Math.sin(bearing) + right * Math.cos(bearing),
    yM: centre.yM + forward * Math.cos(bearing) - right * Math.sin(bearing),
  });
  const [f, r] = [lengthM / 2, widthM / 2];
  return [corner(f, -r), corner(f, r), corner(-f, r), corner(-f, -r)];
}
