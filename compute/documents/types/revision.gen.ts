// Made from schema/ by `npm run types`. Do not edit.
import type { Place } from "./common.gen.ts";
import type { DutySet } from "./duty-set.gen.ts";
import type { LimitSet } from "./limit-set.gen.ts";
import type { Lining } from "./lining.gen.ts";
import type { Panel } from "./panel.gen.ts";
import type { Plant } from "./plant.gen.ts";
import type { Project } from "./project.gen.ts";
import type { Silencer } from "./silencer.gen.ts";
import type { Statement } from "./statement.gen.ts";
import type { Wording } from "./wording.gen.ts";

/**
 * A calendar date.
 */
export type SealedDate = string;
/**
 * A level or attenuation in whole thousandths of a decibel.
 */
export type Thousandth = number;
/**
 * List input of an equation.
 */
export type NumberList = number[];
/**
 * Where ear protection is mandatory round one machine.
 */
export type SealedZone = SealedDistanceZone | SealedInsideZone | SealedSpaceZone | SealedPeakZone | SealedNoZone;
/**
 * What of the surroundings lies inside a zone.
 */
export type SealedCrossing = SealedBoundaryCrossing | SealedWayCrossing | SealedReceptorCrossing;
/**
 * Whether the ear-protection notice stands, and why.
 */
export type SealedNotice = SealedMandatory | SealedInformation | SealedNoNotice;
/**
 * Why the notice stands.
 */
export type SealedReason = SealedLevelReason | SealedPeakReason | SealedUnknownReason;
/**
 * A published number.
 */
export interface SealedFigure {
  /**
   * Key: quantity/metric/subject/period/scope/controls.
   */
  key: string;
  /**
   * What it is.
   */
  quantity:
    | "level"
    | "limit"
    | "exceedance"
    | "insertion-loss"
    | "reduction"
    | "total-reduction"
    | "zone-edge"
    | "beside-level"
    | "zone-distance";
  /**
   * Metric.
   */
  metric: string;
  /**
   * Receptor point or plant item.
   */
  subject: string;
  /**
   * Limit set and rule, `window` or `shift`.
   */
  period: string;
  /**
   * `phase` or an activity.
   */
  scope: string;
  /**
   * `all`, `none` or one control.
   */
  controls: string;
  /**
   * Value, unrounded.
   */
  value: number;
  /**
   * Unit.
   */
  unit: "dB(A)" | "dB" | "m";
}
/**
 * A statement as issued: everything its pages are made from. Written by the tool, never by hand.
 */
export interface Revision {
  /**
   * Path of the schema, for editors; not read by the program.
   */
  $schema?: string;
  /**
   * Version of this shape.
   */
  schemaVersion: number;
  /**
   * Id of the project.
   */
  project: string;
  /**
   * Id of the phase.
   */
  phase: string;
  /**
   * Number of the revision, from 1.
   */
  number: number;
  issuedOn: SealedDate;
  /**
   * Version of the program that issued it.
   */
  toolVersion: string;
  inputs: SealedInputsOfStatement;
  /**
   * Words the pages print, by language.
   */
  wording: {
    [k: string]: Wording;
  };
  /**
   * Equations used, as they stood.
   */
  equations: SealedEquation[];
  /**
   * Published numbers.
   */
  figures: SealedFigure[];
  /**
   * What each period level was worked out for.
   */
  periods: SealedPeriod[];
  /**
   * Term tables.
   */
  terms: SealedTerms[];
  /**
   * Steps of the governing source and path of each receptor point.
   */
  governing: SealedGoverning[];
  earProtection: SealedEarProtection;
  /**
   * SHA-256 over the canonical form (RFC 8785) of everything else in this file.
   */
  digest: string;
}
/**
 * Every document the figures rest on.
 */
export interface SealedInputsOfStatement {
  project: Project;
  statement: Statement;
  /**
   * Dates of every phase of the project.
   */
  phases: {
    [k: string]: PhaseDates;
  };
  /**
   * Plant data sheets used.
   */
  plant: {
    [k: string]: Plant;
  };
  /**
   * Panel data sheets used.
   */
  panels: {
    [k: string]: Panel;
  };
  /**
   * Lining data sheets used.
   */
  linings: {
    [k: string]: Lining;
  };
  /**
   * Silencer data sheets used.
   */
  silencers: {
    [k: string]: Silencer;
  };
  /**
   * Limit sets used.
   */
  limits: {
    [k: string]: LimitSet;
  };
  /**
   * Duty sets used.
   */
  duties: {
    [k: string]: DutySet;
  };
}
/**
 * First and last date of a phase.
 */
