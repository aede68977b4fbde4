import type { Place } from "../types/common.gen.ts";
import { distanceToSegment } from "./distance-to-segment.ts";

/** Shortest distance on the plane from a place to an open line [m]. */
export function distanceToLine(place: Place, line: readonly Place[]): number {
  const pieces = line.slice(1).map((to, index) => distanceToSegment(place, line[index] ?? to, to));
  return Math.min(...pieces);
}
