import type { Equation } from "../equation.ts";
import { chooseDigits } from "./choose-digits.ts";
import type { Expression } from "./expression.ts";
import type { NumberText } from "./number-text.ts";
import { printExpression } from "./print-expression.ts";
import type { WithInputs } from "./scope.ts";
import { shownTerms } from "./shown-terms.ts";
import { texNotation } from "./tex-notation.ts";
import { unfold } from "./unfold.ts";
import { unitTex } from "./unit-tex.ts";

/** An equation of the registry, or one kept in a sealed revision. */
export type Printable = WithInputs & Pick<Equation, "value">;

export interface LineOptions {
  /** Print every term of long sums instead of the first and the largest. */
  readonly everyTerm?: boolean;
}

/**
 * The equation with its numbers as TeX: symbol = numbers = value and unit. Definitions that this case uses follow
 * as rows of an `aligned` block. Every line works out again to the value printed at its end.
 *
 * @param equation  any equation
 * @param inputs    its inputs, valid ones
 */
export function numberLine(
  equation: Printable,
  inputs: Readonly<Record<string, number | readonly number[]>>,
  options: LineOptions = {},
): string {
  const unfolded = unfold(equation, inputs);
  const { value, texts } = chooseDigits(unfolded, equation.value);
  const all = (terms: readonly Expression[]) => [...terms.keys()];
  const settings = { notation: texNotation, texts, shown: options.everyTerm ? all : shownTerms(unfolded) };
  const unit = unitTex(equation.value.unit);
  const main = relation(printExpression(unfolded.main, settings), `${textTex(value)}${unit && String.raw`\,${unit}`}`);
  if (unfolded.rows.length === 0) return `${equation.value.symbol} ${main}`;
  const rows = unfolded.rows.map((row) => {
    const printed = printExpression(row.body, settings);
    return `${row.tex} &${relation(printed, textTex(texts.get(row.name) as NumberText))}`;
  });
  const lines = [`${equation.value.symbol} &${main}`, ...rows];
  return `\\begin{aligned}\n${lines.join(" \\\\\n")}\n\\end{aligned}`;
}

/** Says a value once where the right side is nothing but that value. */
function relation(printed: string, value: string): string {
  return value === printed || value.startsWith(`${printed}\\,`) ? `= ${value}` : `= ${printed} = ${value}`;
}

function textTex({ digits, exponent }: NumberText): string {
  return exponent === undefined ? digits : texNotation.tenTo(digits, exponent);
}
