import type { Bands } from "./bands.ts";

/** How sound gets from source to receptor point. */
export type PathKind =
  | "direct"
  | "over"
  | "left"
  | "right"
  | "left-then-over"
  | "right-then-over"
  | "through"
  | "reflected";

/** The terms of one path [dB per band], the level they give, and what it passes. */
export interface PathTerms {
  readonly kind: PathKind;
  /** Names of its line and of itself on that line, as they stand in the places of a recording. */
  readonly line: string;
  readonly name: string;
  /** Obstacles it bends over or round, the screen it goes through, or what reflects it and what it then bends over. */
  readonly past: readonly string[];
  /** z of the way over or round what counts at 8 kHz [m]; absent where nothing is bent round. */
  readonly pathDifferenceM: number | undefined;
  /** Straight distance, along the reflected line where there is one [m]. */
  readonly distanceM: number;
  /** Solid-angle index, which goes with the alternative ground method; else 0. */
  readonly directivityDb: number;
  readonly divergenceDb: number;
  readonly airDb: Bands;
  readonly groundDb: Bands;
  /** Abar; `NOT_COUNTED_DB` in a band in which there is nothing to go round or through. */
  readonly screenDb: Bands;
  /** What a surface takes, −10 lg ρ; `NOT_COUNTED_DB` in a band in which the surface is too small to count. */
  readonly reflectionDb: Bands;
  /** What the paths of a line together would lie above its unscreened level, taken off each of them. */
  readonly capDb: Bands;
  readonly levelDb: Bands;
}

/** Stands for a reflection or a way that does not count in a band: the level then adds nothing to any sum [dB]. */
export const NOT_COUNTED_DB = 300;
