import type { Place } from "../geometry/place.ts";
import type { Obstacle } from "./obstacles/obstacle.ts";
import type { Facet } from "./reflections/facet.ts";

/** What stands between plant and receptor points while an activity runs: all that propagation needs to know of a site. */
export interface Site {
  readonly air: { readonly temperatureC: number; readonly humidityPct: number; readonly pressureKpa: number };
  readonly ground: Ground;
  readonly obstacles: readonly Obstacle[];
  /** Surfaces that reflect; none where the project's method leaves reflections out. */
  readonly facets: readonly Facet[];
  readonly method: Method;
}

/** Choices that ISO 9613-2:1996 leaves open, named by the project. */
export interface Method {
  /** 7.3.1, or 7.3.2 with the solid-angle index. */
  readonly ground: "general" | "alternative";
  /** How a screen is credited over hard ground, where the ground term is a gain. */
  readonly screenOverHardGround: "conservative" | "literal";
  /** C0 of the meteorological correction, 0 for the downwind condition [dB]. */
  readonly c0Db: number;
}

/** Ground factors G: the later of two areas that overlap counts. */
export interface Ground {
  readonly elsewhere: number;
  readonly areas: readonly { readonly outline: readonly Place[]; readonly groundFactor: number }[];
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
