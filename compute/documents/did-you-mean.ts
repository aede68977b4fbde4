import { listText } from "./list-text.ts";
import { nearest } from "./nearest.ts";

/** Advice for a word that is not among the known ones: the nearest, or else all of them. */
export function didYouMean(word: unknown, candidates: Iterable<string>, what: string): string {
  const all = [...candidates].sort();
  const near = typeof word === "string" ? nearest(word, all) : undefined;
  if (near !== undefined) return `Did you mean "${near}"?`;
  return all.length === 0 ? `There is no ${what} yet.` : `Known here: ${listText(all, "and")}.`;
}
