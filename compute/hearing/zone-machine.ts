import { zoneLevel } from "../equations/hearing/zone-level.ts";
import type { Working } from "../equations/working.ts";
import { distanceToOutlineM } from "../geometry/outline.ts";
import type { Place } from "../geometry/place.ts";
import { planDistanceM } from "../geometry/place.ts";
import type { Peak } from "./peak.ts";

/** A machine as the zone rule sees it: at full running, with its outline and swing and what reflects beside it. */
export interface ZoneMachine {
  readonly id: string;
  /** A-weighted sound power at full running [dB(A)], less an enclosure that the notice names as closed. */
  readonly powerDba: number;
  readonly at: Place;
  readonly outline: readonly Place[];
  /** Reach of the swing round its position [m], 0 without one. */
  readonly swingM: number;
  readonly largestDimensionM: number;
  /** Distances from its outline to walls, hoardings and excavation sides that face it [m]. */
  readonly wallsM: readonly number[];
  /** Level at its work station [dB(A)], where a data sheet gives one. */
  readonly workStationDba: number | undefined;
  readonly impulsive: boolean;
  /** C-weighted peak level at a distance [dB(C)], where a data sheet gives one. */
  readonly peak: Peak | undefined;
  /** An open place has a radius; in a trench, a room, a tunnel or under a slab the whole space is the zone. */
  readonly open: boolean;
}

/** A machine with the number of walls that its level is raised for: those nearer to it than the edge of its zone. */
export interface WalledMachine extends ZoneMachine {
  readonly walls: number;
}

/** Distance from a place to the nearest point of a machine's outline and swing, 0 on it [m]. */
export function distanceToMachineM(machine: ZoneMachine, place: Place): number {
  return Math.max(
    0,
    Math.min(distanceToOutlineM(place, machine.outline), planDistanceM(place, machine.at) - machine.swingM),
  );
}

/**
 * Level of a machine at a place by the zone rule: hemispherical over hard ground, never nearer than 1 m, 3 dB more for
 * each wall nearer to the machine than the edge of its zone.
 *
 * @returns level [dB(A)], unrounded
 */
export function machineLevelDba(working: Working, machine: WalledMachine, place: Place): number {
  const distanceM = Math.max(1, distanceToMachineM(machine, place));
  const { powerDba, walls } = machine;
  return working.at(`machine:${machine.id}`).work(zoneLevel, { powerDba, distanceM, walls }, "zone-level");
}
