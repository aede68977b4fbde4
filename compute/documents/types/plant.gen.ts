// Made from schema/ by `npm run types`. Do not edit.
import type { Id, Level, Text } from "./common.gen.ts";

/**
 * Data sheet of a machine or tool that makes noise.
 */
export interface Plant {
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
  emission: Level;
  workStation?: Level;
  peak?: Level;
  /**
   * Height of the acoustic centre above the ground the machine stands on.
   */
  acousticCentreHeightM: number;
  /**
   * Largest dimension of the machine; it sets the near field.
   */
  largestDimensionM: number;
  outline: PlantOutline;
  /**
   * How far moving parts reach beyond the outline.
   */
  swingM: number;
}
/**
 * Rectangle the machine covers on the ground, centred on its place.
 */
export interface PlantOutline {
  /**
   * Length along the bearing.
   */
  lengthM: number;
  /**
   * Width across the bearing.
   */
  widthM: number;
}
