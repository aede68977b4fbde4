import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { loadContent } from "../../compute/documents/load-content.ts";
import type { Mistake } from "../../compute/documents/mistake.ts";
import { mistakeText } from "../../compute/documents/mistake-text.ts";
import { baseContent } from "./base-content.ts";

/** One change of the base: a document, a JSON pointer in it ("-" adds to a list), and the new value; nothing removes. */
export type Edit = readonly [file: string, pointer: string, value?: unknown];

/** Texts of the base content with some changes. */
export function editedTexts(edits: readonly Edit[]): Record<string, string> {
  const documents = JSON.parse(JSON.stringify(baseContent)) as Record<string, unknown>;
  for (const [file, pointer, value] of edits) {
    if (pointer === "") {
      if (value === undefined) delete documents[file];
      else documents[file] = value;
    } else change(documents[file], pointer.slice(1).split("/"), value);
  }
  return Object.fromEntries(
    Object.entries(documents).map(([file, value]) => [file, `${JSON.stringify(value, null, 2)}\n`]),
  );
}

function change(document: unknown, steps: readonly string[], value: unknown): void {
  const [step = "", ...rest] = steps;
  const holder = document as Record<string, unknown>;
  if (rest.length > 0) change(holder[step], rest, value);
  else if (Array.isArray(document) && step === "-") document.push(value);
  else if (Array.isArray(document) && value === undefined) document.splice(Number(step), 1);
  else if (value === undefined) delete holder[step];
  else holder[step] = value;
}

/** Does something with a temporary folder that holds these texts. */
export function withFolder<T>(texts: Readonly<Record<string, string | Uint8Array>>, work: (folder: string) => T): T {
  const folder = mkdtempSync(path.join(tmpdir(), "content-"));
  try {
    for (const [file, text] of Object.entries(texts)) {
      mkdirSync(path.dirname(path.join(folder, file)), { recursive: true });
      writeFileSync(path.join(folder, file), text);
    }
    return work(folder);
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Lines of the mistakes in these texts, with files named as seen from the content folder. */
export function mistakeLines(texts: Readonly<Record<string, string | Uint8Array>>): readonly string[] {
  return withFolder(texts, (folder) => {
    const loaded = loadContent(folder);
    if (loaded.kind === "valid") return [];
    const prefix = `${path.relative(process.cwd(), folder)}/`;
    return loaded.mistakes.map((mistake: Mistake) =>
      mistakeText({ ...mistake, file: mistake.file.replace(prefix, "") }),
    );
  });
}

/** Line and column of a piece of text that stands once in a file. */
export function placeOf(text: string, piece: string): string {
  const pieces = text.split(piece);
  if (pieces.length !== 2) throw new Error(`${JSON.stringify(piece)} stands ${pieces.length - 1} times in the text`);
  const lines = (pieces[0] ?? "").split("\n");
  return `${lines.length}:${(lines.at(-1) ?? "").length + 1}`;
}
