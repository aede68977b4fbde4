import type { Equation } from "../../compute/equations/equation.ts";
import { type EquationId, equationOf } from "../../compute/equations/registry.ts";
import { evaluate } from "../../compute/equations/tex/evaluate.ts";
import type { Expression } from "../../compute/equations/tex/expression.ts";
import { readEquation } from "../../compute/equations/tex/read-equation.ts";
import { scopeOf } from "../../compute/equations/tex/scope.ts";

/** Value of a definition inside an equation's TeX, e.g. f_rO of air-absorption; with arguments for one such as b'(h). */
export function intermediate(
  id: EquationId,
  name: string,
  inputs: Readonly<Record<string, number>>,
  args?: readonly number[],
): number {
  const equation = equationOf(id) as Equation;
  const { definitions } = readEquation(equation.tex);
  const scope = scopeOf(equation, definitions, inputs);
  const numbers: readonly Expression[] = (args ?? []).map((value) => ({ kind: "constant", tex: "", value }));
  return evaluate(
    args ? { kind: "apply", name, tex: name, args: numbers } : { kind: "symbol", name, tex: name },
    scope,
  );
}
