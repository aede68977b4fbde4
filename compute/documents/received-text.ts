const LONGEST = 80;

/** A value as a mistake prints it: short things as they stand, lists and objects by what they are. */
export function receivedText(value: unknown): string {
  if (value === undefined) return "nothing";
  if (Array.isArray(value)) return value.length === 0 ? "an empty list" : `a list of ${value.length}`;
  if (typeof value === "object" && value !== null)
    return Object.keys(value).length === 0 ? "an empty object" : "an object";
  if (typeof value !== "string") return String(value);
  return JSON.stringify(value.length > LONGEST ? `${value.slice(0, LONGEST)}…` : value);
}
