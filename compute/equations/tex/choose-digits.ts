import { evaluate } from "./evaluate.ts";
import type { Expression } from "./expression.ts";
import {
  decimalsOf,
  exactText,
  fixedText,
  inputText,
  type NumberText,
  numberOf,
  significantText,
} from "./number-text.ts";
import { symbolsIn } from "./symbols-in.ts";
import type { Unfolded } from "./unfold.ts";

/** Decimals an input may get beyond its display decimals before all its digits are printed. */
const MORE_DECIMALS = 4;
/** Significant digits an intermediate value starts with. */
const FIRST_DIGITS = 4;

export interface Digits {
  readonly value: NumberText;
  readonly texts: ReadonlyMap<string, NumberText>;
}

/**
 * Finds how each number is printed: the fewest digits with which every printed line, worked out again from
 * what is printed, gives the value printed at its end.
 */
export function chooseDigits(
  unfolded: Unfolded,
  result: { readonly unit: string; readonly decimals?: number },
): Digits {
  const extra = new Map<string, number>();
  const rowOf = new Map(unfolded.rows.map((row) => [row.name, row]));
  const valueText = (value: number) => fixedText(value, decimalsOf(result.unit, result.decimals), result.unit);
  const textOf = (name: string): NumberText => {
    const more = extra.get(name) ?? 0;
    const row = rowOf.get(name);
    if (row) return rowText(row.value, more);
    const given = unfolded.given.get(name);
    if (!given) throw new Error(`no value for the symbol ${name}`);
    const base = decimalsOf(given.spec.unit, given.spec.decimals);
    return more > MORE_DECIMALS ? exactText(given.value) : inputText(given.value, base, more, given.spec.unit);
  };
  const lines: readonly { body: Expression; holds: (again: number) => boolean }[] = [
    { body: unfolded.main, holds: (again) => same(valueText(again), valueText(unfolded.value)) },
    ...unfolded.rows.map((row) => ({
      body: row.body,
      holds: (again: number) => same(rowText(again, extra.get(row.name) ?? 0), textOf(row.name)),
    })),
  ];
  for (;;) {
    const failing = lines.filter((line) => !line.holds(evaluateRounded(line.body, textOf)));
    if (failing.length === 0) break;
    const names = new Set(failing.flatMap((line) => [...symbolsIn(line.body)]));
    for (const name of names) extra.set(name, (extra.get(name) ?? 0) + 1);
    if (Math.max(...extra.values()) > 60) throw new Error("no digits make this line work out");
  }
  const names = [...unfolded.given.keys(), ...rowOf.keys()];
  return { value: valueText(unfolded.value), texts: new Map(names.map((name) => [name, textOf(name)])) };
}

function rowText(value: number, more: number): NumberText {
  return FIRST_DIGITS + more > 16 ? exactText(value) : significantText(value, FIRST_DIGITS + more);
}

function same(a: NumberText, b: NumberText): boolean {
  return a.digits === b.digits && a.exponent === b.exponent;
}

function evaluateRounded(body: Expression, textOf: (name: string) => NumberText): number {
  const numbers = new Map([...symbolsIn(body)].map((name) => [name, numberOf(textOf(name))]));
  return evaluate(body, { numbers, lists: new Map(), definitions: new Map(), indexes: new Map() });
}
