import type { Mistake } from "./mistake.ts";

/** One line for one mistake: `file:line:column /pointer: expected …, received …. What to do.` */
export function mistakeText(mistake: Mistake): string {
  const place = `${mistake.file}:${mistake.line}:${mistake.column} ${mistake.pointer || "/"}`;
  const advice = mistake.advice ? ` ${mistake.advice}` : "";
  return `${place}: expected ${mistake.expected}, received ${mistake.received}.${advice}`;
}
