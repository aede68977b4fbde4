import { TIE_M } from "../../geometry/place.ts";
import type { Point } from "../site.ts";
import { levelM, slantDistanceM } from "../site.ts";
import { overOneEdge, overTwoEdges } from "./edge-lengths.ts";
import type { CrossedEdge, EdgePoint } from "./obstacle.ts";
import { tautEdges } from "./taut-edges.ts";
import type { Way } from "./way.ts";
import { detourM } from "./way.ts";

/**
 * The way over the top of what stands between: over the one or two edges that a taut string touches; of more than two, the pair
 * with the longest way, which has the largest attenuation (ISO 9613-2:1996, 7.4). Where the line of sight passes above every
 * edge, the way over the edge nearest to it, with z below 0.
 *
 * @param crossed  edges crossed in plan, from the source on
 * @param source, receptor  the two ends
 * @returns        the way, or nothing where no edge is crossed
 */
export function overWay(crossed: readonly CrossedEdge[], source: Point, receptor: Point): Way | undefined {
  if (crossed.length === 0) return undefined;
  const taut = tautEdges(crossed, levelM(source), levelM(receptor), TIE_M);
  if (taut.length === 0)
    return longest(
      crossed.map((edge) => single(edge, source, receptor, false)),
      source,
      receptor,
    );
  const [first, second] = taut;
  if (first && !second) return single(first, source, receptor, true);
  return longest(
    pairs(taut).map(([near, far]) => double(near, far, source, receptor)),
    source,
    receptor,
  );
}

function pairs(edges: readonly CrossedEdge[]): readonly (readonly [CrossedEdge, CrossedEdge])[] {
  return edges.flatMap((near, index) => edges.slice(index + 1).map((far) => [near, far] as const));
}

function longest(ways: readonly Way[], source: Point, receptor: Point): Way | undefined {
  const distanceM = slantDistanceM(source, receptor);
  return ways.reduce<Way | undefined>(
    (kept, next) => (kept && detourM(kept, distanceM) >= detourM(next, distanceM) ? kept : next),
    undefined,
  );
}

function single(crossed: CrossedEdge, source: Point, receptor: Point, sightBlocked: boolean): Way {
  return {
    kind: "over",
    obstacles: [crossed.obstacle.id],
    edgeCount: 1,
    sightBlocked,
    ...overOneEdge(place(source), place(receptor), crossed.edge),
  };
}

function double(near: CrossedEdge, far: CrossedEdge, source: Point, receptor: Point): Way {
  return {
    kind: "over",
    obstacles: [...new Set([near.obstacle.id, far.obstacle.id])],
    edgeCount: 2,
    sightBlocked: true,
    ...overTwoEdges(place(source), place(receptor), near.edge, far.edge),
  };
}

function place(point: Point): EdgePoint {
  return { ...point.at, levelM: levelM(point) };
}
