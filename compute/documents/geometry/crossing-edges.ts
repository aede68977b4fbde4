import type { Place } from "../types/common.gen.ts";
import { distanceToSegment } from "./distance-to-segment.ts";

type Edge = readonly [from: Place, to: Place];

/** What floating point leaves of a corner that stands on another edge [m]. */
const TOUCH_M = 1e-9;

/** The first two edges of a closed outline that cross, touch or run back along each other, numbered by their first corners. */
export function crossingEdges(outline: readonly Place[]): readonly [number, number] | undefined {
  const count = outline.length;
  const edges = outline.map((from, index): Edge => [from, outline[(index + 1) % count] ?? from]);
  for (const [a, one] of edges.entries()) {
    for (const [b, other] of edges.entries()) {
      if (b <= a) continue;
      const follow = b === a + 1 ? runsBack(one, other) : b - a === count - 1 ? runsBack(other, one) : undefined;
      if (follow ?? meet(one, other)) return [a, b];
    }
  }
  return undefined;
}

/** Whether the second of two edges that share a corner goes straight back along the first. */
function runsBack([start, corner]: Edge, [, end]: Edge): boolean {
  return (
    turn(start, corner, end) === 0 &&
    (corner.xM - start.xM) * (end.xM - corner.xM) + (corner.yM - start.yM) * (end.yM - corner.yM) < 0
  );
}

function meet([a, b]: Edge, [c, d]: Edge): boolean {
  if (turn(a, b, c) * turn(a, b, d) < 0 && turn(c, d, a) * turn(c, d, b) < 0) return true;
  const gaps = [
    distanceToSegment(a, c, d),
    distanceToSegment(b, c, d),
    distanceToSegment(c, a, b),
    distanceToSegment(d, a, b),
  ];
  return Math.min(...gaps) <= TOUCH_M;
}

/** Twice the signed area of a triangle: above 0 where the way turns left [m²]. */
function turn(a: Place, b: Place, c: Place): number {
  return (b.xM - a.xM) * (c.yM - a.yM) - (b.yM - a.yM) * (c.xM - a.xM);
}
