import type { CrossedEdge } from "./obstacle.ts";

/** Two edges crossed within this share of the way are one: a line drawn through the corner of a bent screen touches it once. */
const SAME_PLACE = 1e-6;

/**
 * The crossed edges that a string drawn taut over all of them touches, in the vertical plane through source and receptor point;
 * none if the straight line passes above every edge.
 *
 * @param edges        crossed edges in the order of their share
 * @param fromLevelM   level of the source [m]
 * @param toLevelM     level of the receptor point [m]
 * @param toleranceM   an edge this little below the line still touches it [m]
 */
export function tautEdges(
  edges: readonly CrossedEdge[],
  fromLevelM: number,
  toLevelM: number,
  toleranceM: number,
): readonly CrossedEdge[] {
  const above = edges.filter(
    ({ share, levelM }) => levelM >= fromLevelM + share * (toLevelM - fromLevelM) - toleranceM,
  );
  const touched: CrossedEdge[] = [];
  let at = { share: 0, levelM: fromLevelM };
  for (let open = above; open.length > 0; ) {
    // Of the edges ahead and the receptor point, the one seen at the steepest angle is touched next; the farther of two in line.
    const slopes = open.map((edge) => slope(at, edge));
    const steepest = Math.max(...slopes);
    if (steepest < slope(at, { share: 1, levelM: toLevelM }) - 1e-12) break;
    const index = slopes.lastIndexOf(steepest);
    const next = open[index] as CrossedEdge;
    touched.push(next);
    at = next;
    open = open.filter(({ share }) => share > next.share + SAME_PLACE);
  }
  return touched;
}

function slope(
  from: { readonly share: number; readonly levelM: number },
  to: { readonly share: number; readonly levelM: number },
): number {
  // Two edges at one place: the higher one hides the other.
  const run = Math.max(to.share - from.share, 1e-12);
  return (to.levelM - from.levelM) / run;
}
