// Made from schema/ by `npm run types`. Do not edit.
import type { SealedDate, SealedFigure } from "./revision.gen.ts";

/**
 * The figures of one revision, beside its pages.
 */
export interface FiguresFile {
  /**
   * Path of the schema; not read by the program.
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
   * Number of the revision.
   */
  revision: number;
  issuedOn: SealedDate;
  /**
   * Digest of the revision.
   */
  digest: string;
  /**
   * Published numbers, unrounded.
   */
  figures: SealedFigure[];
}
