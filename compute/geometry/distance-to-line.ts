import { distanceToSegmentM } from "./outline.ts";
import type { Place } from "./place.ts";

/** Distance from a position to the nearest point of an open line [m]. */
export function distanceToLineM(place: Place, line: readonly Place[]): number {
  const pieces = line.slice(1).map((to, index) => distanceToSegmentM(place, line[index] ?? to, to));
  return Math.min(...pieces);
}
