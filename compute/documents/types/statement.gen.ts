// Made from schema/ by `npm run types`. Do not edit.
import type { Clock, ClockEnd, Days, Id, Line, Place, PlainDate, Stands, Text } from "./common.gen.ts";

/**
 * Whether the plant of this activity may run at the same time.
 */
export type RunTogether = MayRunTogether | CannotRunTogether;
/**
 * What is around the machine.
 */
export type Setting = OpenSetting | TrenchSetting | RoomSetting | TunnelSetting | UnderSlabSetting;
/**
 * Whatever reduces noise.
 */
export type Control =
  ScreenControl | BundControl | EnclosureControl | QuieterPlantControl | RunningTimeControl | PracticeControl;
/**
 * Whether the control is part of the statement.
 */
export type ControlState = AdoptedState | OfferedState | RejectedState;
/**
 * What the side of a screen towards the plant does with sound.
 */
export type Facing = ReflectiveFacing | AbsorptiveFacing;
/**
 * What the zone passes.
 */
export type ZoneCrossing = CrossesBoundary | CrossesPublicWay | CrossesReceptor;
/**
 * What keeps people out or lowers the level.
 */
export type ZoneRemedy = KeptOut | Lowered;
/**
 * Whether vibration is expected; it is not computed.
 */
export type Vibration = VibrationNotExpected | VibrationExpected;
/**
 * The method statement of one phase.
 */
export interface Statement {
  /**
   * Path of the schema, for editors; not read by the program.
   */
  $schema?: string;
  project: Id;
  phase: Id;
  /**
   * True for a made-up example: every page and sheet made from it says so.
   */
  invented: boolean;
  title: Text;
  what: Text;
  why: Text;
  from: PlainDate;
  until: PlainDate;
  /**
   * Length of the shift of the people on site.
   */
  shiftH: number;
  /**
   * The activities.
   *
   * @minItems 1
   */
  activities: Activity[];
  /**
   * Whatever reduces noise, adopted or not.
   */
  controls: Control[];
  /**
   * What is done where a zone passes the boundary, a public way or a receptor.
   */
  zoneAnswers: ZoneAnswer[];
  earProtection: EarProtection;
  vibration: Vibration;
  /**
   * Offers to neighbours.
   */
  offers: Offer[];
  competence: Text;
  approval: Approval;
}
/**
 * Plant working together in a working window.
 */
export interface Activity {
  id: Id;
  title: Text;
  what: Text;
  from: PlainDate;
  until: PlainDate;
  /**
   * Working windows.
   *
   * @minItems 1
   */
  windows: Window[];
  outsideHours?: Text;
  runTogether: RunTogether;
  /**
   * The plant at work.
   *
   * @minItems 1
   */
  plant: PlantItem[];
}
/**
 * A working window.
 */
export interface Window {
  id: Id;
  days: Days;
  from: Clock;
  to: ClockEnd;
}
/**
 * All of it may run at once.
 */
export interface MayRunTogether {
  /**
   * Names the variant.
   */
  kind: "may";
}
/**
 * Only one item can run at a time.
 */
export interface CannotRunTogether {
  /**
   * Names the variant.
   */
  kind: "cannot";
  why: Text;
}
/**
 * A machine at its place.
 */
export interface PlantItem {
  id: Id;
  sheet: Id;
  name: Text;
  at: Place;
  /**
   * Ground level here, metres above the project's own datum; where it is left out the project's groundLevelM holds.
   */
  groundM?: number;
  /**
   * Bearing of its length, clockwise from north.
   */
  bearingDeg: number;
  /**
   * Share of the activity's own working window in which it runs at its stated level.
   */
  onTimePct: number;
  /**
   * Longest stretch without a stop.
   */
  longestRunMin?: number;
  /**
   * Shortest stop between two runs.
   */
  shortestStopMin?: number;
  setting: Setting;
}
/**
 * In the open.
 */
export interface OpenSetting {
  /**
   * Names the variant.
   */
  kind: "open";
}
/**
 * In a trench: the whole space is a zone.
 */
