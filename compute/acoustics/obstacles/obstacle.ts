import type { Place } from "../../geometry/place.ts";
import type { Bands } from "../bands.ts";

/** A point of an edge: position and level above the site's datum [m]. */
export interface EdgePoint extends Place {
  readonly levelM: number;
}

/** A straight top edge, level or sloping. */
export type TopEdge = readonly [from: EdgePoint, to: EdgePoint];

/**
 * What sound has to bend over or round: a screen along a line, a bund along its crest, a building with its roof edges, the rim
 * of an excavation.
 */
export interface Obstacle {
  readonly id: string;
  readonly kind: "screen" | "bund" | "building" | "excavation";
  readonly edges: readonly TopEdge[];
  /** Corners in plan that a way round it has to pass; none where there is no way round, as at the rim of an excavation. */
  readonly corners: readonly Place[];
  /** What gets through its panels, joints and gaps, by octave band [dB]; nothing for a solid body. */
  readonly throughDb: Bands | undefined;
}

/** Where the plan line from source to receptor point crosses a top edge. */
export interface CrossedEdge {
  readonly obstacle: Obstacle;
  readonly edge: TopEdge;
  /** Share of the way from the source, 0 to 1. */
  readonly share: number;
  /** Level of the edge there [m]. */
  readonly levelM: number;
}
