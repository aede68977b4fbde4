import type { Working } from "../equations/working.ts";
import type { Place } from "../geometry/place.ts";
import { highestBesideDba } from "./beside.ts";
import type { Comparator } from "./peak.ts";
import { peakDistanceM, peakMeets } from "./peak.ts";
import { withWalls } from "./walls.ts";
import { zoneReach, zoneSumDba } from "./zone-distance.ts";
import type { WalledMachine } from "./zone-machine.ts";

/** Where ear protection is mandatory round one machine. */
export type Zone =
  /** Mark this distance round outline and swing. */
  | {
      readonly kind: "distance";
      readonly machine: string;
      readonly distanceM: number;
      readonly at: Place;
      readonly nearField: boolean;
      /** Which criterion asks for the larger distance. */
      readonly by: "level" | "peak";
    }
  /** The edge level is met at this machine only because of a louder one, inside whose zone it stands. */
  | { readonly kind: "inside-another"; readonly machine: string }
  /** No radius between walls or under a slab: the whole space. */
  | { readonly kind: "whole-space"; readonly machine: string }
  /** Impulses without peak data: the whole work area of the activity, until measured. */
  | {
      readonly kind: "peak-not-known";
      readonly machine: string;
      /** How far the zone reaches by level alone [m]: for checking what it passes, never printed. */
      readonly leastM: number | undefined;
    }
  | { readonly kind: "none"; readonly machine: string };

/** Peak data that meet the value make a zone; it is marked out to where they come down to the value less U. */
export interface PeakEdge {
  readonly valueDbc: number;
  readonly comparator: Comparator;
  /** U [dB]. */
  readonly uncertaintyDb: number;
}

export interface ZoneEdges {
  /** Edge level [dB(A)]. */
  readonly levelDba: number;
  /** The peak criterion, where the duty set has one. */
  readonly peak: PeakEdge | undefined;
}

/**
 * The zone round one machine, by the one rule for figures, drawings and notices.
 *
 * @param working   what works the equations out
 * @param machine   the machine
 * @param together  all machines that may run at the same time, this one among them
 * @param edges     where the zone ends
 */
export function zoneOf(
  working: Working,
  machine: WalledMachine,
  together: readonly WalledMachine[],
  edges: ZoneEdges,
): Zone {
  if (machine.impulsive && !machine.peak) {
    const leastM = machine.open ? widestReach(machine, together, edges.levelDba)?.reach.distanceM : undefined;
    return { kind: "peak-not-known", machine: machine.id, leastM };
  }
  const peakM = peakReachM(working, machine, edges.peak);
  const loudBeside = highestBesideDba(working, machine, together) >= edges.levelDba;
  const loud = loudBeside || (machine.workStationDba ?? 0) >= edges.levelDba;
  if (!loud && peakM === undefined) return { kind: "none", machine: machine.id };
  if (!machine.open) return { kind: "whole-space", machine: machine.id };
  const widest = loud ? widestReach(machine, together, edges.levelDba) : undefined;
  if (widest && widest.reach.distanceM >= (peakM ?? 0)) {
    zoneSumDba(working.at("place:edge"), widest.running, widest.reach.at);
    return distanceZone(machine, widest.reach.distanceM, widest.reach.at, "level");
  }
  if (peakM !== undefined) return distanceZone(machine, peakM, machine.at, "peak");
  // Only the work station is loud: the least distance that the rule knows.
  return loudBeside ? { kind: "inside-another", machine: machine.id } : distanceZone(machine, 1, machine.at, "level");
}

/**
 * The farther of two reaches: in the sum of all, up to where the machine leads, and by itself, since the others stop and their
 * marks come down while it goes on.
 */
function widestReach(machine: WalledMachine, together: readonly WalledMachine[], edgeDba: number) {
  const inSum = zoneReach(machine, together, edgeDba);
  const alone = withWalls([machine], edgeDba);
  const [own] = alone.flatMap((each) => zoneReach(each, alone, edgeDba) ?? []);
  if (own && own.distanceM > (inSum?.distanceM ?? 0)) return { reach: own, running: alone };
  return inSum && { reach: inSum, running: together };
}

function distanceZone(machine: WalledMachine, distanceM: number, at: Place, by: "level" | "peak"): Zone {
  return {
    kind: "distance",
    machine: machine.id,
    distanceM,
    at,
    by,
    nearField: distanceM < 2 * machine.largestDimensionM,
  };
}

/** Distance to mark for the peak criterion [m], at least 1; nothing without data or criterion, or if the data do not meet it. */
function peakReachM(working: Working, machine: WalledMachine, edge: PeakEdge | undefined): number | undefined {
  if (!machine.peak || !edge || !peakMeets(working, machine.peak, edge.valueDbc, edge.comparator)) return undefined;
  return Math.max(1, peakDistanceM(working, machine.peak, edge.valueDbc - edge.uncertaintyDb));
}