export interface TrenchSetting {
  /**
   * Names the variant.
   */
  kind: "trench";
  name: Text;
}
/**
 * In a room: the whole space is a zone.
 */
export interface RoomSetting {
  /**
   * Names the variant.
   */
  kind: "room";
  name: Text;
}
/**
 * In a tunnel: the whole space is a zone.
 */
export interface TunnelSetting {
  /**
   * Names the variant.
   */
  kind: "tunnel";
  name: Text;
}
/**
 * Under a slab: the whole space is a zone.
 */
export interface UnderSlabSetting {
  /**
   * Names the variant.
   */
  kind: "under-slab";
  name: Text;
}
/**
 * A screen or hoarding along a line.
 */
export interface ScreenControl {
  /**
   * Names the variant.
   */
  kind: "screen";
  id: Id;
  name: Text;
  state: ControlState;
  by: Text;
  due: PlainDate;
  checkedBy: Text;
  line: Line;
  /**
   * Height above the ground here.
   */
  heightM: number;
  /**
   * Ground level here, metres above the project's own datum; where it is left out the project's groundLevelM holds.
   */
  groundM?: number;
  panel: Id;
  standsFrom: Stands;
  standsUntil?: Stands;
  /**
   * Taken off the panel's sound reduction index for joints made on site.
   */
  siteBuildDeductionDb: number;
  /**
   * Openings under and between the panels; an empty list states that there are none.
   */
  gaps: ScreenGap[];
  facing: Facing;
}
/**
 * Part of the statement; figures count it.
 */
export interface AdoptedState {
  /**
   * Names the variant.
   */
  kind: "adopted";
}
/**
 * Offered, not yet part of the statement.
 */
export interface OfferedState {
  /**
   * Names the variant.
   */
  kind: "offered";
}
/**
 * Considered and not taken.
 */
export interface RejectedState {
  /**
   * Names the variant.
   */
  kind: "rejected";
  reason: Text;
}
/**
 * An opening in a screen; sound passes it without loss.
 */
export interface ScreenGap {
  id: Id;
  /**
   * Area of the gap.
   */
  areaM2: number;
}
/**
 * A hard side that throws sound back.
 */
export interface ReflectiveFacing {
  /**
   * Names the variant.
   */
  kind: "reflective";
}
/**
 * A side with a lining.
 */
export interface AbsorptiveFacing {
  /**
   * Names the variant.
   */
  kind: "absorptive";
  sheet: Id;
}
/**
 * A bank of earth or spoil along a line, its crest level.
 */
export interface BundControl {
  /**
   * Names the variant.
   */
  kind: "bund";
  id: Id;
  name: Text;
  state: ControlState;
  by: Text;
  due: PlainDate;
  checkedBy: Text;
  line: Line;
  /**
   * Height of the crest above the ground here.
   */
  heightM: number;
  /**
   * Ground level here, metres above the project's own datum; where it is left out the project's groundLevelM holds.
   */
  groundM?: number;
  standsFrom: Stands;
  standsUntil?: Stands;
}
/**
 * A full enclosure around plant.
 */
export interface EnclosureControl {
  /**
   * Names the variant.
   */
  kind: "enclosure";
  id: Id;
  name: Text;
  state: ControlState;
  by: Text;
  due: PlainDate;
  checkedBy: Text;
  /**
   * Plant items inside.
   *
   * @minItems 1
   */
  appliesTo: Id[];
  /**
   * Walls, roof and doors.
   *
   * @minItems 1
   */
  faces: EnclosureFace[];
  /**
   * Openings for air and pipes.
   */
  openings: EnclosureOpening[];
  lining: EnclosureLining;
  floor: EnclosureFloor;
  unlinedSheet?: Id;
  /**
   * Taken off the reduction index of the faces because site-built joints leak.
   */
  siteBuildDeductionDb: number;
  /**
   * Whether the ear-protection notice names the enclosure as kept closed.
   */
  namedClosedOnNotice: boolean;
}
/**
 * A wall, the roof or a door of an enclosure.
 */
