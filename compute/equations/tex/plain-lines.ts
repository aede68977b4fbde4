import { chooseDigits } from "./choose-digits.ts";
import type { Printable } from "./number-line.ts";
import type { NumberText } from "./number-text.ts";
import { plainNotation } from "./plain-notation.ts";
import { plainSymbol } from "./plain-symbol.ts";
import { printExpression } from "./print-expression.ts";
import { readLeft } from "./read-left.ts";
import { shownTerms } from "./shown-terms.ts";
import { unfold } from "./unfold.ts";

/** The equation with its numbers as lines of plain text, the relation first, then the definitions it uses. */
export function plainLines(
  equation: Printable,
  inputs: Readonly<Record<string, number | readonly number[]>>,
): readonly string[] {
  const unfolded = unfold(equation, inputs);
  const { value, texts } = chooseDigits(unfolded, equation.value);
  const settings = { notation: plainNotation, texts, shown: shownTerms(unfolded) };
  const unit = equation.value.unit === "1" ? "" : ` ${equation.value.unit}`;
  const line = (left: string, body: typeof unfolded.main, end: string) => {
    const printed = printExpression(body, settings);
    return printed === end || end.startsWith(`${printed} `) ? `${left} = ${end}` : `${left} = ${printed} = ${end}`;
  };
  return [
    line(readLeft(equation.value.symbol), unfolded.main, `${textPlain(value)}${unit}`),
    ...unfolded.rows.map((row) => line(plainSymbol(row.name), row.body, textPlain(texts.get(row.name) as NumberText))),
  ];
}

function textPlain({ digits, exponent }: NumberText): string {
  const text = digits.replace("-", plainNotation.minus);
  return exponent === undefined ? text : plainNotation.tenTo(text, exponent);
}
