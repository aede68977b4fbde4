import type { Expression, FunctionName, ProductSign } from "./expression.ts";
import type { NumberText } from "./number-text.ts";

/** How the pieces of an expression are written: as TeX, or as plain text for a terminal. */
export interface Notation {
  readonly constant: (tex: string) => string;
  readonly power: (base: string, exponent: Printed) => string;
  readonly tenTo: (digits: string, exponent: number) => string;
  readonly divide: (top: Printed, bottom: Printed, line: "bar" | "slash") => string;
  readonly root: (of: string) => string;
  readonly group: (of: string) => string;
  readonly call: (name: FunctionName, args: readonly Printed[]) => string;
  readonly product: (left: string, sign: ProductSign, right: string) => string;
  readonly minus: string;
  readonly dots: string;
}

/** A part in two forms: as it is, and safe to stand as the operand of a division, a power or a function. */
export interface Printed {
  readonly bare: string;
  readonly operand: string;
  /** The bare form is a single number, fraction, root, or the least or greatest of several. */
  readonly simple: boolean;
}

export interface PrintSettings {
  readonly notation: Notation;
  readonly texts: ReadonlyMap<string, NumberText>;
  /** Places of the terms to print of a sum: all of them, or the first and the largest. */
  readonly shown: (terms: readonly Expression[]) => readonly number[];
}

/** Where a part stands, from loose to tight: what needs brackets there. */
const whole = 0;
const later = 1;
const subtracted = 2;
const factor = 3;
const raised = 4;

/** Prints an unfolded expression with numbers in the place of symbols. */
export function printExpression(expression: Expression, settings: PrintSettings): string {
  return print(expression, whole, settings);
}

function print(part: Expression, place: number, settings: PrintSettings): string {
  const { notation } = settings;
  const bracketed = (text: string, from: number) => (place >= from ? notation.group(text) : text);
  const at = (inner: Expression, innerPlace: number) => print(inner, innerPlace, settings);
  switch (part.kind) {
    case "number":
      return part.text;
    case "constant":
      return notation.constant(part.tex);
    case "symbol":
      return printNumber(part.name, place, settings);
    case "negate":
      return bracketed(`${notation.minus}${at(part.of, subtracted)}`, later);
    case "add": {
      const right = at(part.right, part.sign === "-" ? subtracted : later);
      return bracketed(`${at(part.left, whole)} ${part.sign === "-" ? notation.minus : "+"} ${right}`, subtracted);
    }
    case "multiply":
      return bracketed(notation.product(at(part.left, factor), part.sign, at(part.right, factor)), raised);
    case "divide":
      return bracketed(notation.divide(both(part.top, settings), both(part.bottom, settings), part.line), raised);
    case "power":
      return bracketed(notation.power(at(part.base, raised), both(part.exponent, settings)), raised);
    case "root":
      return notation.root(at(part.of, whole));
    case "group":
      return notation.group(at(part.of, whole));
    case "call":
      return bracketed(
        notation.call(
          part.name,
          part.args.map((arg) => both(arg, settings)),
        ),
        raised,
      );
    case "terms":
      return printTerms(part.terms, place, settings);
    default:
      throw new Error(`an unfolded expression holds no ${part.kind}`);
  }
}

function printNumber(name: string, place: number, { notation, texts }: PrintSettings): string {
  const text = texts.get(name);
  if (!text) throw new Error(`no digits for the symbol ${name}`);
  const negative = text.digits.startsWith("-");
  const digits = negative ? notation.minus + text.digits.slice(1) : text.digits;
  const number = text.exponent === undefined ? digits : notation.tenTo(digits, text.exponent);
  return (negative && place >= later) || (text.exponent !== undefined && place >= raised)
    ? notation.group(number)
    : number;
}

function printTerms(terms: readonly Expression[], place: number, settings: PrintSettings): string {
  const only = terms[0];
  if (terms.length === 1 && only) return print(only, place, settings);
  const pieces: string[] = [];
  let next = 0;
  for (const index of settings.shown(terms)) {
    if (index > next) pieces.push(settings.notation.dots);
    pieces.push(print(terms[index] as Expression, pieces.length === 0 ? whole : later, settings));
    next = index + 1;
  }
  if (next < terms.length) pieces.push(settings.notation.dots);
  return place >= subtracted ? settings.notation.group(pieces.join(" + ")) : pieces.join(" + ");
}

function both(part: Expression, settings: PrintSettings): Printed {
  const bare = print(part, whole, settings);
  const operand = print(part, raised, settings);
  const single = part.kind === "number" || part.kind === "symbol" || part.kind === "root";
  const barred = part.kind === "divide" && part.line === "bar";
  const extreme = part.kind === "call" && (part.name === "min" || part.name === "max");
  return { bare, operand, simple: (single && bare === operand) || barred || extreme };
}
