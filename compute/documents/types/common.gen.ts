// Made from schema/ by `npm run types`. Do not edit.

/**
 * Name given by the author: small letters, digits and hyphens, starting with a letter, at most 40 signs; not one of the words the site keeps for its addresses.
 */
export type Id = string;
/**
 * Language code, ISO 639 with an optional country.
 */
export type LanguageCode = string;
/**
 * Closed outline on the plane: at least three corners in order, the last joined to the first.
 *
 * @minItems 3
 */
export type Outline = Place[];
/**
 * Open line on the plane: at least two points in order.
 *
 * @minItems 2
 */
export type Line = Place[];
/**
 * Calendar date, year-month-day.
 */
export type PlainDate = string;
/**
 * Time of day on the clock of the project's own time zone, 00:00 to 23:59.
 */
export type Clock = string;
/**
 * Time of day at which something ends, 00:00 to 24:00; an end before the start lies on the next day.
 */
export type ClockEnd = string;
/**
 * Day of the week.
 */
export type Day = "mon" | "tue" | "wed" | "thu" | "fri" | "sat" | "sun";
/**
 * Days of the week.
 *
 * @minItems 1
 * @maxItems 7
 */
export type Days = Day[];
/**
 * How far the value was checked: seen in the source, worked out from one, declared by a maker, measured, from memory, or invented for an example.
 */
export type Checked = "read" | "derived" | "declared" | "measured" | "memory" | "invented";
/**
 * When something goes up or comes down: a date, or a phase of this project.
 */
export type Stands = StandsByDate | StandsByPhase;
/**
 * What the level is a level of.
 */
export type LevelQuantity = SoundPower | PressureAtDistance | WorkStation;
/**
 * Quantity in time: L_Aeq while running, L_Aeq over the whole work cycle, maximum with time weighting F, maximum of a drive-by, or C-weighted peak.
 */
export type LevelMetric = "LAeq-running" | "LAeq-cycle" | "LAFmax" | "drive-by-max" | "LCpeak";
/**
 * Frequency weighting of the values given: none (Z), A or C.
 */
export type Weighting = "Z" | "A" | "C";
/**
 * Whether the level is a free-field one or was taken in front of a facade.
 */
export type LevelField = "free-field" | "facade";
/**
 * A noise level with its origin: what it is a level of, how it was taken and where it is known from.
 */
export type Level = SingleLevel | OctaveLevel | ThirdOctaveLevel;
/**
 * What a receptor is used as.
 */
export type ReceptorUse = "dwelling" | "school" | "hospital" | "worship" | "office" | "industry" | "outdoor";
/**
 * Whether the value itself still counts as kept ("above") or already as reached ("at-or-above").
 */
export type Comparator = "above" | "at-or-above";
/**
 * Words for readers: one string per language code.
 */
export interface Text {
  /**
   * The words in that language.
   */
  [k: string]: string;
}
/**
 * Point on the local plane, in metres east and north of the project's own origin.
 */
export interface Place {
  /**
   * Metres east of the origin.
   */
  xM: number;
  /**
   * Metres north of the origin.
   */
  yM: number;
}
/**
 * Where a value is known from and how far it was checked.
 */
export interface Source {
  /**
   * Name of the document.
   */
  document: string;
  /**
   * Edition, date or issue of the document.
   */
  edition: string;
  /**
   * Clause, table or row in the document.
   */
  place: string;
  checked: Checked;
  /**
   * What a reader should know about this source.
   */
  note?: string;
}
/**
 * Octave values in dB by nominal band centre; 31.5 Hz may be given.
 */
export interface Bands {
  /**
   * Value in the 63 Hz band.
   */
  "63": number;
  /**
   * Value in the 125 Hz band.
   */
  "125": number;
  /**
   * Value in the 250 Hz band.
   */
  "250": number;
  /**
   * Value in the 500 Hz band.
   */
  "500": number;
  /**
   * Value in the 1000 Hz band.
   */
  "1000": number;
  /**
   * Value in the 2000 Hz band.
   */
  "2000": number;
  /**
   * Value in the 4000 Hz band.
   */
  "4000": number;
  /**
   * Value in the 8000 Hz band.
   */
  "8000": number;
  /**
   * Value in the 31.5 Hz band.
   */
  "31.5"?: number;
}
/**
 * Third-octave values in dB by nominal band centre, 50 Hz to 10 kHz, all 24.
 */
export interface ThirdOctaveBands {
  /**
   * Value in the 50 Hz band.
   */
  "50": number;
  /**
   * Value in the 63 Hz band.
   */
  "63": number;
  /**
   * Value in the 80 Hz band.
   */
  "80": number;
  /**
   * Value in the 100 Hz band.
   */
  "100": number;
  /**
   * Value in the 125 Hz band.
   */
  "125": number;
  /**
   * Value in the 160 Hz band.
   */
  "160": number;
  /**
   * Value in the 200 Hz band.
   */
  "200": number;
  /**
   * Value in the 250 Hz band.
   */
  "250": number;
  /**
   * Value in the 315 Hz band.
   */
  "315": number;
  /**
   * Value in the 400 Hz band.
   */
  "400": number;
  /**
   * Value in the 500 Hz band.
   */
  "500": number;
  /**
   * Value in the 630 Hz band.
   */
  "630": number;
  /**
   * Value in the 800 Hz band.
   */
  "800": number;
  /**
   * Value in the 1000 Hz band.
   */
  "1000": number;
  /**
   * Value in the 1250 Hz band.
   */
  "1250": number;
  /**
   * Value in the 1600 Hz band.
   */
  "1600": number;
  /**
   * Value in the 2000 Hz band.
   */
  "2000": number;
  /**
   * Value in the 2500 Hz band.
   */
  "2500": number;
  /**
   * Value in the 3150 Hz band.
   */
  "3150": number;
  /**
   * Value in the 4000 Hz band.
   */
  "4000": number;
  /**
   * Value in the 5000 Hz band.
   */
  "5000": number;
  /**
   * Value in the 6300 Hz band.
   */
  "6300": number;
  /**
   * Value in the 8000 Hz band.
   */
  "8000": number;
  /**
   * Value in the 10000 Hz band.
   */
  "10000": number;
}
/**
 * Absorption coefficients by nominal octave band centre; 31.5 Hz may be given.
 */
