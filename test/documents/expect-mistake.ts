import { expect } from "vitest";
import { type Edit, editedTexts, mistakeLines, placeOf } from "./content-folder.ts";

/** A mistake: what is changed, the file and the piece of its text that the place points at, and the line after the place. */
export type Case = readonly [title: string, edits: readonly Edit[], file: string, piece: string, line: string];

export const PROJECT = "projects/north-quay/project.json";
export const STATEMENT = "projects/north-quay/piling/statement.json";

/** The changed content has this one mistake and no other. */
export function expectMistake(edits: readonly Edit[], file: string, piece: string, line: string): void {
  const texts = editedTexts(edits);
  expect(mistakeLines(texts)).toEqual([`${file}:${placeOf(texts[file] ?? "", piece)} ${line}`]);
}