export interface PhaseDates {
  from: SealedDate;
  until: SealedDate;
}
/**
 * An equation as it stood when the revision was issued.
 */
export interface SealedEquation {
  /**
   * Id.
   */
  id: string;
  /**
   * What it works out.
   */
  title: string;
  /**
   * Version.
   */
  version: number;
  /**
   * The equation in TeX.
   */
  tex: string;
  value: SealedValue;
  inputs: SealedInputs;
  source: SealedSource;
}
/**
 * What the equation gives.
 */
export interface SealedValue {
  /**
   * Symbol as it stands in the TeX.
   */
  symbol: string;
  /**
   * Unit.
   */
  unit: string;
  /**
   * Decimals it is shown with.
   */
  decimals?: number;
}
/**
 * Inputs of the equation by name.
 */
export interface SealedInputs {
  [k: string]: SealedInput;
}
/**
 * One input of an equation.
 */
export interface SealedInput {
  /**
   * One number or a list.
   */
  kind: "one" | "many";
  /**
   * Symbol as it stands in the TeX.
   */
  symbol: string;
  /**
   * Unit.
   */
  unit: string;
  /**
   * Decimals it is shown with.
   */
  decimals?: number;
}
/**
 * Where the equation is printed.
 */
export interface SealedSource {
  /**
   * Document.
   */
  document: string;
  /**
   * Edition.
   */
  edition: string;
  /**
   * Clause and equation number.
   */
  clause: string;
  /**
   * How far the text was checked.
   */
  checked: "read" | "read-secondary" | "derived" | "memory";
}
/**
 * What a period level was worked out for.
 */
export interface SealedPeriod {
  /**
   * Key of the level's figure.
   */
  key: string;
  /**
   * Limit set and rule.
   */
  rule: string;
  /**
   * Receptor point.
   */
  point: string;
  /**
   * Level, unrounded.
   */
  levelDba: number;
  date: SealedDate;
  /**
   * Length of the period.
   */
  periodH: number;
  /**
   * Activities that work in the period on that day.
   */
  activities: SealedPeriodActivity[];
  /**
   * Term added for the facade, 0 in the free field.
   */
  facadeDb: number;
}
/**
 * What of one activity counts in a period.
 */
export interface SealedPeriodActivity {
  /**
   * Activity.
   */
  id: string;
  /**
   * Hours inside the period.
   */
  windowH: number;
  /**
   * Items that count.
   */
  shares: SealedPeriodShare[];
}
/**
 * Part of an item in a period.
 */
export interface SealedPeriodShare {
  /**
   * Plant item.
   */
  item: string;
  /**
   * Share of the period, or of its worst stretch, in which it runs.
   */
  share: number;
  /**
   * Its level over the period, free field.
   */
  levelDba: number;
}
/**
 * Parts the level of one item at one receptor point is made of, while running, free field, all adopted controls.
 */
export interface SealedTerms {
  /**
   * Activity.
   */
  activity: string;
  /**
   * Plant item.
   */
  item: string;
  /**
   * Receptor point.
   */
  point: string;
  /**
   * On-time in the activity's window.
   */
  onTimePct: number;
  /**
   * Straight distance.
   */
  distanceM: number;
  /**
   * Distance in plan.
   */
  planM: number;
  /**
   * G of the source, middle and receptor regions; empty by the alternative ground method.
   *
   * @maxItems 3
   *
   * Items: Ground factor G.
   */
  groundFactors: number[];
  directivityDb: Thousandth;
  metDb: Thousandth;
  /**
   * Sound power. Whole thousandths, bands 63 Hz to 8 kHz in order.
   *
   * @minItems 8
   * @maxItems 8
   */
  powerDb: Thousandth[];
  /**
   * Insertion loss of an enclosure at the machine. Whole thousandths, bands 63 Hz to 8 kHz in order.
   *
   * @minItems 8
   * @maxItems 8
   */
  controlLossDb: Thousandth[];
  divergenceDb: Thousandth;
  /**
   * Air absorption Aatm. Whole thousandths, bands 63 Hz to 8 kHz in order.
   *
   * @minItems 8
   * @maxItems 8
   */
  airDb: Thousandth[];
  /**
   * Ground Agr. Whole thousandths, bands 63 Hz to 8 kHz in order.
   *
   * @minItems 8
   * @maxItems 8
   */
  groundDb: Thousandth[];
  /**
   * Paths from source to receptor point.
   *
   * @minItems 1
   */
  paths: SealedPath[];
  levelDba: Thousandth;
}
/**
 * Terms that are particular to one path.
 */
