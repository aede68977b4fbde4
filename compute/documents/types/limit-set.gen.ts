// Made from schema/ by `npm run types`. Do not edit.
import type { Clock, ClockEnd, Comparator, Days, Id, PlainDate, ReceptorUse, Source, Text } from "./common.gen.ts";

/**
 * One rule of the set.
 */
export type LimitRule = FixedValueRule;
/**
 * Time the level is averaged over.
 */
export type Averaging = WholePeriod | WorstStretch;
/**
 * Where the limit holds.
 */
export type LimitPosition = FacadeLimitPosition | FreeFieldLimitPosition;
/**
 * A law's, code's, consent's or contract's limits.
 */
export interface LimitSet {
  /**
   * Path of the schema, for editors; not read by the program.
   */
  $schema?: string;
  id: Id;
  /**
   * True for a made-up example: every page and sheet made from it says so.
   */
  invented: boolean;
  title: Text;
  /**
   * Edition or date.
   */
  edition: string;
  issuer: Text;
  checkedOn: PlainDate;
  /**
   * Calculation method the set prescribes, or "none".
   */
  prescribesMethod: "none" | "iso-9613-2-1996";
  /**
   * The rules.
   *
   * @minItems 1
   */
  rules: LimitRule[];
}
/**
 * A fixed value over a period.
 */
export interface FixedValueRule {
  /**
   * Names the variant.
   */
  kind: "fixed-value";
  id: Id;
  period: LimitPeriod;
  /**
   * Uses of receptors it holds for.
   *
   * @minItems 1
   */
  uses: ReceptorUse[];
  /**
   * Quantity the value is given in.
   */
  metric: "LAeq";
  averaging: Averaging;
  /**
   * The limit.
   */
  valueDb: number;
  comparator: Comparator;
  /**
   * What is compared: the noise of the site alone.
   */
  compares: "site-alone";
  position: LimitPosition;
  source: Source;
}
/**
 * The hours a rule holds for.
 */
export interface LimitPeriod {
  id: Id;
  name: Text;
  days: Days;
  from: Clock;
  to: ClockEnd;
}
/**
 * The whole period.
 */
export interface WholePeriod {
  /**
   * Names the variant.
   */
  kind: "whole-period";
}
/**
 * The worst stretch of a stated length.
 */
export interface WorstStretch {
  /**
   * Names the variant.
   */
  kind: "worst";
  /**
   * Length of the stretch.
   */
  minutes: number;
}
/**
 * In front of a facade.
 */
export interface FacadeLimitPosition {
  /**
   * Names the variant.
   */
  kind: "facade";
  /**
   * Distance from the facade.
   */
  distanceM: number;
  /**
   * Added to the free-field level for the reflection of the facade.
   */
  termDb: number;
}
/**
 * In a free field.
 */
export interface FreeFieldLimitPosition {
  /**
   * Names the variant.
   */
  kind: "free-field";
}