export interface AbsorptionBands {
  /**
   * Absorption coefficient in the 63 Hz band.
   */
  "63": number;
  /**
   * Absorption coefficient in the 125 Hz band.
   */
  "125": number;
  /**
   * Absorption coefficient in the 250 Hz band.
   */
  "250": number;
  /**
   * Absorption coefficient in the 500 Hz band.
   */
  "500": number;
  /**
   * Absorption coefficient in the 1000 Hz band.
   */
  "1000": number;
  /**
   * Absorption coefficient in the 2000 Hz band.
   */
  "2000": number;
  /**
   * Absorption coefficient in the 4000 Hz band.
   */
  "4000": number;
  /**
   * Absorption coefficient in the 8000 Hz band.
   */
  "8000": number;
  /**
   * Absorption coefficient in the 31.5 Hz band.
   */
  "31.5"?: number;
}
/**
 * Reduction indexes or insertion losses in dB by nominal octave band centre; 31.5 Hz may be given.
 */
export interface LossBands {
  /**
   * Reduction in the 63 Hz band.
   */
  "63": number;
  /**
   * Reduction in the 125 Hz band.
   */
  "125": number;
  /**
   * Reduction in the 250 Hz band.
   */
  "250": number;
  /**
   * Reduction in the 500 Hz band.
   */
  "500": number;
  /**
   * Reduction in the 1000 Hz band.
   */
  "1000": number;
  /**
   * Reduction in the 2000 Hz band.
   */
  "2000": number;
  /**
   * Reduction in the 4000 Hz band.
   */
  "4000": number;
  /**
   * Reduction in the 8000 Hz band.
   */
  "8000": number;
  /**
   * Reduction in the 31.5 Hz band.
   */
  "31.5"?: number;
}
/**
 * A calendar date.
 */
export interface StandsByDate {
  /**
   * Names the variant.
   */
  kind: "date";
  date: PlainDate;
}
/**
 * A phase of the same project: its first day for a start, its last day for an end.
 */
export interface StandsByPhase {
  /**
   * Names the variant.
   */
  kind: "phase";
  phase: Id;
}
/**
 * Sound power level, dB re 1 pW.
 */
export interface SoundPower {
  /**
   * Names the variant.
   */
  kind: "sound-power";
}
/**
 * Sound pressure level at a stated distance over a stated ground, dB re 20 µPa.
 */
export interface PressureAtDistance {
  /**
   * Names the variant.
   */
  kind: "pressure-at-distance";
  /**
   * Distance of the microphone from the acoustic centre of the machine.
   */
  distanceM: number;
  /**
   * Ground between the machine and the microphone; "none" is a free field without any ground.
   */
  ground: "hard" | "none" | "soft" | "unknown";
}
/**
 * Sound pressure level at the operator's place, dB re 20 µPa.
 */
export interface WorkStation {
  /**
   * Names the variant.
   */
  kind: "work-station";
}
/**
 * Character of the noise.
 */
export interface Character {
  /**
   * Whether the noise has blows or bangs.
   */
  impulsive: boolean;
  /**
   * Whether the noise has a clear tone.
   */
  tonal: boolean;
}
/**
 * One weighted value for all bands together.
 */
export interface SingleLevel {
  /**
   * Names the variant.
   */
  kind: "single";
  /**
   * The value.
   */
  valueDb: number;
  shapeFrom?: Id;
  quantity: LevelQuantity;
  metric: LevelMetric;
  weighting: Weighting;
  field: LevelField;
  /**
   * Whether the stated value already holds the uncertainty.
   */
  kIncluded: boolean;
  /**
   * Uncertainty of the level: the one stated by the source or, where it states none, the one the author judges right.
   */
  uncertaintyDb: number;
  operatingState: Text;
  character: Character;
  source: Source;
}
/**
 * Values in octave bands.
 */
export interface OctaveLevel {
  /**
   * Names the variant.
   */
  kind: "octave";
  bandsDb: Bands;
  quantity: LevelQuantity;
  metric: LevelMetric;
  weighting: Weighting;
  field: LevelField;
  /**
   * Whether the stated value already holds the uncertainty.
   */
  kIncluded: boolean;
  /**
   * Uncertainty of the level: the one stated by the source or, where it states none, the one the author judges right.
   */
  uncertaintyDb: number;
  operatingState: Text;
  character: Character;
  source: Source;
}
/**
 * Values in third-octave bands.
 */
export interface ThirdOctaveLevel {
  /**
   * Names the variant.
   */
  kind: "third-octave";
  bandsDb: ThirdOctaveBands;
  quantity: LevelQuantity;
  metric: LevelMetric;
  weighting: Weighting;
  field: LevelField;
  /**
   * Whether the stated value already holds the uncertainty.
   */
  kIncluded: boolean;
  /**
   * Uncertainty of the level: the one stated by the source or, where it states none, the one the author judges right.
   */
  uncertaintyDb: number;
  operatingState: Text;
  character: Character;
  source: Source;
}
/**
 * A role in an organisation; no personal names.
 */
export interface Who {
  role: Text;
  organisation: Text;
}