export interface SealedPath {
  /**
   * Straight, over, round an end, through a screen, or reflected.
   */
  kind: "direct" | "over" | "left" | "right" | "left-then-over" | "right-then-over" | "through" | "reflected";
  /**
   * Obstacles it bends over or round, the screen it goes through, or what reflects it first.
   *
   * Items: Id of a control, building or excavation.
   */
  past: string[];
  /**
   * Path-length difference z.
   */
  pathDifferenceM?: number;
  own?: SealedOwnLine;
  /**
   * Screen attenuation Abar. Whole thousandths, bands 63 Hz to 8 kHz in order.
   *
   * @minItems 8
   * @maxItems 8
   */
  screenDb: Thousandth[];
  /**
   * Taken off so that the paths of a line together stay at its unscreened level; absent where nothing is. Whole thousandths, bands 63 Hz to 8 kHz in order.
   *
   * @minItems 8
   * @maxItems 8
   */
  capDb?: Thousandth[];
  /**
   * Level of the path. Whole thousandths, bands 63 Hz to 8 kHz in order.
   *
   * @minItems 8
   * @maxItems 8
   */
  levelDb: Thousandth[];
}
/**
 * Terms of a reflected line, which is longer than the straight one.
 */
export interface SealedOwnLine {
  /**
   * Distance along the reflected line.
   */
  distanceM: number;
  directivityDb: Thousandth;
  divergenceDb: Thousandth;
  /**
   * Air absorption Aatm. Whole thousandths, bands 63 Hz to 8 kHz in order.
   *
   * @minItems 8
   * @maxItems 8
   */
  airDb: Thousandth[];
  /**
   * Ground Agr. Whole thousandths, bands 63 Hz to 8 kHz in order.
   *
   * @minItems 8
   * @maxItems 8
   */
  groundDb: Thousandth[];
  /**
   * What the surface takes; 300 dB in a band in which the reflection does not count. Whole thousandths, bands 63 Hz to 8 kHz in order.
   *
   * @minItems 8
   * @maxItems 8
   */
  reflectionDb: Thousandth[];
}
/**
 * The source and path that decide at a receptor point, worked out step by step.
 */
export interface SealedGoverning {
  /**
   * Receptor point.
   */
  point: string;
  /**
   * Limit set and rule that come closest to the limit or lie farthest over it.
   */
  rule: string;
  /**
   * Activity of the source.
   */
  activity: string;
  /**
   * Plant item with the largest part.
   */
  item: string;
  /**
   * Its path with the largest part, counted from 0 in the term table.
   */
  path: number;
  /**
   * Octave band with the largest part.
   */
  bandHz: number;
  /**
   * Equations in the order they were worked.
   */
  steps: SealedStep[];
}
/**
 * One equation as it was worked out.
 */
export interface SealedStep {
  /**
   * Where in the chain: activity, item, point, path, band.
   *
   * Items: One place of the chain.
   */
  at: string[];
  /**
   * Which part of the level this is; a key of the wording.
   */
  term: string;
  /**
   * Id of the equation.
   */
  equation: string;
  /**
   * Version of the equation.
   */
  version: number;
  inputs: StepInputs;
  /**
   * Value, unrounded.
   */
  value: number;
  /**
   * Unit of the value.
   */
  unit: string;
}
/**
 * Inputs of the equation by name.
 */
export interface StepInputs {
  [k: string]: number | NumberList;
}
/**
 * Zones and notice by the project's duty set.
 */
export interface SealedEarProtection {
  /**
   * Id of the duty set.
   */
  dutySet: string;
  shift: SealedShift;
  /**
   * Level at which zones end.
   */
  edgeDba: number;
  /**
   * Zone of every plant item.
   */
  zones: SealedItemZone[];
  notice: SealedNotice;
}
/**
 * What the edge of zones was worked out for.
 */
