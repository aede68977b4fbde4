import { BANDS_HZ, type Bands } from "../acoustics/bands.ts";
import type { Assessment, ItemLevel } from "./assess.ts";

/** One value per octave band in whole thousandths of a decibel, in the order of the bands. */
export type Thousandths = readonly number[];

/** The terms of one path: what is particular to it. */
export interface PathTable {
  readonly path: "direct" | "over" | "left" | "right";
  /** Control id of the screen; absent on the direct path. */
  readonly screen?: string;
  readonly pathDifferenceM?: number;
  readonly screenDb: Thousandths;
  readonly capDb: Thousandths;
  readonly levelDb: Thousandths;
}

/** The parts the level of one item at one receptor point is made of, with all adopted controls, free field. */
export interface TermTable {
  readonly activity: string;
  readonly item: string;
  readonly point: string;
  readonly onTimePct: number;
  readonly distanceM: number;
  readonly planM: number;
  readonly groundFactors: readonly [source: number, middle: number, receptor: number];
  readonly powerDb: Thousandths;
  readonly controlLossDb: Thousandths;
  /** The same in every band. */
  readonly divergenceDb: number;
  readonly airDb: Thousandths;
  readonly groundDb: Thousandths;
  readonly paths: readonly PathTable[];
  /** A-weighted level while running, over all paths and bands [thousandths of dB(A)]. */
  readonly levelDba: number;
}

/** The term tables of a statement: one per activity, item and receptor point. */
export function termTables(assessment: Assessment): readonly TermTable[] {
  const { activities, points } = assessment.scene;
  return activities.flatMap((activity) =>
    points.flatMap((point) =>
      assessment.itemLevels(activity.id, point.id).map((level) => termTable(activity.id, point.id, level)),
    ),
  );
}

function termTable(activity: string, point: string, { item, propagation, levelDba }: ItemLevel): TermTable {
  const { distanceM, planM, groundFactors, paths } = propagation;
  const [first] = paths;
  if (!first) throw new Error(`${activity}/${item.id}/${point}: no path`);
  return {
    activity,
    item: item.id,
    point,
    onTimePct: item.onTimePct,
    distanceM,
    planM,
    groundFactors: [groundFactors.source, groundFactors.middle, groundFactors.receptor],
    powerDb: thousandths(item.source.powerDb),
    controlLossDb: thousandths(item.source.controlLossDb),
    divergenceDb: thousandth(first.divergenceDb),
    airDb: thousandths(first.airDb),
    groundDb: thousandths(first.groundDb),
    paths: paths.map((path) => ({
      path: path.path,
      ...(path.screen === undefined ? {} : { screen: path.screen }),
      ...(path.pathDifferenceM === undefined ? {} : { pathDifferenceM: path.pathDifferenceM }),
      screenDb: thousandths(path.screenDb),
      capDb: thousandths(path.capDb),
      levelDb: thousandths(path.levelDb),
    })),
    levelDba: thousandth(levelDba),
  };
}

function thousandths(bands: Bands): Thousandths {
  return BANDS_HZ.map((bandHz) => thousandth(bands[bandHz]));
}

/** Whole thousandths, never −0: a sealed zero has one form. */
function thousandth(valueDb: number): number {
  return Math.round(valueDb * 1000) || 0;
}
