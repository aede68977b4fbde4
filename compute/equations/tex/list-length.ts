import type { Expression } from "./expression.ts";
import type { Scope } from "./scope.ts";
import { symbolsIn } from "./symbols-in.ts";

/** Length of the lists a series runs over. */
export function listLength(series: Expression & { kind: "series" }, scope: Scope): number {
  const lengths = new Set<number>();
  for (const name of symbolsIn(series.of)) {
    const list = name.endsWith(series.index) ? scope.lists.get(name) : undefined;
    if (list) lengths.add(list.length);
  }
  const [length, ...others] = lengths;
  if (length === undefined || others.length > 0) throw new Error(`the series over ${series.index} has no one length`);
  return length;
}
