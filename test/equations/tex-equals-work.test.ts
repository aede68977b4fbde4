import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Equation } from "../../compute/equations/equation.ts";
import { equationIds, equationOf } from "../../compute/equations/registry.ts";
import { evaluateTex } from "../../compute/equations/tex/evaluate-tex.ts";
import { accepts } from "../helpers/accepts.ts";
import { type AnyInputs, validInputs } from "../helpers/valid-inputs.ts";
import { branchEdges } from "./branch-edges.ts";

const SEED = 20251127;

/** Rounding of double precision only: the typeset equation is the one that runs. */
function allowed(value: number): number {
  return Math.max(1e-12 * Math.abs(value), 1e-9);
}

function expectEqual(equation: Equation, inputs: AnyInputs): void {
  const worked = equation.of(inputs as never);
  const read = evaluateTex(equation, inputs);
  const message = `${equation.id} ${JSON.stringify(inputs)}: TeX gives ${read}, the function ${worked}`;
  expect(Math.abs(read - worked), message).toBeLessThanOrEqual(allowed(worked));
}

describe.each(equationIds)("%s: the TeX works out what the function works out", (id) => {
  const equation = equationOf(id) as Equation;

  test("on random inputs over the whole range", () => {
    fc.assert(
      fc.property(validInputs(equation), (inputs) => {
        fc.pre(accepts(equation, inputs));
        expectEqual(equation, inputs);
      }),
      { seed: SEED, numRuns: 300 },
    );
  });

  test("on every branch edge", () => {
    const branches = /\\begin\{cases\}|\\min|\\max|\\lfloor/.test(equation.tex);
    const edges = branchEdges[id] ?? [];
    expect(edges.length > 0, `${id} changes its form: list the edges in branch-edges.ts`).toBe(branches);
    for (const inputs of edges) expectEqual(equation, inputs);
  });
});
