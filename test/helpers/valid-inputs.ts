import fc from "fast-check";
import type { Equation, InputSpec } from "../../compute/equations/equation.ts";

export type AnyInputs = Record<string, number | readonly number[]>;

/** Any number an input accepts: the ends, the middle, and values spread evenly and by magnitude. */
function oneValue(spec: InputSpec): fc.Arbitrary<number> {
  if (spec.oneOf) return fc.constantFrom(...spec.oneOf);
  const { min, max } = spec;
  const span = max - min;
  const evenly = fc.integer({ min: 1, max: 2 ** 30 }).map((step) => min + (span * step) / 2 ** 30);
  const byMagnitude = fc.integer({ min: 0, max: 6000 }).map((step) => min + span * 10 ** (-step / 1000));
  const first = spec.aboveMin ? Math.floor(min) + 1 : Math.ceil(min);
  const wholes = first <= max ? fc.integer({ min: first, max: Math.floor(max) }) : evenly;
  const ends = spec.aboveMin ? fc.constant(max) : fc.constantFrom(min, max);
  return fc
    .oneof(evenly, byMagnitude, wholes, ends)
    .filter((value) => value <= max && (spec.aboveMin ? value > min : value >= min));
}

/** Valid inputs of an equation by the range of each input; rules across inputs are for the caller. */
export function validInputs(equation: Equation): fc.Arbitrary<AnyInputs> {
  const length = equation.id === "protection-octave" ? fc.constant(8) : fc.integer({ min: 1, max: 7 });
  return length.chain((size) =>
    fc.record(
      Object.fromEntries(
        Object.entries(equation.inputs).map(([name, spec]) => [
          name,
          spec.kind === "one" ? oneValue(spec) : fc.array(oneValue(spec), { minLength: size, maxLength: size }),
        ]),
      ),
    ),
  ) as fc.Arbitrary<AnyInputs>;
}
