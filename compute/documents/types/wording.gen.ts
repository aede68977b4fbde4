// Made from schema/ by `npm run types`. Do not edit.
import type { LanguageCode } from "./common.gen.ts";

/**
 * Name of a section or of words in it: letters, digits, dots, hyphens and underscores, starting with a letter.
 */
export type WordingKey = string;
/**
 * Every word the templates print in one language.
 */
export interface Wording {
  /**
   * Path of the schema, for editors; not read by the program.
   */
  $schema?: string;
  language: LanguageCode;
  /**
   * Sections of words, by name.
   */
  sections: {
    [k: string]: WordingSection;
  };
}
/**
 * Words by key.
 */
export interface WordingSection {
  /**
   * The words; a name in braces stands for a value.
   */
  [k: string]: string;
}