export interface SealedShift {
  /**
   * Length of the shift.
   */
  shiftH: number;
  /**
   * Uncertainty U.
   */
  uncertaintyDb: number;
}
/**
 * Zone of one plant item during its activity.
 */
export interface SealedItemZone {
  /**
   * Activity.
   */
  activity: string;
  /**
   * Plant item.
   */
  item: string;
  zone: SealedZone;
  /**
   * Level of all that may run together, 1 m outside outline and swing.
   */
  besideDba: number;
  /**
   * Level at the work station.
   */
  workStationDba?: number;
  /**
   * What lies inside the zone.
   */
  crossings: SealedCrossing[];
}
/**
 * A zone with a distance to mark.
 */
export interface SealedDistanceZone {
  /**
   * A distance round outline and swing.
   */
  kind: "distance";
  /**
   * Plant item.
   */
  machine: string;
  /**
   * Distance from outline and swing, unrounded.
   */
  distanceM: number;
  at: Place;
  /**
   * Criterion that asks for it.
   */
  by: "level" | "peak";
  /**
   * Inside twice the largest dimension: confirm by measurement.
   */
  nearField: boolean;
}
/**
 * A machine inside the zone of a louder one.
 */
export interface SealedInsideZone {
  /**
   * Inside another machine's zone.
   */
  kind: "inside-another";
  /**
   * Plant item.
   */
  machine: string;
}
/**
 * A zone that is a whole space.
 */
export interface SealedSpaceZone {
  /**
   * The whole space.
   */
  kind: "whole-space";
  /**
   * Plant item.
   */
  machine: string;
}
/**
 * Impulses without peak data: the whole work area.
 */
export interface SealedPeakZone {
  /**
   * Peak not known: treat as reached.
   */
  kind: "peak-not-known";
  /**
   * Plant item.
   */
  machine: string;
  /**
   * How far it reaches by level alone; for checks, not printed.
   */
  leastM?: number;
}
/**
 * A machine without a zone.
 */
export interface SealedNoZone {
  /**
   * No zone.
   */
  kind: "none";
  /**
   * Plant item.
   */
  machine: string;
}
/**
 * Something inside the zone.
 */
export interface SealedBoundaryCrossing {
  /**
   * What is crossed.
   */
  kind: "boundary";
}
/**
 * Something inside the zone.
 */
export interface SealedWayCrossing {
  /**
   * What is crossed.
   */
  kind: "public-way";
  /**
   * Id in the project.
   */
  id: string;
}
/**
 * Something inside the zone.
 */
export interface SealedReceptorCrossing {
  /**
   * What is crossed.
   */
  kind: "receptor";
  /**
   * Id in the project.
   */
  id: string;
}
/**
 * The notice.
 */
export interface SealedMandatory {
  /**
   * Whether the notice stands.
   */
  kind: "mandatory";
  /**
   * The law's value, or 85 dB(A) as good practice.
   */
  by: "law" | "good-practice";
  /**
   * What calls for it.
   */
  reasons: SealedReason[];
}
/**
 * Why the notice stands.
 */
export interface SealedLevelReason {
  /**
   * What meets the value.
   */
  kind: "beside" | "work-station";
  /**
   * Plant item.
   */
  machine: string;
  /**
   * Level.
   */
  levelDba: number;
}
/**
 * Why the notice stands.
 */
export interface SealedPeakReason {
  /**
   * What meets the value.
   */
  kind: "peak";
  /**
   * Plant item.
   */
  machine: string;
  /**
   * Peak level.
   */
  levelDbc: number;
}
/**
 * Why the notice stands.
 */
export interface SealedUnknownReason {
  /**
   * What meets the value.
   */
  kind: "peak-not-known";
  /**
   * Plant item.
   */
  machine: string;
}
/**
 * The notice.
 */
export interface SealedInformation {
  /**
   * Whether the notice stands.
   */
  kind: "information";
  /**
   * What calls for it.
   */
  reasons: SealedReason[];
}
/**
 * The notice.
 */
export interface SealedNoNotice {
  /**
   * Whether the notice stands.
   */
  kind: "none";
  /**
   * What calls for it.
   */
  reasons: SealedReason[];
}
