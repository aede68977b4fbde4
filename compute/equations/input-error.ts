/** A value the author of a document can correct. Anything else is our own fault: throw `Error`. */
export class InputError extends Error {
  override readonly name = "InputError";

  /**
   * @param field     name of the input, without file or place
   * @param received  what was given
   * @param expected  what would have been accepted, with unit and range
   * @param advice    what to do, a sentence, if there is more to say than "use an expected value"
   */
  constructor(
    readonly field: string,
    readonly received: unknown,
    readonly expected: string,
    readonly advice = "",
  ) {
    super(`${field}: expected ${expected}, received ${show(received)}${advice ? `. ${advice}` : ""}`);
  }
}

/** A value as an error message prints it: `nothing` for undefined, NaN and infinities by name. */
export function show(value: unknown): string {
  if (value === undefined) return "nothing";
  return typeof value === "number" ? String(value) : JSON.stringify(value);
}
