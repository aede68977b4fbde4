import { statSync } from "node:fs";
import path from "node:path";
import { assembleContent } from "./assemble-content.ts";
import type { Content } from "./content.ts";
import { type ContentFile, contentFiles } from "./content-files.ts";
import { layout } from "./layout.ts";
import { makeDocumentSet } from "./make-document-set.ts";
import type { Mistake } from "./mistake.ts";
import { parseDocument } from "./parse-document.ts";
import { readDocument } from "./read-document.ts";
import { rules } from "./rules/rules.ts";
import { schemaMistakes } from "./schema-mistakes.ts";
import { sortMistakes } from "./sort-mistakes.ts";

export type Loaded =
  | { readonly kind: "valid"; readonly content: Content }
  | { readonly kind: "invalid"; readonly mistakes: readonly Mistake[] };

/**
 * Reads and validates everything authors wrote: all mistakes of all files at once, or the content.
 *
 * @param dir  the content folder; files are named as seen from the current folder
 */
export function loadContent(dir: string): Loaded {
  const folder = path.relative(process.cwd(), path.resolve(dir)).split(path.sep).join("/") || ".";
  if (!statSync(folder, { throwIfNoEntry: false })?.isDirectory())
    return { kind: "invalid", mistakes: [noFolder(folder)] };
  const { files, mistakes } = contentFiles(folder, layout);
  const { texts, method, ...read } = readAll(files);
  const shaped = new Map<ContentFile, unknown>();
  for (const file of files) {
    const value = texts.has(file.file) ? shapeOf(file, texts, read.mistakes) : undefined;
    if (value !== undefined) shaped.set(file, value);
  }
  const set = makeDocumentSet(texts, files, shaped);
  mistakes.push(...read.mistakes, ...rules.flatMap((rule) => rule(set)));
  return mistakes.length > 0
    ? { kind: "invalid", mistakes: sortMistakes(mistakes) }
    : { kind: "valid", content: assembleContent(set, method) };
}

/** Texts of the JSON documents by file, and the prose by name. */
function readAll(files: readonly ContentFile[]): {
  texts: Map<string, string>;
  method: Map<string, string>;
  mistakes: Mistake[];
} {
  const texts = new Map<string, string>();
  const method = new Map<string, string>();
  const mistakes: Mistake[] = [];
  for (const { file, layout: place, name } of files) {
    const read = readDocument(file);
    if (read.kind === "unreadable") mistakes.push(read.mistake);
    else if (place.kind === "prose") method.set(name, read.text);
    else texts.set(file, read.text);
  }
  return { texts, method, mistakes };
}

/** The value of a document that meets its schema; otherwise nothing, and its mistakes are added to the list. */
function shapeOf(file: ContentFile, texts: ReadonlyMap<string, string>, mistakes: Mistake[]): unknown {
  const parsed = parseDocument(file.file, texts.get(file.file) ?? "");
  if (parsed.kind === "broken") {
    mistakes.push(...parsed.mistakes);
    return undefined;
  }
  const found =
    file.layout.kind === "document" ? schemaMistakes(texts, file.file, file.layout.document, parsed.value) : [];
  mistakes.push(...found);
  return found.length === 0 ? parsed.value : undefined;
}

function noFolder(folder: string): Mistake {
  const advice = "Name the folder that holds projects, data-sheets, limits, duties and wording.";
  return { file: folder, line: 1, column: 1, pointer: "", expected: "a content folder", received: "nothing", advice };
}
