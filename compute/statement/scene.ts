import type { Bands } from "../acoustics/bands.ts";
import { perBand } from "../acoustics/bands.ts";
import { enclosureInsertionLoss } from "../acoustics/enclosure.ts";
import type { PointSource, Receptor } from "../acoustics/propagate.ts";
import type { Site } from "../acoustics/site.ts";
import { soundPower } from "../acoustics/sound-power.ts";
import type { Activity, Control, EnclosureControl, PlantItem } from "../documents/types/statement.gen.ts";
import type { Working } from "../equations/working.ts";
import { emissionOf } from "./emission-of.ts";
import { enclosureOf } from "./enclosure-of.ts";
import { facetsOf } from "./facets-of.ts";
import type { StatementInputs } from "./inputs.ts";
import { entry } from "./inputs.ts";
import { obstaclesOf } from "./obstacles-of.ts";
import { standsThroughout } from "./stands.ts";

/** A plant item as it runs in an activity with the controls that are in place. */
export interface SceneItem {
  readonly id: string;
  /** Plant data sheet it runs by: another one where a quieter machine is not in place. */
  readonly sheet: string;
  readonly onTimePct: number;
  readonly run: { readonly longestRunMin: number; readonly shortestStopMin: number } | undefined;
  readonly source: PointSource;
  /** Controls that act at this item, in the order of the statement. */
  readonly controls: readonly string[];
}

/** What runs and what stands during one activity. */
export interface SceneActivity {
  readonly id: string;
  readonly activity: Activity;
  readonly site: Site;
  readonly items: readonly SceneItem[];
}

/** A receptor point with its place in the project. */
export interface ScenePoint {
  /** `<receptor>.<point>` */
  readonly id: string;
  readonly receptor: string;
  readonly point: Receptor;
}

export interface Scene {
  readonly activities: readonly SceneActivity[];
  readonly points: readonly ScenePoint[];
}

/**
 * What runs and what stands for a subset of the controls; "with", "without" and "all but this one" come from here only.
 *
 * @param working     what works the sound powers and enclosures out
 * @param inputs      documents of the statement
 * @param controlIds  controls that are taken to be in place
 * @returns           activities with their plant and site, and the receptor points
 */
export function scene(working: Working, inputs: StatementInputs, controlIds: ReadonlySet<string>): Scene {
  const placed = inputs.statement.controls.filter((control) => controlIds.has(control.id));
  return {
    activities: inputs.statement.activities.map((activity) => sceneActivity(working, inputs, placed, activity)),
    points: inputs.project.receptors.flatMap((receptor) =>
      receptor.points.map((point) => ({
        id: `${receptor.id}.${point.id}`,
        receptor: receptor.id,
        point: {
          at: point.at,
          groundM: point.groundM ?? inputs.project.groundLevelM,
          heightM: point.heightM,
          facadeOf: point.position.kind === "facade" ? point.position.building : undefined,
        },
      })),
    ),
  };
}

/** Whether a control is there on every day of the activity; one that is put up or struck meanwhile does not count. */
function inPlace(inputs: StatementInputs, control: Control, activity: Activity): boolean {
  if (control.kind === "screen" || control.kind === "bund")
    return standsThroughout(inputs, control, activity.from, activity.until);
  return control.due <= activity.from;
}

function sceneActivity(
  working: Working,
  inputs: StatementInputs,
  placed: readonly Control[],
  activity: Activity,
): SceneActivity {
  const { project } = inputs;
  const there = placed.filter((control) => inPlace(inputs, control, activity));
  const areas = project.ground.areas.filter((area) => standsThroughout(inputs, area, activity.from, activity.until));
  return {
    id: activity.id,
    activity,
    site: {
      air: {
        temperatureC: project.method.temperatureC,
        humidityPct: project.method.humidityPct,
        pressureKpa: project.method.pressureKpa,
      },
      ground: { elsewhere: project.ground.elsewhere.groundFactor, areas },
      obstacles: obstaclesOf(working.at(`activity:${activity.id}`), inputs, there, activity),
      facets: project.method.reflections === "none" ? [] : facetsOf(inputs, there, activity),
      method: {
        ground: project.method.ground,
        screenOverHardGround: project.method.screenOverHardGround,
        c0Db: project.method.c0Db,
      },
    },
    items: activity.plant.map((item) =>
      sceneItem(working.at(`activity:${activity.id}`, `item:${item.id}`), inputs, there, item),
    ),
  };
}

function sceneItem(working: Working, inputs: StatementInputs, there: readonly Control[], item: PlantItem): SceneItem {
  const acting = inputs.statement.controls.filter(
    (control) => "appliesTo" in control && control.appliesTo.includes(item.id),
  );
  const missing = acting.filter((control) => !there.includes(control));
  const replaced = missing.find((control) => control.kind === "quieter-plant");
  const unlimited = missing.find((control) => control.kind === "running-time");
  const sheet = replaced?.insteadOf ?? item.sheet;
  const enclosures = acting.filter(
    (control) => control.kind === "enclosure" && there.includes(control),
  ) as EnclosureControl[];
  return {
    id: item.id,
    sheet,
    onTimePct: unlimited?.insteadOfPct ?? item.onTimePct,
    run:
      item.longestRunMin === undefined || item.shortestStopMin === undefined
        ? undefined
        : { longestRunMin: item.longestRunMin, shortestStopMin: item.shortestStopMin },
    source: {
      at: item.at,
      groundM: item.groundM ?? inputs.project.groundLevelM,
      heightM: entry(inputs.plant, sheet, "plant").acousticCentreHeightM,
      powerDb: soundPower(working, emissionOf(inputs, sheet)),
      controlLossDb: controlLoss(working, inputs, enclosures),
    },
    controls: acting.filter((control) => there.includes(control)).map((control) => control.id),
  };
}

function controlLoss(working: Working, inputs: StatementInputs, enclosures: readonly EnclosureControl[]): Bands {
  const losses = enclosures.map((control) =>
    enclosureInsertionLoss(working.at(`control:${control.id}`), enclosureOf(inputs, control)),
  );
  // Insertion losses of two enclosures do not add: the better one counts in each band.
  return perBand((bandHz) => Math.max(0, ...losses.map((loss) => loss[bandHz])));
}
