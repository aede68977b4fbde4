import type { Place } from "../../geometry/place.ts";
import type { Bands } from "../bands.ts";

/** An upright surface that reflects: a wall of a building, a side of a screen. */
export interface Facet {
  /** Building or screen it belongs to. */
  readonly owner: string;
  /** Where it reflects, seen from `from` to `to`: a wall outside its building only, a screen on both sides. */
  readonly reflects: "left" | "both-sides";
  readonly from: Place;
  readonly to: Place;
  /** Levels of its lower and upper edge above the site's datum [m]. */
  readonly bottomM: number;
  readonly topM: number;
  /** Energy reflection coefficient ρ by octave band [1], 0 to 1. */
  readonly reflection: Bands;
}
