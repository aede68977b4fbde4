import type { Place } from "../geometry/place.ts";

/** What stands between plant and receptor points while an activity runs: all that propagation needs to know of a site. */
export interface Site {
  readonly air: { readonly temperatureC: number; readonly humidityPct: number; readonly pressureKpa: number };
  readonly ground: Ground;
  readonly screens: readonly Screen[];
  /** How a screen is credited over hard ground, where the ground term is a gain. */
  readonly screenOverHardGround: "conservative" | "literal";
}

/** Ground factors G: the later of two areas that overlap counts. */
export interface Ground {
  readonly elsewhere: number;
  readonly areas: readonly { readonly outline: readonly Place[]; readonly groundFactor: number }[];
}

/** A thin, closed screen along a line, its top edge level. */
export interface Screen {
  readonly id: string;
  readonly line: readonly Place[];
  /** Level of the top edge above the site's datum [m]. */
  readonly topM: number;
}

/** A point in the air over its own ground. */
export interface Point {
  readonly at: Place;
  /** Level of the ground below it, above the site's datum [m]. */
  readonly groundM: number;
  /** Height above that ground [m]. */
  readonly heightM: number;
}

/** Level of a point above the site's datum [m]. */
export function levelM(point: Point): number {
  return point.groundM + point.heightM;
}

/** Straight distance between two points [m]. */
export function slantDistanceM(a: Point, b: Point): number {
  return Math.sqrt((a.at.xM - b.at.xM) ** 2 + (a.at.yM - b.at.yM) ** 2 + (levelM(a) - levelM(b)) ** 2);
}
