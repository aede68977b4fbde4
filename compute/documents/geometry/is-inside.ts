import type { Place } from "../types/common.gen.ts";
import { distanceToSegment } from "./distance-to-segment.ts";

/** What floating point leaves of a place that stands on an edge [m]. */
const ON_EDGE_M = 1e-9;

/** Whether a place lies inside a closed outline or on its edge. */
export function isInside(place: Place, outline: readonly Place[]): boolean {
  let inside = false;
  for (const [index, to] of outline.entries()) {
    const from = outline.at(index - 1) ?? to;
    if (distanceToSegment(place, from, to) <= ON_EDGE_M) return true;
    const between = from.yM > place.yM !== to.yM > place.yM;
    if (between && place.xM < from.xM + ((place.yM - from.yM) / (to.yM - from.yM)) * (to.xM - from.xM))
      inside = !inside;
  }
  return inside;
}
