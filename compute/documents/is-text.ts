import type { Text } from "./types/common.gen.ts";

/** Whether a value of a valid document is words by language: no other shape has language codes alone for its fields. */
export function isText(value: unknown): value is Text {
  if (typeof value !== "object" || value === null || Array.isArray(value)) return false;
  const entries = Object.entries(value);
  return (
    entries.length > 0 &&
    entries.every(([key, words]) => /^[a-z]{2,3}(-[A-Z]{2})?$/.test(key) && typeof words === "string")
  );
}
