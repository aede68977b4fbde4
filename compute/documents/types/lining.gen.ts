// Made from schema/ by `npm run types`. Do not edit.
import type { AbsorptionBands, Id, Source, Text } from "./common.gen.ts";

/**
 * Data sheet of an absorbing surface.
 */
export interface Lining {
  /**
   * Path of the schema, for editors; not read by the program.
   */
  $schema?: string;
  id: Id;
  /**
   * True for a made-up example: every page and sheet made from it says so.
   */
  invented: boolean;
  name: Text;
  absorption: AbsorptionBands;
  assumed63Hz?: Text;
  source: Source;
}
