import type { Expression } from "./expression.ts";
import { katexTree } from "./katex-tree.ts";
import { type OwnFunctions, readExpression, readList } from "./read-expression.ts";
import { readTokens } from "./read-tokens.ts";
import type { Token } from "./token.ts";

/** A line below the relation: a quantity, a function of its own, or a list of constants. */
export type Definition = { readonly name: string; readonly tex: string } & (
  | { readonly kind: "quantity"; readonly body: Expression }
  | { readonly kind: "function"; readonly parameters: readonly string[]; readonly body: Expression }
  | { readonly kind: "list"; readonly values: readonly Expression[] }
);

export interface EquationTree {
  readonly body: Expression;
  /** In the order they are printed. */
  readonly definitions: ReadonlyMap<string, Definition>;
}

const read = new Map<string, EquationTree>();

/**
 * Reads the TeX of an equation: one relation, or an `aligned` block whose further rows are definitions.
 *
 * @throws {Error} if it does not typeset, or holds something the reader does not know
 */
export function readEquation(tex: string): EquationTree {
  const known = read.get(tex);
  if (known) return known;
  const [relation, ...rows] = relationsOf(tex);
  if (!relation) throw new Error(`no relation in ${tex}`);
  const own = new Set(rows.filter((row) => row.left.length === 2).map((row) => nameOf(row.left)));
  const definitions = new Map<string, Definition>();
  for (const row of rows) {
    if (definitions.has(nameOf(row.left))) throw new Error(`${nameOf(row.left)} is defined twice`);
    definitions.set(nameOf(row.left), readDefinition(row, own));
  }
  const tree = { body: readExpression(relation.right, own), definitions };
  read.set(tex, tree);
  return tree;
}

interface Sides {
  readonly left: readonly Token[];
  readonly right: readonly Token[];
}

function relationsOf(tex: string): readonly Sides[] {
  const tokens = readTokens(katexTree(tex));
  const block = tokens[0];
  const rows = tokens.length === 1 && block?.kind === "rows" ? block.rows.map((cells) => cells.flat()) : [tokens];
  return rows.map((row) => {
    const at = row.findIndex((token) => token.kind === "relation" && token.sign === "=");
    if (at < 1) throw new Error(`a row without = in ${tex}`);
    return { left: row.slice(0, at), right: row.slice(at + 1) };
  });
}

function nameOf(left: readonly Token[]): string {
  const [symbol, brackets, ...rest] = left;
  if (symbol?.kind !== "symbol" || rest.length > 0 || (brackets && brackets.kind !== "bracketed")) {
    throw new Error("the left side of a definition is a symbol, or a symbol with its arguments");
  }
  return symbol.name;
}

function readDefinition({ left, right }: Sides, own: OwnFunctions): Definition {
  const symbol = left[0] as Token & { kind: "symbol" };
  const { name, tex } = symbol;
  const brackets = left[1];
  if (brackets?.kind === "bracketed") {
    const parameters = readList(brackets.inside, own).map((parameter) => {
      if (parameter.kind !== "symbol") throw new Error(`the arguments of ${name} are symbols`);
      return parameter.name;
    });
    return { kind: "function", name, tex, parameters, body: readExpression(right, own) };
  }
  const values = readList(right, own);
  return values.length > 1
    ? { kind: "list", name, tex, values }
    : { kind: "quantity", name, tex, body: values[0] as Expression };
}
