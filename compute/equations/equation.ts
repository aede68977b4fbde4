import { InputError } from "./input-error.ts";

/** Where an equation is printed. */
export interface Source {
  readonly document: string;
  readonly edition: string;
  readonly clause: string;
  /** How far the text was checked: seen in the source, seen quoted elsewhere, worked out here, or from memory. */
  readonly checked: "read" | "read-secondary" | "derived" | "memory";
}

interface InputBase {
  /** The symbol as it stands in the TeX, e.g. `h_s`. */
  readonly symbol: string;
  readonly unit: string;
  readonly min: number;
  readonly max: number;
  /** The range does not hold its lower end. */
  readonly aboveMin?: boolean;
  /** Decimals this input is shown with. */
  readonly decimals?: number;
  /** Whole list of accepted values, e.g. nominal octave bands. */
  readonly oneOf?: readonly number[];
}
export interface OneInput extends InputBase {
  readonly kind: "one";
}
export interface ManyInput extends InputBase {
  readonly kind: "many";
  readonly sameLengthAs?: string;
}
export type InputSpec = OneInput | ManyInput;
export type InputSpecs = Readonly<Record<string, InputSpec>>;
export type Inputs<S extends InputSpecs> = {
  readonly [K in keyof S]: S[K] extends ManyInput ? readonly number[] : number;
};

export interface EquationSpec<S extends InputSpecs> {
  readonly id: string;
  /** What it works out, in a few words, for lists in commands. */
  readonly title: string;
  readonly version: number;
  /** One relation, or an `aligned` block: the relation first, then the definitions it uses. */
  readonly tex: string;
  readonly value: { readonly symbol: string; readonly unit: string; readonly decimals?: number };
  readonly inputs: S;
  readonly source: Source;
  /** Rules across inputs: returns what is wrong, or nothing. */
  readonly refuse?: (inputs: Inputs<S>) => InputError | undefined;
  readonly work: (inputs: Inputs<S>) => number;
}

export interface Equation<S extends InputSpecs = InputSpecs> extends EquationSpec<S> {
  /**
   * The value of the equation, unrounded, after the inputs have been held against their ranges.
   * @throws {InputError} naming the first input that is missing, not finite or out of range
   */
  readonly of: (inputs: Inputs<S>) => number;
}

/** Makes an equation object: TeX, units, ranges, source and code in one place. */
export function equation<const S extends InputSpecs>(spec: EquationSpec<S>): Equation<S> {
  const specs: readonly (readonly [string, InputSpec])[] = Object.entries(spec.inputs);
  return {
    ...spec,
    of: (inputs) => {
      checkInputs(specs, inputs as Readonly<Record<string, unknown>>);
      const refused = spec.refuse?.(inputs);
      if (refused) throw refused;
      const value = spec.work(inputs);
      if (!Number.isFinite(value)) throw new Error(`${spec.id}: the result is not a finite number (${value})`);
      return value;
    },
  };
}

function checkInputs(
  specs: readonly (readonly [string, InputSpec])[],
  inputs: Readonly<Record<string, unknown>>,
): void {
  for (const [name, input] of specs) {
    const given = inputs[name];
    if (input.kind === "many") checkList(name, input, given, inputs);
    else checkNumber(name, input, given);
  }
}

function checkList(name: string, input: ManyInput, given: unknown, inputs: Readonly<Record<string, unknown>>): void {
  if (!Array.isArray(given) || given.length === 0) throw new InputError(name, given, "a list of at least one number");
  const wrong = given.findIndex((value) => !isAccepted(input, value));
  if (wrong >= 0) checkNumber(`${name}[${wrong}]`, input, given[wrong]);
  const other = input.sameLengthAs === undefined ? undefined : inputs[input.sameLengthAs];
  if (Array.isArray(other) && other.length !== given.length) {
    throw new InputError(name, given.length, `as many values as ${input.sameLengthAs} has (${other.length})`);
  }
}

function checkNumber(name: string, input: InputSpec, given: unknown): void {
  if (!isAccepted(input, given)) throw new InputError(name, given, rangeText(input));
}

function isAccepted(input: InputSpec, given: unknown): boolean {
  if (typeof given !== "number" || !Number.isFinite(given) || given > input.max) return false;
  const highEnough = input.aboveMin ? given > input.min : given >= input.min;
  return highEnough && (!input.oneOf || input.oneOf.includes(given));
}

/** The accepted range in words, e.g. `a number from 0 to 140 dB`. */
export function rangeText(input: InputSpec): string {
  const unit = input.unit === "1" ? "" : ` ${input.unit}`;
  if (input.oneOf) return `one of ${input.oneOf.join(", ")}${unit}`;
  return input.aboveMin
    ? `a number above ${input.min} and up to ${input.max}${unit}`
    : `a number from ${input.min} to ${input.max}${unit}`;
}
