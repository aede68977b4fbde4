import { BANDS_HZ, type Bands } from "../acoustics/bands.ts";
import type { PathTerms } from "../acoustics/path-terms.ts";
import type { Assessment, ItemLevel } from "./assess.ts";

/** One value per octave band in whole thousandths of a decibel, in the order of the bands. */
export type Thousandths = readonly number[];

/** The terms of a reflected line, which differ from those of the straight one. */
export interface OwnLine {
  readonly distanceM: number;
  readonly directivityDb: number;
  readonly divergenceDb: number;
  readonly airDb: Thousandths;
  readonly groundDb: Thousandths;
  readonly reflectionDb: Thousandths;
}

/** The terms of one path: what is particular to it. */
export interface PathTable {
  readonly kind: PathTerms["kind"];
  readonly past: readonly string[];
  readonly pathDifferenceM?: number;
  readonly own?: OwnLine;
  readonly screenDb: Thousandths;
  /** Absent where nothing is taken off. */
  readonly capDb?: Thousandths;
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
  /** G of the source, middle and receptor regions; empty by the alternative ground method. */
  readonly groundFactors: readonly number[];
  readonly directivityDb: number;
  readonly metDb: number;
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

function termTable(activity: string, point: string, { item, propagation, levelDba, metDb }: ItemLevel): TermTable {
  const { distanceM, planM, groundFactors: factors, paths } = propagation;
  const [first] = paths;
  if (!first) throw new Error(`${activity}/${item.id}/${point}: no path`);
  return {
    activity,
    item: item.id,
    point,
    onTimePct: item.onTimePct,
    distanceM,
    planM,
    groundFactors: factors ? [factors.source, factors.middle, factors.receptor] : [],
    directivityDb: thousandth(first.directivityDb),
    metDb: thousandth(metDb),
    powerDb: thousandths(item.source.powerDb),
    controlLossDb: thousandths(item.source.controlLossDb),
    divergenceDb: thousandth(first.divergenceDb),
    airDb: thousandths(first.airDb),
    groundDb: thousandths(first.groundDb),
    paths: paths.map(pathTable),
    levelDba: thousandth(levelDba),
  };
}

function pathTable(path: PathTerms): PathTable {
  const capDb = thousandths(path.capDb);
  return {
    kind: path.kind,
    past: path.past,
    ...(path.pathDifferenceM === undefined ? {} : { pathDifferenceM: path.pathDifferenceM }),
    ...(path.kind === "reflected" ? { own: ownLine(path) } : {}),
    screenDb: thousandths(path.screenDb),
    ...(capDb.some((value) => value !== 0) ? { capDb } : {}),
    levelDb: thousandths(path.levelDb),
  };
}

function ownLine(path: PathTerms): OwnLine {
  return {
    distanceM: path.distanceM,
    directivityDb: thousandth(path.directivityDb),
    divergenceDb: thousandth(path.divergenceDb),
    airDb: thousandths(path.airDb),
    groundDb: thousandths(path.groundDb),
    reflectionDb: thousandths(path.reflectionDb),
  };
}

function thousandths(bands: Bands): Thousandths {
  return BANDS_HZ.map((bandHz) => thousandth(bands[bandHz]));
}

/** Whole thousandths, never −0: a sealed zero has one form. */
function thousandth(valueDb: number): number {
  return Math.round(valueDb * 1000) || 0;
}
