import { crossing } from "../../geometry/crossing.ts";
import type { Place } from "../../geometry/place.ts";
import type { CrossedEdge, Obstacle, TopEdge } from "./obstacle.ts";

/**
 * The top edges that a plan line crosses, from the source on; an edge touched at its end counts.
 *
 * @param obstacles  what stands
 * @param from, to   ends of the line [m]
 */
export function crossedEdges(obstacles: readonly Obstacle[], from: Place, to: Place): readonly CrossedEdge[] {
  return obstacles
    .flatMap((obstacle) => obstacle.edges.flatMap((edge) => crossedEdge(obstacle, edge, from, to) ?? []))
    .sort((a, b) => a.share - b.share);
}

function crossedEdge(obstacle: Obstacle, edge: TopEdge, from: Place, to: Place): CrossedEdge | undefined {
  const met = crossing(from, to, edge[0], edge[1]);
  if (!met) return undefined;
  const levelM = edge[0].levelM + met.onSecond * (edge[1].levelM - edge[0].levelM);
  return { obstacle, edge, share: met.onFirst, levelM };
}
