import { sumLevels } from "../equations/levels/sum-levels.ts";
import type { Working } from "../equations/working.ts";
import { silently } from "../equations/working.ts";
import type { Place } from "../geometry/place.ts";
import { planDistanceM } from "../geometry/place.ts";
import type { WalledMachine } from "./zone-machine.ts";
import { distanceToMachineM, machineLevelDba } from "./zone-machine.ts";

/** The place farthest from a machine at which the sum meets the edge level while this machine gives the largest part. */
export interface ZoneReach {
  /** Distance from outline and swing [m], unrounded; pages round it up. */
  readonly distanceM: number;
  readonly at: Place;
}

/** Directions looked at round a machine, and steps along each; the crossing is then halved down to a millimetre. */
const DIRECTIONS = 72;
const STEPS = 80;
/** The best direction is then looked at more closely: steps to either side [°], ten of them each time. */
const CLOSER_DEG = [0.5, 0.05] as const;

/** Level of all machines together at a place [dB(A)], by the zone rule. */
export function zoneSumDba(working: Working, machines: readonly WalledMachine[], place: Place): number {
  return working.work(
    sumLevels,
    { levelsDb: machines.map((machine) => machineLevelDba(working, machine, place)) },
    "zone-sum",
  );
}

/**
 * How far to mark the zone round a machine. Every place of the contour of the sum lies within this distance of the
 * machine that is loudest there, so that marking each machine covers the whole contour.
 *
 * @param machine   the machine
 * @param together  all machines that may run at the same time, this one among them
 * @param edgeDba   edge level [dB(A)]
 * @param beyondM   only places farther out than this are looked for [m]
 * @returns         the farthest such place, at least 1 m out; nothing if another machine leads wherever the edge level is met
 */
export function zoneReach(
  machine: WalledMachine,
  together: readonly WalledMachine[],
  edgeDba: number,
  beyondM = 0,
): ZoneReach | undefined {
  const leads = (place: Place) => isLedBy(machine, together, place, edgeDba);
  const corners = machine.outline.map((corner) => planDistanceM(corner, machine.at));
  const outermostM = reachBoundM(machine, together.length, edgeDba) + Math.max(machine.swingM, ...corners);
  const look = (degrees: number, fromM: number, kept: Reach | undefined) =>
    farther(
      kept,
      farthestAlong(machine, degrees, { fromM, toM: kept?.distanceM ?? beyondM, stepM: outermostM / STEPS }, leads),
    );
  // Alone, the level falls with distance from the outline only: one direction shows it.
  if (together.length === 1) return look(0, outermostM, undefined);
  const found = everyDirection().reduce<Reach | undefined>(
    (kept, degrees) => look(degrees, outermostM, kept),
    undefined,
  );
  return CLOSER_DEG.reduce<Reach | undefined>((kept, stepDeg) => {
    if (!kept) return undefined;
    const { degrees, outM } = kept;
    const beside = Array.from({ length: 21 }, (_, index) => degrees + (index - 10) * stepDeg);
    return beside.reduce<Reach | undefined>((best, each) => look(each, outM + (2 * outermostM) / STEPS, best), kept);
  }, found);
}

/** A reach with the direction it was found in, clockwise from north [°], and its distance from the machine's position [m]. */
interface Reach extends ZoneReach {
  readonly degrees: number;
  readonly outM: number;
}

function farther(kept: Reach | undefined, next: Reach | undefined): Reach | undefined {
  return !next || (kept && kept.distanceM >= next.distanceM) ? kept : next;
}

/** Beyond this distance a place that the machine leads cannot meet the edge level: all others are taken to be as loud. */
function reachBoundM(machine: WalledMachine, count: number, edgeDba: number): number {
  const highestDba = machine.powerDba + 10 * Math.log10(count) + 3 * machine.walls;
  return Math.max(1, Math.sqrt(10 ** (0.1 * (highestDba - edgeDba)) / (2 * Math.PI)));
}

function isLedBy(machine: WalledMachine, together: readonly WalledMachine[], place: Place, edgeDba: number): boolean {
  if (isPlainlyLed(machine, together, place)) return false;
  const ownDba = machineLevelDba(silently, machine, place);
  if (ownDba + 10 * Math.log10(together.length) < edgeDba) return false;
  const levelsDb = together.map((other) => (other === machine ? ownDba : machineLevelDba(silently, other, place)));
  return levelsDb.every((level) => level <= ownDba) && sumLevels.of({ levelsDb }) >= edgeDba;
}

/**
 * Whether another machine leads even if this one were as near as its size allows and the other no nearer than its middle: a
 * bound that spares measuring to outlines.
 */
function isPlainlyLed(machine: WalledMachine, together: readonly WalledMachine[], place: Place): boolean {
  const sizeM = Math.max(machine.swingM, ...machine.outline.map((corner) => planDistanceM(corner, machine.at)));
  const nearestM = Math.max(1, planDistanceM(place, machine.at) - sizeM);
  const highestDb = machine.powerDba + 3 * machine.walls - 20 * Math.log10(nearestM);
  return together.some((other) => {
    const farthestM = Math.max(1, planDistanceM(place, other.at));
    return other !== machine && other.powerDba + 3 * other.walls - 20 * Math.log10(farthestM) > highestDb;
  });
}

function everyDirection(): readonly number[] {
  return Array.from({ length: DIRECTIONS }, (_, index) => (360 * index) / DIRECTIONS);
}

/** The farthest place in one direction that holds, looked for inwards until no place could be farther out than `toM`. */
function farthestAlong(
  machine: WalledMachine,
  degrees: number,
  { fromM, toM, stepM }: { readonly fromM: number; readonly toM: number; readonly stepM: number },
  leads: (place: Place) => boolean,
): Reach | undefined {
  const angle = (degrees * Math.PI) / 180;
  const [east, north] = [Math.sin(angle), Math.cos(angle)];
  const placeAt = (m: number): Place => ({ xM: machine.at.xM + m * east, yM: machine.at.yM + m * north });
  for (let step = Math.ceil(fromM / stepM); step >= 0 && (step + 1) * stepM >= toM; step--) {
    if (!leads(placeAt(step * stepM))) continue;
    const outM = halved(step * stepM, (step + 1) * stepM, (out) => leads(placeAt(out)));
    const at = placeAt(outM);
    return { degrees, outM, at, distanceM: Math.max(1, distanceToMachineM(machine, at)) };
  }
  return undefined;
}

/** The end of the stretch from `inM`, where `holds` is true, to `outM`, where it is not, within a millimetre; the outer side of it. */
function halved(inM: number, outM: number, holds: (m: number) => boolean): number {
  let [low, high] = [inM, outM];
  while (high - low > 0.001) {
    const middle = (low + high) / 2;
    if (holds(middle)) low = middle;
    else high = middle;
  }
  return high;
}
