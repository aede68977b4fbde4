import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type Equation, type InputSpec, rangeText } from "../../compute/equations/equation.ts";
import { InputError } from "../../compute/equations/input-error.ts";
import { equationIds, equationOf, equations } from "../../compute/equations/registry.ts";
import { accepts } from "../helpers/accepts.ts";
import { type AnyInputs, validInputs } from "../helpers/valid-inputs.ts";

const outside = (spec: InputSpec): readonly unknown[] => [
  spec.aboveMin ? spec.min : spec.min - 1e-6 * Math.max(1, Math.abs(spec.min)),
  spec.max + 1e-6 * Math.max(1, Math.abs(spec.max)),
  Number.NaN,
  Number.POSITIVE_INFINITY,
  "60",
  null,
  undefined,
];

function valid(equation: Equation): AnyInputs {
  const [inputs] = fc.sample(
    validInputs(equation).filter((candidate) => accepts(equation, candidate)),
    { seed: 9613, numRuns: 1 },
  );
  return inputs as AnyInputs;
}

function refusal(equation: Equation, inputs: unknown): InputError {
  try {
    equation.of(inputs as never);
  } catch (error) {
    if (error instanceof InputError) return error;
    throw error;
  }
  throw new Error(`${equation.id} accepted ${JSON.stringify(inputs)}`);
}

describe.each(equationIds)("%s refuses", (id) => {
  const equation = equationOf(id) as Equation;
  const inputs = valid(equation);

  test.each(Object.entries(equation.inputs))("%s out of its range, naming field and range", (name, spec) => {
    for (const wrong of outside(spec)) {
      const error = refusal(equation, { ...inputs, [name]: spec.kind === "one" ? wrong : [wrong] });
      expect(error.field).toBe(spec.kind === "one" ? name : `${name}[0]`);
      expect(error.expected).toBe(rangeText(spec));
    }
    if (spec.oneOf) {
      const between = ((spec.oneOf[0] as number) + (spec.oneOf[1] as number)) / 2;
      expect(refusal(equation, { ...inputs, [name]: between }).field).toBe(name);
    }
    if (spec.kind === "many") {
      expect(refusal(equation, { ...inputs, [name]: [] }).expected).toBe("a list of at least one number");
      expect(refusal(equation, { ...inputs, [name]: undefined }).expected).toBe("a list of at least one number");
    }
  });
});

const paired = equationIds.flatMap((id) =>
  Object.entries((equationOf(id) as Equation).inputs).flatMap(([name, spec]) =>
    spec.kind === "many" && spec.sameLengthAs ? [[id, name, spec.sameLengthAs] as const] : [],
  ),
);

test.each(paired)("%s refuses %s longer than %s", (id, name, other) => {
  const equation = equationOf(id) as Equation;
  const inputs = valid(equation);
  const list = inputs[name] as readonly number[];
  const error = refusal(equation, { ...inputs, [name]: [...list, list[0]] });
  expect(error.expected).toBe(`as many values as ${other} has (${list.length})`);
});

describe("rules across inputs, each with its whole message", () => {
  const refuse = (id: keyof typeof equations, inputs: AnyInputs) => refusal(equationOf(id) as Equation, inputs).message;

  test("a part cannot be as loud as the total", () => {
    expect(refuse("subtract-level", { totalDb: 60, partDb: 60 })).toBe(
      "totalDb: expected a level above partDb (60 dB), received 60. A part cannot be louder than the total",
    );
  });

  test("a span is no longer than the period, though spans may overlap", () => {
    expect(refuse("average-level", { levelsDb: [60, 60], durationsH: [1, 3], periodH: 2 })).toBe(
      "durationsH[1]: expected a span no longer than periodH (2 h), received 3",
    );
    // two machines for the whole period: twice the energy of one
    const both = { levelsDb: [60, 60], durationsH: [2, 2], periodH: 2 };
    expect(equations["average-level"].of(both)).toBeCloseTo(60 + 10 * Math.log10(2), 10);
  });

  test("hours inside a period are no more than the period", () => {
    expect(refuse("period-level", { levelDb: 60, onTimePct: 100, windowH: 9, periodH: 8 })).toBe(
      "windowH: expected no more hours than periodH has (8 h), received 9. Count only the hours inside the period",
    );
  });

  test("a day has 24 hours and a week seven days", () => {
    expect(refuse("daily-exposure", { levelsDb: [80, 80], durationsH: [20, 5] })).toBe(
      "durationsH: expected tasks of no more than 24 h together, received 25",
    );
    expect(refuse("weekly-exposure", { dailyDb: [80, 80, 80, 80, 80, 80, 80, 80] })).toBe(
      "dailyDb: expected the exposures of no more than 7 days, received 8",
    );
  });

  test("a path over an edge is no shorter than the straight one", () => {
    const path = { sourceToEdgeM: 10, betweenEdgesM: 0, edgeToReceptorM: 10, alongEdgeM: 0, sightBlocked: 1 };
    expect(refuse("path-difference", { ...path, distanceM: 21 })).toBe(
      "distanceM: expected no more than the path over the edge (20 m), received 21. The straight distance is the shortest",
    );
  });

  test("protectors are judged in eight bands, walls are counted", () => {
    expect(refuse("protection-octave", { levelsDb: [80, 80], assumedProtectionDb: [10, 10] })).toBe(
      "levelsDb: expected eight octave bands, 63 to 8000 Hz, received 2. If 63 Hz is missing, this method cannot be used",
    );
    expect(refuse("zone-level", { powerDba: 100, distanceM: 5, walls: 1.5 })).toBe(
      "walls: expected a whole number of walls, received 1.5",
    );
  });
});
