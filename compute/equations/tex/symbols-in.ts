import type { Expression } from "./expression.ts";
import { mapChildren } from "./map-children.ts";

/** Names of all symbols in an expression, each once. */
export function symbolsIn(expression: Expression): ReadonlySet<string> {
  const names = new Set<string>();
  const visit = (part: Expression): Expression => {
    if (part.kind === "symbol") names.add(part.name);
    return mapChildren(part, visit);
  };
  visit(expression);
  return names;
}
