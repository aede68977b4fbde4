import type { DocumentSet } from "../document-set.ts";
import type { Stands } from "../types/common.gen.ts";

/** First and last day, both counted. */
export interface Span {
  readonly from: string;
  readonly until: string;
}
const EVER: Span = { from: "0000-01-01", until: "9999-12-31" };

/**
 * The days on which something stands: a date counts as the first or the last day, a phase as its own first or last day.
 *
 * @returns nothing if a phase is not known or its statement has mistakes
 */
export function standsSpan(
  set: DocumentSet,
  projectId: string,
  thing: { readonly standsFrom?: Stands; readonly standsUntil?: Stands },
): Span | undefined {
  const from = thing.standsFrom ? dayOf(set, projectId, thing.standsFrom, "from") : EVER.from;
  const until = thing.standsUntil ? dayOf(set, projectId, thing.standsUntil, "until") : EVER.until;
  return from === undefined || until === undefined ? undefined : { from, until };
}

function dayOf(set: DocumentSet, projectId: string, stands: Stands, end: keyof Span): string | undefined {
  return stands.kind === "date" ? stands.date : set.statement.valid.get(`${projectId}/${stands.phase}`)?.sheet[end];
}
