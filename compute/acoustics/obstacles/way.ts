import type { EdgeLengths } from "./edge-lengths.ts";

/** A way from source to receptor point past edges, with what it passes. */
export interface Way extends EdgeLengths {
  readonly kind: "over" | "left" | "right";
  /** Obstacles whose edges it touches, without doubles. */
  readonly obstacles: readonly string[];
  readonly edgeCount: 1 | 2;
  /** Whether the straight line meets an edge (z above 0). */
  readonly sightBlocked: boolean;
}

/** Signed detour of a way over the straight line [m]: z of ISO 9613-2:1996, eq. (16), (17). */
export function detourM(way: EdgeLengths & { readonly sightBlocked: boolean }, distanceM: number): number {
  const bentM = way.sourceToEdgeM + way.betweenEdgesM + way.edgeToReceptorM;
  const detour = Math.sqrt(bentM ** 2 + way.alongEdgeM ** 2) - distanceM;
  return way.sightBlocked ? detour : -detour;
}
