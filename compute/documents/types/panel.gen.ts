// Made from schema/ by `npm run types`. Do not edit.
import type { Id, LossBands, Source, Text } from "./common.gen.ts";

/**
 * Data sheet of a sheet or wall that sound has to pass through.
 */
export interface Panel {
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
  /**
   * Mass per area.
   */
  surfaceDensityKgm2: number;
  /**
   * Whether the panel has no gaps or cracks that sound passes.
   */
  closed: boolean;
  reductionIndexDb: LossBands;
  assumed63Hz?: Text;
  source: Source;
}
