import type { InputSpec } from "../equation.ts";
import { branchOf, evaluate, indexesOf } from "./evaluate.ts";
import type { Expression } from "./expression.ts";
import { mapChildren } from "./map-children.ts";
import { type Definition, readEquation } from "./read-equation.ts";
import { nameOfSymbol, type Scope, scopeOf, type WithInputs } from "./scope.ts";

/** One relation of an equation at given inputs: branches chosen, series written out, functions applied. */
export interface Row {
  readonly name: string;
  readonly tex: string;
  readonly body: Expression;
  readonly value: number;
}

/** An input as it stands in the rows; items of lists by `name#place`. */
export interface Given {
  readonly value: number;
  readonly spec: InputSpec;
}

export interface Unfolded {
  readonly main: Expression;
  readonly value: number;
  /** Definitions that this case uses, in printed order. */
  readonly rows: readonly Row[];
  readonly given: ReadonlyMap<string, Given>;
}

type Replacements = ReadonlyMap<string, Expression>;

/** Follows an equation through for one set of inputs, keeping its written form. */
export function unfold(equation: WithInputs, inputs: Readonly<Record<string, number | readonly number[]>>): Unfolded {
  const tree = readEquation(equation.tex);
  const scope = scopeOf(equation, tree.definitions, inputs);
  const order = [...tree.definitions.keys()];
  const rows = new Map<string, Row & { readonly place: number }>();

  const resolve = (part: Expression, at: Scope, replace: Replacements): Expression => {
    if (part.kind === "symbol") return resolveSymbol(part, at, replace);
    if (part.kind === "cases") return resolve(branchOf(part.branches, at), at, replace);
    if (part.kind === "series")
      return { kind: "terms", terms: indexesOf(part, at).map((each) => resolve(part.of, each, replace)) };
    if (part.kind === "apply") {
      const call = applied(part, at, replace);
      const tex = `${part.tex}\\left(${call.args.map(texOf).join(", ")}\\right)`;
      return row(
        `${part.name}(${call.args.map(nameOf).join(", ")})`,
        tex,
        part.name,
        () => resolve(call.body, call.at, call.replace),
        () => evaluate(part, at),
      );
    }
    return mapChildren(part, (inner) => resolve(inner, at, replace));
  };

  const resolveSymbol = (part: Expression & { kind: "symbol" }, at: Scope, replace: Replacements): Expression => {
    const replaced = replace.get(part.name);
    if (replaced) return replaced;
    if (at.numbers.has(part.name)) return part;
    const place = at.indexes.get(part.name);
    if (place !== undefined) return { kind: "number", text: String(place) };
    const definition = at.definitions.get(part.name);
    if (definition?.kind === "quantity") return resolveQuantity(definition);
    const index = at.indexes.get(part.name.at(-1) ?? "") ?? 0;
    if (definition?.kind === "list") return definition.values[index - 1] as Expression;
    return { ...part, name: `${part.name}#${index}` };
  };

  const resolveQuantity = (definition: Definition & { kind: "quantity" }): Expression => {
    const { name, tex, body } = definition;
    if (isLiteral(body)) return body;
    const none: Replacements = new Map();
    const whole = body.kind === "apply" ? applied(body, scope, none) : { body, at: scope, replace: none };
    return row(
      name,
      tex,
      name,
      () => resolve(whole.body, whole.at, whole.replace),
      () => evaluate(body, scope),
    );
  };

  const applied = (part: Expression & { kind: "apply" }, at: Scope, replace: Replacements) => {
    const definition = tree.definitions.get(part.name);
    if (definition?.kind !== "function") throw new Error(`no function ${part.name}`);
    const args = part.args.map((arg) => resolve(arg, at, replace));
    const numbers = new Map(at.numbers);
    for (const [i, name] of definition.parameters.entries())
      numbers.set(name, evaluate(part.args[i] as Expression, at));
    const bound = new Map(definition.parameters.map((name, i) => [name, args[i] as Expression]));
    return { args, body: definition.body, at: { ...at, numbers }, replace: bound };
  };

  const row = (name: string, tex: string, defined: string, body: () => Expression, value: () => number): Expression => {
    if (!rows.has(name)) rows.set(name, { name, tex, body: body(), value: value(), place: order.indexOf(defined) });
    return { kind: "symbol", name, tex };
  };

  const main = resolve(tree.body, scope, new Map());
  const sorted = [...rows.values()].sort((a, b) => a.place - b.place);
  return { main, value: evaluate(tree.body, scope), rows: sorted, given: givenOf(equation, inputs) };
}

function givenOf(
  equation: WithInputs,
  inputs: Readonly<Record<string, number | readonly number[]>>,
): ReadonlyMap<string, Given> {
  const given = new Map<string, Given>();
  for (const [key, spec] of Object.entries(equation.inputs)) {
    const name = nameOfSymbol(spec.symbol);
    const value = inputs[key];
    if (typeof value === "number") given.set(name, { value, spec });
    else for (const [i, item] of (value ?? []).entries()) given.set(`${name}#${i + 1}`, { value: item, spec });
  }
  return given;
}

function isLiteral(body: Expression): boolean {
  return body.kind === "number" || (body.kind === "negate" && body.of.kind === "number");
}

function nameOf(arg: Expression): string {
  if (arg.kind === "symbol") return arg.name;
  if (arg.kind === "number") return arg.text;
  throw new Error("the arguments of a function are symbols or numbers");
}

function texOf(arg: Expression): string {
  return arg.kind === "symbol" ? arg.tex : nameOf(arg);
}