export interface EnclosureFace {
  id: Id;
  panel: Id;
  /**
   * Its area.
   */
  areaM2: number;
}
/**
 * An opening of an enclosure.
 */
export interface EnclosureOpening {
  id: Id;
  /**
   * Its area.
   */
  areaM2: number;
  silencer?: Id;
}
/**
 * The lining inside the faces.
 */
export interface EnclosureLining {
  sheet: Id;
  /**
   * Lined area.
   */
  areaM2: number;
}
/**
 * The floor of the enclosure.
 */
export interface EnclosureFloor {
  sheet: Id;
  /**
   * Floor area.
   */
  areaM2: number;
}
/**
 * A quieter machine or way of working.
 */
export interface QuieterPlantControl {
  /**
   * Names the variant.
   */
  kind: "quieter-plant";
  id: Id;
  name: Text;
  state: ControlState;
  by: Text;
  due: PlainDate;
  checkedBy: Text;
  /**
   * Plant items that are the quieter ones.
   *
   * @minItems 1
   */
  appliesTo: Id[];
  insteadOf: Id;
}
/**
 * A shorter running time.
 */
export interface RunningTimeControl {
  /**
   * Names the variant.
   */
  kind: "running-time";
  id: Id;
  name: Text;
  state: ControlState;
  by: Text;
  due: PlainDate;
  checkedBy: Text;
  /**
   * Plant items that run for less time.
   *
   * @minItems 1
   */
  appliesTo: Id[];
  /**
   * On-time there would be without this control.
   */
  insteadOfPct: number;
}
/**
 * A way of working that is not computed.
 */
export interface PracticeControl {
  /**
   * Names the variant.
   */
  kind: "practice";
  id: Id;
  name: Text;
  state: ControlState;
  by: Text;
  due: PlainDate;
  checkedBy: Text;
  measure: Text;
}
/**
 * What is done where a zone passes the boundary, a public way or a receptor.
 */
export interface ZoneAnswer {
  plant: Id;
  crosses: ZoneCrossing;
  answer: ZoneRemedy;
}
/**
 * The boundary of the site.
 */
export interface CrossesBoundary {
  /**
   * Names the variant.
   */
  kind: "boundary";
}
/**
 * A public way.
 */
export interface CrossesPublicWay {
  /**
   * Names the variant.
   */
  kind: "public-way";
  id: Id;
}
/**
 * A receptor.
 */
export interface CrossesReceptor {
  /**
   * Names the variant.
   */
  kind: "receptor";
  id: Id;
}
/**
 * People are kept out.
 */
export interface KeptOut {
  /**
   * Names the variant.
   */
  kind: "kept-out";
  how: Text;
}
/**
 * The level is lowered.
 */
export interface Lowered {
  /**
   * Names the variant.
   */
  kind: "lowered";
  how: Text;
}
/**
 * What the ear-protection notices say besides the computed part.
 */
export interface EarProtection {
  issuedAt: Text;
  protectorType: Text;
  askRole: Text;
  emergencySignal: Text;
  /**
   * Entrances to the zones; one notice each.
   *
   * @minItems 1
   */
  entrances: Entrance[];
}
/**
 * An entrance to a zone.
 */
export interface Entrance {
  id: Id;
  name: Text;
  at: Place;
}
/**
 * Not expected.
 */
export interface VibrationNotExpected {
  /**
   * Names the variant.
   */
  kind: "not-expected";
  why: Text;
}
/**
 * Expected.
 */
export interface VibrationExpected {
  /**
   * Names the variant.
   */
  kind: "expected";
  documents: Text;
  criteria: Text;
  warnings: Text;
}
/**
 * An offer to neighbours.
 */
export interface Offer {
  id: Id;
  text: Text;
}
/**
 * Who prepared, checked and approved the statement.
 */
export interface Approval {
  prepared: Signed;
  checked: Signed;
  approved: Signed;
}
/**
 * A role in an organisation on a date.
 */
export interface Signed {
  role: Text;
  organisation: Text;
  date: PlainDate;
}
