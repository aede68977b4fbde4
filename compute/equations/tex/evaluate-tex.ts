import { evaluate } from "./evaluate.ts";
import { readEquation } from "./read-equation.ts";
import { scopeOf, type WithInputs } from "./scope.ts";

/**
 * Works an equation out from its TeX alone. The proof that the printed equation is the one that ran.
 *
 * @param equation  any equation
 * @param inputs    its inputs, valid ones
 * @returns         value in the unit of the equation, unrounded
 */
export function evaluateTex(
  equation: WithInputs,
  inputs: Readonly<Record<string, number | readonly number[]>>,
): number {
  const { body, definitions } = readEquation(equation.tex);
  return evaluate(body, scopeOf(equation, definitions, inputs));
}
