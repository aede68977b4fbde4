import type { Equation, InputSpecs, Inputs } from "./equation.ts";

/** One equation as it was worked out: enough to print it again with its numbers. */
export interface Step {
  /** Where in the chain, from the outside in: `activity:pressing-piles`, `item:piler`, `band:500` … */
  readonly at: readonly string[];
  /** Which part of the level this is, as a key of the wording's `terms`. */
  readonly term: string;
  readonly equation: string;
  readonly version: number;
  readonly inputs: Readonly<Record<string, number | readonly number[]>>;
  readonly value: number;
  readonly unit: string;
}

/** What works equations out: silently for the many, with a record for the one that is to be explained. */
export interface Working {
  /** The value of `equation` for `inputs`, noted under `term` if this working keeps a record. */
  readonly work: <S extends InputSpecs>(equation: Equation<S>, inputs: Inputs<S>, term: string) => number;
  /** The same working, one place further in. */
  readonly at: (...place: readonly string[]) => Working;
}

/** Works equations out and keeps nothing. */
export const silently: Working = {
  work: (equation, inputs) => equation.of(inputs),
  at: () => silently,
};

/** Works equations out and appends each to `steps`, in the order they were worked. */
export function recording(steps: Step[], at: readonly string[] = []): Working {
  return {
    work: (equation, inputs, term) => {
      const value = equation.of(inputs);
      steps.push({
        at,
        term,
        equation: equation.id,
        version: equation.version,
        inputs: inputs as Step["inputs"],
        value,
        unit: equation.value.unit,
      });
      return value;
    },
    at: (...place) => recording(steps, [...at, ...place]),
  };
}

/** Works equations out and adds the id of each to `used`. */
export function noting(used: Set<string>): Working {
  const working: Working = {
    work: (equation, inputs) => {
      used.add(equation.id);
      return equation.of(inputs);
    },
    at: () => working,
  };
  return working;
}

/** Whether a step belongs to a chain: no place of it names another activity, item, path, band or day than the subject's. */
export function belongsTo(step: Step, subject: Readonly<Record<string, string>>): boolean {
  return step.at.every((place) => {
    const [kind = "", name] = place.split(":");
    return subject[kind] === undefined || subject[kind] === name;
  });
}
