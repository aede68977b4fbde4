import type { Expression, FunctionName, Relation } from "./expression.ts";
import { listLength } from "./list-length.ts";
import type { Scope } from "./scope.ts";

/**
 * The value of an expression, worked out from its tree alone.
 *
 * @throws {Error} for a symbol without a value
 */
export function evaluate(expression: Expression, scope: Scope): number {
  const of = (inner: Expression) => evaluate(inner, scope);
  switch (expression.kind) {
    case "number":
      return Number(expression.text);
    case "constant":
      return expression.value;
    case "symbol":
      return symbolValue(expression.name, scope);
    case "negate":
      return -of(expression.of);
    case "add":
      return expression.sign === "+"
        ? of(expression.left) + of(expression.right)
        : of(expression.left) - of(expression.right);
    case "multiply":
      return of(expression.left) * of(expression.right);
    case "divide":
      return of(expression.top) / of(expression.bottom);
    case "power":
      return of(expression.base) ** of(expression.exponent);
    case "root":
      return Math.sqrt(of(expression.of));
    case "group":
      return of(expression.of);
    case "call":
      return functions[expression.name](...expression.args.map(of));
    case "apply":
      return apply(expression.name, expression.args.map(of), scope);
    case "cases":
      return of(branchOf(expression.branches, scope));
    case "series":
      return indexesOf(expression, scope).reduce((sum, at) => sum + evaluate(expression.of, at), 0);
    case "terms":
      return expression.terms.reduce((sum, term) => sum + of(term), 0);
  }
}

const functions: Readonly<Record<FunctionName, (...args: number[]) => number>> = {
  lg: Math.log10,
  ln: Math.log,
  exp: Math.exp,
  sin: Math.sin,
  cos: Math.cos,
  tan: Math.tan,
  tanh: Math.tanh,
  min: Math.min,
  max: Math.max,
  floor: Math.floor,
  abs: Math.abs,
};

function symbolValue(name: string, scope: Scope): number {
  const number = scope.numbers.get(name);
  if (number !== undefined) return number;
  const place = scope.indexes.get(name);
  if (place !== undefined) return place;
  const definition = scope.definitions.get(name);
  if (definition?.kind === "quantity") return evaluate(definition.body, { ...scope, indexes: new Map() });
  const index = scope.indexes.get(name.at(-1) ?? "");
  if (index !== undefined) {
    const item = scope.lists.get(name)?.[index - 1];
    if (item !== undefined) return item;
    const constant = definition?.kind === "list" ? definition.values[index - 1] : undefined;
    if (constant) return evaluate(constant, scope);
  }
  throw new Error(`no value for the symbol ${name}`);
}

function apply(name: string, args: readonly number[], scope: Scope): number {
  const definition = scope.definitions.get(name);
  if (definition?.kind !== "function" || definition.parameters.length !== args.length) {
    throw new Error(`no function ${name} of ${args.length} arguments`);
  }
  const numbers = new Map(scope.numbers);
  for (const [i, parameter] of definition.parameters.entries()) numbers.set(parameter, args[i] as number);
  return evaluate(definition.body, { ...scope, numbers });
}

/** The value of the first branch whose condition holds. */
export function branchOf(branches: (Expression & { kind: "cases" })["branches"], scope: Scope): Expression {
  const branch = branches.find((candidate) => candidate.when.every((relation) => holds(relation, scope)));
  if (!branch) throw new Error("no branch of the cases holds");
  return branch.value;
}

function holds({ left, sign, right }: Relation, scope: Scope): boolean {
  const a = evaluate(left, scope);
  const b = evaluate(right, scope);
  switch (sign) {
    case "=":
      return a === b;
    case "<":
      return a < b;
    case ">":
      return a > b;
    case "\\le":
      return a <= b;
    case "\\ge":
      return a >= b;
  }
}

/** The scope at each value of the index of a series. An upper end without a value is the length of the lists. */
export function indexesOf(series: Expression & { kind: "series" }, scope: Scope): readonly Scope[] {
  const from = evaluate(series.from, scope);
  const open =
    series.to.kind === "symbol" && !scope.numbers.has(series.to.name) && !scope.definitions.has(series.to.name);
  const to = open ? listLength(series, scope) : evaluate(series.to, scope);
  return Array.from({ length: to - from + 1 }, (_, i) => ({
    ...scope,
    indexes: new Map(scope.indexes).set(series.index, from + i),
  }));
}
