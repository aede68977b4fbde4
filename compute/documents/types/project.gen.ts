// Made from schema/ by `npm run types`. Do not edit.
import type { Clock, ClockEnd, Days, Id, LanguageCode, Line, Outline, Place, PlainDate, ReceptorUse, Stands, Text, Who } from "./common.gen.ts";

/**
 * The method levels are worked out by, with what it needs to know.
 */
export type Method = Iso9613Method;
/**
 * Number of homes: 0, a whole number from 5, or "fewer-than-5"; small counts are never entered, as the files are public.
 */
export type Homes = number | 0 | "fewer-than-5";
/**
 * Where the point is meant to be: in front of a facade or in a free field.
 */
export type PointPosition = FacadePosition | FreeFieldPosition;
/**
 * One site: its place, surroundings, receptors, hours, contacts and the rules it is judged by.
 */
export interface Project {
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
  town: Text;
  client: Text;
  contractor: Text;
  /**
   * Languages of the site; the first is complete.
   *
   * @minItems 1
   */
  languages: LanguageCode[];
  /**
   * Time zone of all clock times, a name of the IANA list.
   */
  timeZone: string;
  /**
   * Address the site is published under, ending in a slash; needed for codes, feed and calendar.
   */
  publicUrl?: string;
  /**
   * Ground level wherever no other is given, metres above the project's own datum.
   */
  groundLevelM: number;
  /**
   * Permitted working hours.
   *
   * @minItems 1
   */
  hours: Hours[];
  method: Method;
  boundary: Outline;
  /**
   * Roads, paths and quays the public may use.
   */
  publicWays: PublicWay[];
  /**
   * Buildings in and around the site.
   */
  buildings: Building[];
  /**
   * Excavations.
   */
  excavations: Excavation[];
  ground: Ground;
  /**
   * Places with people who should not be disturbed.
   *
   * @minItems 1
   */
  receptors: Receptor[];
  /**
   * Ids of the limit sets the project is judged by.
   *
   * @minItems 1
   */
  limitSets: Id[];
  dutySet: Id;
  /**
   * Whom to call, the first first.
   *
   * @minItems 1
   */
  contacts: Contact[];
  /**
   * Values this project has held against their source.
   */
  confirmed: Confirmed[];
  /**
   * Values knowingly used although not confirmed.
   */
  acknowledged: Acknowledged[];
}
/**
 * One row of the project's permitted working hours.
 */
export interface Hours {
  days: Days;
  from: Clock;
  to: ClockEnd;
}
/**
 * ISO 9613-2:1996, octave bands, downwind.
 */
export interface Iso9613Method {
  /**
   * Names the variant.
   */
  kind: "iso-9613-2-1996";
  /**
   * Ground attenuation: the general method (7.3.1), or the alternative one (7.3.2, A-weighted levels over porous ground only).
   */
  ground: "general" | "alternative";
  /**
   * What a screen does to the ground effect of hard ground: "literal" takes equation (12) as printed, "conservative" does not credit the lost ground reflection twice.
   */
  screenOverHardGround: "conservative" | "literal";
  /**
   * Air temperature for air absorption.
   */
  temperatureC: number;
  /**
   * Relative humidity for air absorption.
   */
  humidityPct: number;
  /**
   * Air pressure for air absorption.
   */
  pressureKpa: number;
  /**
   * Whether first-order reflections from walls and screens are counted (7.5).
   */
  reflections: "first-order" | "none";
  /**
   * C0 of the meteorological correction (clause 8); 0 gives the downwind level, which is the cautious choice.
   */
  c0Db: number;
}
/**
 * A road, path or quay the public may use.
 */
export interface PublicWay {
  id: Id;
  name: Text;
  line: Line;
  /**
   * Full width.
   */
  widthM: number;
}
/**
 * A building that screens or bears a facade.
 */
