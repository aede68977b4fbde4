import type { DocumentSet, Rule } from "../document-set.ts";
import { listText } from "../list-text.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { pointerSegments } from "../pointer-segments.ts";
import { receivedText } from "../received-text.ts";
import type { SheetKind } from "../references.ts";
import { walkValues } from "../walk-values.ts";
import { unknownId } from "./unknown-id.ts";

const KINDS: readonly SheetKind[] = ["duty-set", "limit-set", "lining", "panel", "plant", "silencer"];

/** What a project has confirmed or acknowledged is the source of a value in a document that is there. */
export const confirmations: Rule = (set) =>
  [...set.project.valid.values()].flatMap(({ sheet, file }) =>
    (["confirmed", "acknowledged"] as const).flatMap((list) =>
      sheet[list].flatMap((entry, index) => oneMistake(set, file, `/${list}/${index}`, entry.document, entry.pointer)),
    ),
  );

function oneMistake(
  set: DocumentSet,
  file: string,
  here: string,
  document: string,
  pointer: string,
): readonly Mistake[] {
  const [name = "", id = ""] = document.split("/");
  const kind = KINDS.find((known) => known === name);
  if (!kind) {
    const expected = `a kind and an id such as "plant/crawler-crane"`;
    return [
      mistakeAt(
        set.texts,
        file,
        `${here}/document`,
        expected,
        receivedText(document),
        `Kinds are ${listText(KINDS, "and")}.`,
      ),
    ];
  }
  const unknown = unknownId(
    set.texts,
    file,
    `${here}/document`,
    document,
    [...set[kind].names].map((known) => `${kind}/${known}`),
    "document",
  );
  const entry = set[kind].valid.get(id);
  if (unknown.length > 0 || !entry || isSource(valueAt(entry.sheet, pointer))) return unknown;
  const sources = [...walkValues(entry.sheet)]
    .filter((walked) => isSource(walked.value))
    .map((walked) => walked.pointer);
  const advice = `Sources there: ${listText(sources, "and")}.`;
  return [
    mistakeAt(
      set.texts,
      file,
      `${here}/pointer`,
      `the pointer of a source in ${document}`,
      receivedText(pointer),
      advice,
    ),
  ];
}

function valueAt(document: unknown, pointer: string): unknown {
  let value = document;
  for (const segment of pointerSegments(pointer)) {
    if (typeof value !== "object" || value === null || !Object.hasOwn(value, segment)) return undefined;
    value = (value as Record<string, unknown>)[segment];
  }
  return value;
}

function isSource(value: unknown): boolean {
  return typeof value === "object" && value !== null && Object.hasOwn(value, "checked");
}
