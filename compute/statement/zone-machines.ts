import { perBand } from "../acoustics/bands.ts";
import { aWeighted } from "../acoustics/sound-power.ts";
import type { Level } from "../documents/types/common.gen.ts";
import type { Plant } from "../documents/types/plant.gen.ts";
import type { PlantItem } from "../documents/types/statement.gen.ts";
import { InputError } from "../equations/input-error.ts";
import type { Working } from "../equations/working.ts";
import { crossing } from "../geometry/crossing.ts";
import {
  distanceToOutlineM,
  distanceToSegmentM,
  isInside,
  orientation,
  rectangle,
  sides,
} from "../geometry/outline.ts";
import type { Place } from "../geometry/place.ts";
import { planDistanceM, side } from "../geometry/place.ts";
import type { ZoneMachine } from "../hearing/zone-machine.ts";
import { bandsOf } from "./emission-of.ts";
import type { StatementInputs } from "./inputs.ts";
import { entry } from "./inputs.ts";
import type { SceneActivity, SceneItem } from "./scene.ts";

/**
 * The machines of an activity as the zone rule sees them: at full running, no credit for screens or ground, an enclosure
 * only if its control says that the notice names it as closed.
 */
export function zoneMachines(
  working: Working,
  inputs: StatementInputs,
  activity: SceneActivity,
): readonly ZoneMachine[] {
  return activity.items.map((item) =>
    zoneMachine(working.at(`activity:${activity.id}`, `item:${item.id}`), inputs, activity, item),
  );
}

function zoneMachine(working: Working, inputs: StatementInputs, activity: SceneActivity, item: SceneItem): ZoneMachine {
  const sheet = entry(inputs.plant, item.sheet, "plant");
  const placed = activity.activity.plant.find((each) => each.id === item.id) as PlantItem;
  const outline = rectangle(placed.at, sheet.outline.lengthM, sheet.outline.widthM, placed.bearingDeg);
  const { powerDb, controlLossDb } = item.source;
  const credited = enclosureNamed(inputs, item)
    ? perBand((bandHz) => powerDb[bandHz] - controlLossDb[bandHz])
    : powerDb;
  return {
    id: item.id,
    powerDba: aWeighted(working, credited, "zone-power"),
    at: placed.at,
    outline,
    swingM: sheet.swingM,
    largestDimensionM: sheet.largestDimensionM,
    wallsM: reflecting(inputs, activity, placed.at).map((wall) =>
      wallDistanceM(wall, outline, placed.at, sheet.swingM),
    ),
    workStationDba: workStationDba(working, sheet),
    impulsive: sheet.emission.character.impulsive,
    peak: sheet.peak && peakOf(sheet.peak),
    open: placed.setting.kind === "open",
  };
}

/** Every enclosure round the item must be named as closed; one that is not leaves the machine uncredited. */
function enclosureNamed(inputs: StatementInputs, item: SceneItem): boolean {
  const enclosures = inputs.statement.controls.filter(
    (control) => control.kind === "enclosure" && item.controls.includes(control.id),
  );
  return (
    enclosures.length > 0 && enclosures.every((control) => control.kind === "enclosure" && control.namedClosedOnNotice)
  );
}

type Wall = readonly [Place, Place];

/** Walls of buildings that face a machine, straight runs of screens and bunds, sides of the pit it stands in; each counts at least once. */
function reflecting(inputs: StatementInputs, activity: SceneActivity, at: Place): readonly Wall[] {
  const faces = inputs.project.buildings.map((building) =>
    sides(building.outline).filter(([a, b]) => side(a, b, at) * orientation(building.outline) < 0),
  );
  const runs = activity.site.obstacles
    .filter(({ kind }) => kind === "screen" || kind === "bund")
    .map(({ edges }) => edges.map(([from, to]): Wall => [from, to]));
  const pits = inputs.project.excavations
    .filter(({ outline }) => isInside(at, outline))
    .map(({ outline }) => sides(outline));
  return [...faces, ...runs, ...pits].flatMap((walls) => squareTo(walls, at));
}

/** The walls that a machine stands square to, which are those that mirror it; where there is none, the nearest. */
function squareTo(walls: readonly Wall[], at: Place): readonly Wall[] {
  const square = walls.filter(
    ([a, b]) => distanceToSegmentM(at, a, b) < Math.min(planDistanceM(at, a), planDistanceM(at, b)),
  );
  if (square.length > 0) return square;
  const nearest = Math.min(...walls.map(([a, b]) => distanceToSegmentM(at, a, b)));
  return walls.filter(([a, b]) => distanceToSegmentM(at, a, b) === nearest).slice(0, 1);
}

function wallDistanceM([a, b]: Wall, outline: readonly Place[], at: Place, swingM: number): number {
  const touches = sides(outline).some(([c, d]) => crossing(a, b, c, d));
  const fromOutline = Math.min(
    distanceToOutlineM(a, outline),
    distanceToOutlineM(b, outline),
    ...outline.map((corner) => distanceToSegmentM(corner, a, b)),
  );
  return touches ? 0 : Math.max(0, Math.min(fromOutline, distanceToSegmentM(at, a, b) - swingM));
}

function workStationDba(working: Working, sheet: Plant): number | undefined {
  const level = sheet.workStation;
  if (!level) return undefined;
  if (level.kind === "single" && level.weighting === "A") return level.valueDb;
  if (level.kind === "octave" && level.weighting === "Z")
    return aWeighted(working, bandsOf(level.bandsDb), "work-station");
  throw new InputError("workStation", level.weighting, "a single A-weighted level or unweighted octave bands");
}

/** Peak data hold at the distance they were taken; a work station is taken as 1 m. */
function peakOf(level: Level): ZoneMachine["peak"] {
  if (level.kind !== "single") return undefined;
  return {
    levelDbc: level.valueDb,
    distanceM: level.quantity.kind === "pressure-at-distance" ? level.quantity.distanceM : 1,
  };
}
