import type { Place } from "../types/common.gen.ts";

/** Shortest distance on the plane from a place to a straight piece of line [m]. */
export function distanceToSegment(place: Place, from: Place, to: Place): number {
  const [dx, dy] = [to.xM - from.xM, to.yM - from.yM];
  const square = dx * dx + dy * dy;
  const along = square === 0 ? 0 : ((place.xM - from.xM) * dx + (place.yM - from.yM) * dy) / square;
  const t = Math.min(1, Math.max(0, along));
  return Math.hypot(place.xM - from.xM - t * dx, place.yM - from.yM - t * dy);
}
