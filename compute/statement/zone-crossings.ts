import type { Project } from "../documents/types/project.gen.ts";
import { zoneMetres } from "../figures/display.ts";
import { crossing } from "../geometry/crossing.ts";
import { distanceToSegmentM, sides } from "../geometry/outline.ts";
import type { Place } from "../geometry/place.ts";
import type { Zone } from "../hearing/zone.ts";
import type { ZoneMachine } from "../hearing/zone-machine.ts";
import { distanceToMachineM } from "../hearing/zone-machine.ts";

/** Something that a zone must not pass unless the statement says what keeps people out or lowers the level. */
export type Crossing =
  | { readonly kind: "boundary" }
  | { readonly kind: "public-way"; readonly id: string }
  | { readonly kind: "receptor"; readonly id: string };

/**
 * What of the surroundings lies inside the marked distance of a zone: the distance is taken as it is marked, in whole metres.
 *
 * @param project  boundary, public ways and receptors
 * @param machine  for its outline and swing
 * @param zone     a zone without a distance crosses nothing here: its space is named in words
 */
export function zoneCrossings(project: Project, machine: ZoneMachine, zone: Zone): readonly Crossing[] {
  const distanceM =
    zone.kind === "distance" ? zone.distanceM : zone.kind === "peak-not-known" ? zone.leastM : undefined;
  if (distanceM === undefined) return [];
  const reachM = zoneMetres(distanceM);
  const within = (a: Place, b: Place, halfWidthM: number) => segmentDistanceM(machine, a, b) - halfWidthM < reachM;
  const boundary = sides(project.boundary).some(([a, b]) => within(a, b, 0)) ? [{ kind: "boundary" } as const] : [];
  const ways = project.publicWays
    .filter((way) => way.line.slice(1).some((to, index) => within(way.line[index] as Place, to, way.widthM / 2)))
    .map((way) => ({ kind: "public-way", id: way.id }) as const);
  const receptors = project.receptors
    .filter((receptor) => receptor.points.some((point) => distanceToMachineM(machine, point.at) < reachM))
    .map((receptor) => ({ kind: "receptor", id: receptor.id }) as const);
  return [...boundary, ...ways, ...receptors];
}

/** Distance from a machine's outline and swing to a segment, 0 if they touch [m]. */
function segmentDistanceM(machine: ZoneMachine, a: Place, b: Place): number {
  if (sides(machine.outline).some(([c, d]) => crossing(a, b, c, d))) return 0;
  const corners = machine.outline.map((corner) => distanceToSegmentM(corner, a, b));
  const ends = [a, b].map((end) => distanceToMachineM(machine, end));
  return Math.max(0, Math.min(...corners, ...ends, distanceToSegmentM(machine.at, a, b) - machine.swingM));
}
