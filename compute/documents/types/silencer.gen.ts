// Made from schema/ by `npm run types`. Do not edit.
import type { Id, LossBands, Source, Text } from "./common.gen.ts";

/**
 * Data sheet of a silencer for an opening.
 */
export interface Silencer {
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
  insertionLossDb: LossBands;
  source: Source;
}
