import type { Mistake } from "./mistake.ts";
import { mistakeText } from "./mistake-text.ts";

/** Mistakes by file, line and column; the same one twice is kept once. */
export function sortMistakes(mistakes: readonly Mistake[]): readonly Mistake[] {
  const once = new Map(mistakes.map((mistake) => [mistakeText(mistake), mistake]));
  return [...once.values()].sort(
    (a, b) =>
      compare(a.file, b.file) ||
      a.line - b.line ||
      a.column - b.column ||
      compare(a.pointer, b.pointer) ||
      compare(mistakeText(a), mistakeText(b)),
  );
}

function compare(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}
