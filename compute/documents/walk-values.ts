import { pointerTo } from "./pointer-to.ts";

/** A value inside a document, its pointer, and whether it is an entry of a list. */
export interface Walked {
  readonly pointer: string;
  readonly value: unknown;
  readonly listed: boolean;
}

/** Every value of a document, each before what it holds. */
export function* walkValues(value: unknown, pointer = "", listed = false): Generator<Walked> {
  yield { pointer, value, listed };
  if (Array.isArray(value)) {
    for (const [index, item] of value.entries()) yield* walkValues(item, pointerTo(pointer, index), true);
  } else if (typeof value === "object" && value !== null) {
    for (const [key, item] of Object.entries(value)) yield* walkValues(item, pointerTo(pointer, key), false);
  }
}