export interface Building {
  id: Id;
  name: Text;
  outline: Outline;
  /**
   * Height of the roof above the ground here.
   */
  heightM: number;
  /**
   * Ground level here, metres above the project's own datum; where it is left out the project's groundLevelM holds.
   */
  groundM?: number;
  standsFrom?: Stands;
  standsUntil?: Stands;
  /**
   * What its walls reflect, as ISO 9613-2:1996, Table 4 sorts them: flat hard walls (ρ = 1), walls with windows and small additions (0.8), walls with half their area open or with installations (0.4), or none.
   */
  walls: "flat" | "with-windows" | "half-open" | "not-reflecting";
}
/**
 * A pit whose edge screens what stands in it; its rim lies at the ground level around.
 */
export interface Excavation {
  id: Id;
  name: Text;
  outline: Outline;
  /**
   * Level of the rim, metres above the project's own datum; where it is left out the project's groundLevelM holds.
   */
  rimM?: number;
  standsFrom?: Stands;
  standsUntil?: Stands;
}
/**
 * The ground sound passes over.
 */
export interface Ground {
  elsewhere: GroundElsewhere;
  /**
   * Areas with a ground of their own.
   */
  areas: GroundArea[];
}
/**
 * Ground wherever no area is given.
 */
export interface GroundElsewhere {
  /**
   * Ground factor G of ISO 9613-2: 0 hard, 1 porous.
   */
  groundFactor: number;
  description: Text;
}
/**
 * An area with a ground of its own.
 */
export interface GroundArea {
  id: Id;
  outline: Outline;
  /**
   * Ground factor G of ISO 9613-2: 0 hard, 1 porous.
   */
  groundFactor: number;
  description: Text;
  standsFrom?: Stands;
  standsUntil?: Stands;
}
/**
 * A place with people who should not be disturbed, known by building or street.
 */
export interface Receptor {
  id: Id;
  name: Text;
  use: ReceptorUse;
  homes: Homes;
  /**
   * Positions levels are worked out at.
   *
   * @minItems 1
   */
  points: ReceptorPoint[];
}
/**
 * A position at a receptor, such as a floor of a facade.
 */
export interface ReceptorPoint {
  id: Id;
  name: Text;
  at: Place;
  /**
   * Height above the ground here.
   */
  heightM: number;
  /**
   * Ground level here, metres above the project's own datum; where it is left out the project's groundLevelM holds.
   */
  groundM?: number;
  position: PointPosition;
}
/**
 * In front of a facade.
 */
export interface FacadePosition {
  /**
   * Names the variant.
   */
  kind: "facade";
  building: Id;
  /**
   * Distance from the facade.
   */
  distanceM: number;
}
/**
 * In a free field, no facade near.
 */
export interface FreeFieldPosition {
  /**
   * Names the variant.
   */
  kind: "free-field";
}
/**
 * Whom to call; a role, never a person.
 */
export interface Contact {
  id: Id;
  role: Text;
  /**
   * Telephone number.
   */
  telephone: string;
  /**
   * E-mail address.
   */
  email: string;
  hours: Text;
  /**
   * Languages spoken there.
   *
   * @minItems 1
   */
  languages: LanguageCode[];
}
/**
 * A value that this project has held against its source.
 */
export interface Confirmed {
  /**
   * Document the value stands in: plant, panel, lining, silencer, limit-set or duty-set, and its id.
   */
  document: string;
  /**
   * Place of the value's source in that document, as a JSON pointer.
   */
  pointer: string;
  by: Who;
  /**
   * What it was held against.
   */
  against: {
    /**
     * The document.
     */
    document: string;
    /**
     * Clause, table or row.
     */
    clause: string;
  };
  date: PlainDate;
}
/**
 * A value that is knowingly used although not confirmed.
 */
export interface Acknowledged {
  /**
   * Document the value stands in: plant, panel, lining, silencer, limit-set or duty-set, and its id.
   */
  document: string;
  /**
   * Place of the value's source in that document, as a JSON pointer.
   */
  pointer: string;
  by: Who;
  reason: Text;
  date: PlainDate;
}
