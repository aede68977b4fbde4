import { didYouMean } from "../did-you-mean.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { receivedText } from "../received-text.ts";

/** A mistake for an id that is not among the known ones, or nothing. */
export function unknownId(
  texts: ReadonlyMap<string, string>,
  file: string,
  pointer: string,
  id: string,
  known: Iterable<string>,
  what: string,
): readonly Mistake[] {
  const all = new Set(known);
  if (all.has(id)) return [];
  return [mistakeAt(texts, file, pointer, `the id of a ${what}`, receivedText(id), didYouMean(id, all, what))];
}
