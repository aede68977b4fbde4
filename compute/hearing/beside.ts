import type { Working } from "../equations/working.ts";
import { silently } from "../equations/working.ts";
import type { Place } from "../geometry/place.ts";
import { zoneSumDba } from "./zone-distance.ts";
import type { WalledMachine } from "./zone-machine.ts";
import { distanceToMachineM } from "./zone-machine.ts";

/** Directions in which the level beside a machine is looked at. */
const DIRECTIONS = 72;

/**
 * Highest level of the sum 1 m outside a machine's outline and swing, where a bystander may be all shift.
 *
 * @param working   what works the equations out
 * @param machine   the machine
 * @param together  all machines that may run at the same time, this one among them
 * @returns         level [dB(A)], unrounded
 */
export function highestBesideDba(working: Working, machine: WalledMachine, together: readonly WalledMachine[]): number {
  const places = Array.from({ length: DIRECTIONS }, (_, index) => beside(machine, (2 * Math.PI * index) / DIRECTIONS));
  const levels = places.map((place) => zoneSumDba(silently, together, place));
  const loudest = places[levels.indexOf(Math.max(...levels))] as Place;
  return zoneSumDba(working.at("place:beside"), together, loudest);
}

/** The place 1 m outside outline and swing in a direction from the machine's position, on the near side by less than 0.1 mm. */
function beside(machine: WalledMachine, angle: number): Place {
  const placeAt = (m: number): Place => ({
    xM: machine.at.xM + m * Math.sin(angle),
    yM: machine.at.yM + m * Math.cos(angle),
  });
  let [low, high] = [0, machine.largestDimensionM + machine.swingM + 1 + 1000];
  while (high - low > 1e-4) {
    const middle = (low + high) / 2;
    if (distanceToMachineM(machine, placeAt(middle)) >= 1) high = middle;
    else low = middle;
  }
  return placeAt(low);
}
