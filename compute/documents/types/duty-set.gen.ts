// Made from schema/ by `npm run types`. Do not edit.
import type { Comparator, Id, PlainDate, Source, Text } from "./common.gen.ts";

/**
 * How level and time are traded.
 */
export type Exchange = EqualEnergy | ExchangeRate;
/**
 * A country's exposure values for people at work, and what follows from them.
 */
export interface DutySet {
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
  checkedOn: PlainDate;
  exchange: Exchange;
  mandatoryFrom: ActionValue;
  informationFrom: ActionValue;
  zoneTerm: Text;
  everyone?: Text;
  source: Source;
}
/**
 * Equal energy: level and 10 lg of time.
 */
export interface EqualEnergy {
  /**
   * Names the variant.
   */
  kind: "equal-energy";
}
/**
 * A stated number of decibels for each halving of time.
 */
export interface ExchangeRate {
  /**
   * Names the variant.
   */
  kind: "exchange-rate";
  /**
   * Decibels for each halving of time.
   */
  rateDb: number;
}
/**
 * Exposure and peak from which something follows; a part the law does not have is left out.
 */
export interface ActionValue {
  /**
   * Daily exposure level, 8 h.
   */
  levelDba?: number;
  comparator?: Comparator;
  /**
   * C-weighted peak level.
   */
  peakDbc?: number;
  peakComparator?: Comparator;
  source: Source;
}
