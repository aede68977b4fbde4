import type { InputSpec } from "../equation.ts";
import type { EquationTree } from "./read-equation.ts";
import { readSymbol } from "./read-symbol.ts";

/** What the symbols of an equation stand for. */
export interface Scope {
  readonly numbers: ReadonlyMap<string, number>;
  readonly lists: ReadonlyMap<string, readonly number[]>;
  readonly definitions: EquationTree["definitions"];
  /** The present value of each running index. */
  readonly indexes: ReadonlyMap<string, number>;
}

/** What is needed of an equation to read its inputs; any equation of the registry fits. */
export interface WithInputs {
  readonly tex: string;
  readonly inputs: Readonly<Record<string, InputSpec>>;
}

const names = new Map<string, string>();

/** The name under which the reader of equations knows a symbol. */
export function nameOfSymbol(tex: string): string {
  const known = names.get(tex);
  if (known !== undefined) return known;
  const { name } = readSymbol(tex);
  names.set(tex, name);
  return name;
}

/** Binds input values to the symbols of the equation. */
export function scopeOf(
  equation: WithInputs,
  definitions: EquationTree["definitions"],
  inputs: Readonly<Record<string, number | readonly number[]>>,
): Scope {
  const numbers = new Map<string, number>();
  const lists = new Map<string, readonly number[]>();
  for (const [key, spec] of Object.entries(equation.inputs)) {
    const value = inputs[key];
    if (typeof value === "number") numbers.set(nameOfSymbol(spec.symbol), value);
    else if (value) lists.set(nameOfSymbol(spec.symbol), value);
  }
  return { numbers, lists, definitions, indexes: new Map() };
}
