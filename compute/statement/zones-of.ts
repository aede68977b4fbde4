import type { DutySet } from "../documents/types/duty-set.gen.ts";
import type { Working } from "../equations/working.ts";
import { highestBesideDba } from "../hearing/beside.ts";
import type { Shift } from "../hearing/edge-level.ts";
import { zoneEdgeDba } from "../hearing/edge-level.ts";
import type { Duty, Notice } from "../hearing/notice.ts";
import { notice } from "../hearing/notice.ts";
import { withWalls } from "../hearing/walls.ts";
import type { PeakEdge, Zone } from "../hearing/zone.ts";
import { zoneOf } from "../hearing/zone.ts";
import type { WalledMachine, ZoneMachine } from "../hearing/zone-machine.ts";
import type { Assessment } from "./assess.ts";
import { everCoincide } from "./coincident.ts";
import type { StatementInputs } from "./inputs.ts";
import { entry } from "./inputs.ts";
import type { Scene, SceneActivity } from "./scene.ts";
import type { Crossing } from "./zone-crossings.ts";
import { zoneCrossings } from "./zone-crossings.ts";
import { zoneMachines } from "./zone-machines.ts";

/** The zone of one plant item during its activity. */
export interface ItemZone {
  readonly activity: string;
  readonly item: string;
  readonly zone: Zone;
  /** Sum of all that may run together, 1 m outside outline and swing [dB(A)]. */
  readonly besideDba: number;
  readonly workStationDba: number | undefined;
  /** What of the surroundings lies inside the zone. */
  readonly crossings: readonly Crossing[];
}

/** Zones and notice of a statement by the project's duty set. */
export interface EarProtection {
  readonly dutySet: string;
  readonly shift: Shift;
  /** Level at which zones end [dB(A)], unrounded. */
  readonly edgeDba: number;
  readonly zones: readonly ItemZone[];
  readonly notice: Notice;
}

/**
 * Zones of all plant and the notice of a statement, with the controls that are adopted.
 *
 * @param working     what works the equations out
 * @param inputs      documents of the statement
 * @param assessment  scene with all adopted controls
 */
export function earProtection(working: Working, inputs: StatementInputs, assessment: Assessment): EarProtection {
  const { dutySet } = inputs.project;
  const duty = dutyOf(entry(inputs.duties, dutySet, "duty set"));
  const shift = shiftOf(inputs, assessment.scene);
  const edgeDba = zoneEdgeDba(working, duty.mandatoryFrom.levelDba, duty.exchange, shift);
  const peak = peakEdge(duty, shift);
  const machines = new Map(
    assessment.scene.activities.map((activity) => [activity.id, zoneMachines(working, inputs, activity)] as const),
  );
  const walled = wallsOnce(edgeDba);
  const located = assessment.scene.activities.flatMap((activity) =>
    (machines.get(activity.id) ?? []).map((each) => {
      const together = walled(togetherWith(each, activity, assessment.scene, machines));
      const machine = together.find(({ id }) => id === each.id);
      if (!machine) throw new Error(`${each.id} does not run with itself`);
      return { activity, machine, together };
    }),
  );
  const zones = located.map(({ activity, machine, together }): ItemZone => {
    const here = working.at(`activity:${activity.id}`, `item:${machine.id}`);
    const zone = zoneOf(here, machine, together, { levelDba: edgeDba, peak });
    return {
      activity: activity.id,
      item: machine.id,
      zone,
      besideDba: highestBesideDba(here, machine, together),
      workStationDba: machine.workStationDba,
      crossings: zoneCrossings(inputs.project, machine, zone),
    };
  });
  const places = located.map(({ machine }, index) => ({
    machine: machine.id,
    besideDba: (zones[index] as ItemZone).besideDba,
    workStationDba: machine.workStationDba,
    peak: machine.peak,
    impulsive: machine.impulsive,
  }));
  return { dutySet, shift, edgeDba, zones, notice: notice(working, duty, places, shift) };
}

function peakEdge({ mandatoryFrom }: Duty, { uncertaintyDb }: Shift): PeakEdge | undefined {
  const { peakDbc: valueDbc, peakComparator: comparator } = mandatoryFrom;
  return valueDbc === undefined ? undefined : { valueDbc, comparator, uncertaintyDb };
}

/** U of the zone rule: the largest uncertainty among all levels of the plant at work, never under 3 dB. */
function shiftOf(inputs: StatementInputs, scene: Scene): Shift {
  const sheets = scene.activities.flatMap((activity) => activity.items.map((item) => item.sheet));
  const uncertainties = sheets.flatMap((id) => {
    const { emission, workStation, peak } = entry(inputs.plant, id, "plant");
    return [emission, workStation, peak].flatMap((level) => level?.uncertaintyDb ?? []);
  });
  return { shiftH: inputs.statement.shiftH, uncertaintyDb: Math.max(3, ...uncertainties) };
}

/** Counts the walls of a group of machines once, however often the group comes. */
function wallsOnce(edgeDba: number): (machines: readonly ZoneMachine[]) => readonly WalledMachine[] {
  const known = new Map<string, readonly WalledMachine[]>();
  return (machines) => {
    const key = machines.map(({ id }) => id).join(" ");
    const found = known.get(key) ?? withWalls(machines, edgeDba);
    known.set(key, found);
    return found;
  };
}

/** All machines that may run while this one does; of items that cannot run together only the loudest. */
function togetherWith(
  machine: ZoneMachine,
  own: SceneActivity,
  scene: Scene,
  machines: ReadonlyMap<string, readonly ZoneMachine[]>,
): readonly ZoneMachine[] {
  return scene.activities
    .filter((other) => other === own || everCoincide(own.activity, other.activity))
    .flatMap((other) => {
      const items = machines.get(other.id) ?? [];
      if (other.activity.runTogether.kind === "may") return items;
      if (other === own) return [machine];
      return items.filter((item) => item.powerDba === Math.max(...items.map((each) => each.powerDba))).slice(0, 1);
    });
}

/** What the zone and notice rules read of a duty set. */
export function dutyOf(set: DutySet): Duty {
  const value = (from: DutySet["mandatoryFrom"]) => ({
    levelDba: from.levelDba,
    comparator: from.comparator ?? "at-or-above",
    peakDbc: from.peakDbc,
    peakComparator: from.peakComparator ?? "at-or-above",
  });
  return {
    exchange: set.exchange,
    mandatoryFrom: value(set.mandatoryFrom),
    informationFrom: value(set.informationFrom),
  };
}
