import { readFileSync, writeFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Equation } from "../../compute/equations/equation.ts";
import { equationIds, equationOf } from "../../compute/equations/registry.ts";
import { accepts } from "../helpers/accepts.ts";
import { type AnyInputs, validInputs } from "../helpers/valid-inputs.ts";

/**
 * A sealed revision names an equation by id and version. If its TeX or its results change while its version does
 * not, the seal lies. With UPDATE_PINNED=1 this file pins equations and versions it has not met; it never
 * rewrites what a version has once given.
 */
interface Pinned {
  readonly id: string;
  readonly version: number;
  readonly tex: string;
  readonly samples: readonly { readonly inputs: AnyInputs; readonly value: number }[];
}

const SAMPLES = 20;
const file = fileURLToPath(new URL("./pinned-equations.json", import.meta.url));
const read = () => JSON.parse(readFileSync(file, "utf8")) as readonly Pinned[];

function rounded(value: number | readonly number[]): number | readonly number[] {
  return typeof value === "number" ? Number(value.toPrecision(5)) : value.map((item) => Number(item.toPrecision(5)));
}

function pin(equation: Equation): Pinned {
  const arbitrary = validInputs(equation)
    .map((inputs) => Object.fromEntries(Object.entries(inputs).map(([name, value]) => [name, rounded(value)])))
    .filter((inputs) => accepts(equation, inputs));
  const drawn = fc.sample(arbitrary, { seed: 1996, numRuns: 10 * SAMPLES });
  const distinct = [...new Map(drawn.map((inputs) => [JSON.stringify(inputs), inputs])).values()];
  const samples = [...distinct, ...drawn].slice(0, SAMPLES);
  return {
    id: equation.id,
    version: equation.version,
    tex: equation.tex,
    samples: samples.map((inputs) => ({ inputs, value: equation.of(inputs as never) })),
  };
}

if (process.env.UPDATE_PINNED) {
  const known = new Map(read().map((entry) => [`${entry.id} ${entry.version}`, entry]));
  const all = equationIds.map((id) => equationOf(id) as Equation);
  const entries = all.map((equation) => known.get(`${equation.id} ${equation.version}`) ?? pin(equation));
  writeFileSync(file, JSON.stringify(entries));
}
const pinned = read();

describe("pinned equations", () => {
  test("are all equations there are", () => {
    expect(pinned.map((entry) => entry.id).sort()).toEqual([...equationIds].sort());
  });

  test.each(pinned)("$id stays what version $version was", ({ id, version, tex, samples }) => {
    const equation = equationOf(id) as Equation;
    const advice = `${id}: give it a new version and run with UPDATE_PINNED=1`;
    expect({ version: equation.version, tex: equation.tex }, advice).toEqual({ version, tex });
    expect(samples.length).toBe(SAMPLES);
    for (const { inputs, value } of samples) {
      // Double precision of other machines' logarithms and powers.
      const difference = Math.abs(equation.of(inputs as never) - value);
      expect(difference, `${advice}: ${JSON.stringify(inputs)}`).toBeLessThanOrEqual(
        Math.max(1e-12 * Math.abs(value), 1e-9),
      );
    }
  });
});
