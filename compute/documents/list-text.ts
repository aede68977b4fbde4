/** Quoted words in a row: `"a", "b" or "c"`. */
export function listText(words: readonly string[], joint: "and" | "or"): string {
  const quoted = words.map((word) => JSON.stringify(word));
  const last = quoted.pop() ?? "nothing";
  return quoted.length === 0 ? last : `${quoted.join(", ")} ${joint} ${last}`;
}
