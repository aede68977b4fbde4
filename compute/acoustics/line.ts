import type { Bands } from "./bands.ts";
import type { CrossedEdge } from "./obstacles/obstacle.ts";
import type { Route } from "./route.ts";
import type { Point } from "./site.ts";

/** A straight line from a source, or from its image in a surface, to a receptor point. */
export interface Line {
  /** `straight`, or `facet-<n>` for a reflection. */
  readonly name: string;
  readonly source: Point;
  readonly receptor: Point;
  readonly route: Route;
  /** Edges it crosses in plan, from the source on. */
  readonly crossed: readonly CrossedEdge[];
  /** Sound power of the source or of its image [dB re 1 pW], less what a control at the machine takes off. */
  readonly powerDb: Bands;
  readonly controlLossDb: Bands;
  /** The surface, for an image. */
  readonly reflectedBy: string | undefined;
  /** What the surface takes [dB]; 0 for a source. */
  readonly reflectionDb: Bands;
}
