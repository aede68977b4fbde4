import { evaluate } from "./evaluate.ts";
import type { Expression } from "./expression.ts";
import type { Unfolded } from "./unfold.ts";

/** Sums up to this many terms are printed in full. */
const FULL_LENGTH = 4;

/** Which terms of a sum are printed: all of a short one; the first and the largest of a long one. */
export function shownTerms(unfolded: Unfolded): (terms: readonly Expression[]) => readonly number[] {
  const numbers = new Map([...unfolded.given].map(([name, given]) => [name, given.value]));
  for (const row of unfolded.rows) numbers.set(row.name, row.value);
  const scope = { numbers, lists: new Map(), definitions: new Map(), indexes: new Map() };
  return (terms) => {
    if (terms.length <= FULL_LENGTH) return [...terms.keys()];
    const sizes = terms.map((term) => Math.abs(evaluate(term, scope)));
    const largest = sizes.indexOf(Math.max(...sizes));
    return largest === 0 ? [0] : [0, largest];
  };
}
