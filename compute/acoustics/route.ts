import type { Place } from "../geometry/place.ts";
import { along } from "../geometry/place.ts";

/** The line in plan that sound follows: one leg, or two where it is reflected; shares run from 0 at the source to 1. */
export interface Route {
  readonly lengthM: number;
  readonly legs: readonly Leg[];
}

export interface Leg {
  readonly fromShare: number;
  readonly toShare: number;
  readonly from: Place;
  readonly to: Place;
}

/** Share of the whole route at a share of one leg. */
export function shareOfRoute(leg: Leg, share: number): number {
  return leg.fromShare + share * (leg.toShare - leg.fromShare);
}

/** The place on the ground at a share of the route. */
export function placeOn(route: Route, share: number): Place {
  const leg = route.legs.find(({ toShare }) => share <= toShare) ?? route.legs.at(-1);
  if (!leg) throw new Error("a route has at least one leg");
  return along(leg.from, leg.to, (share - leg.fromShare) / (leg.toShare - leg.fromShare));
}
