import { distanceToSegmentM, sides } from "./outline.ts";
import type { Place } from "./place.ts";
import { side } from "./place.ts";

type Edge = readonly [from: Place, to: Place];

/** What floating point leaves of a corner that stands on another edge [m]. */
const TOUCH_M = 1e-9;

/** The first two edges of a closed outline that cross, touch or run back along each other, numbered by their first corners. */
export function crossingEdges(outline: readonly Place[]): readonly [number, number] | undefined {
  const edges = sides(outline);
  for (const [a, one] of edges.entries()) {
    for (const [b, other] of edges.entries()) {
      if (b <= a) continue;
      const follow = b === a + 1 ? runsBack(one, other) : b - a === edges.length - 1 ? runsBack(other, one) : undefined;
      if (follow ?? meet(one, other)) return [a, b];
    }
  }
  return undefined;
}

/** Whether the second of two edges that share a corner goes straight back along the first. */
function runsBack([start, corner]: Edge, [, end]: Edge): boolean {
  return (
    side(start, corner, end) === 0 &&
    (corner.xM - start.xM) * (end.xM - corner.xM) + (corner.yM - start.yM) * (end.yM - corner.yM) < 0
  );
}

function meet([a, b]: Edge, [c, d]: Edge): boolean {
  if (side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0) return true;
  const gaps = [
    distanceToSegmentM(a, c, d),
    distanceToSegmentM(b, c, d),
    distanceToSegmentM(c, a, b),
    distanceToSegmentM(d, a, b),
  ];
  return Math.min(...gaps) <= TOUCH_M;
}
