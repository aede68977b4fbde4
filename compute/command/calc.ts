import { closest } from "fastest-levenshtein";
import { type Equation, type InputSpec, rangeText } from "../equations/equation.ts";
import { InputError } from "../equations/input-error.ts";
import { equationIds, equationOf } from "../equations/registry.ts";
import { plainLines } from "../equations/tex/plain-lines.ts";
import type { Outcome } from "./command.ts";

export const calcSummary = "works one equation out for given inputs";
export const calcHelp = `npm run -s calc -- [<id> name=value …] [--json]

Works one equation out, so that a single figure can be checked at a terminal. Lists are written 60,63,58.
Without arguments all equations are listed with their inputs; <id> --help shows the ranges of one.

  --json   one line: equation, version, value, unit, inputs
`;

type Values = Readonly<Record<string, number | readonly number[]>>;

const checkedWords: Readonly<Record<Equation["source"]["checked"], string>> = {
  read: "seen in the source",
  "read-secondary": "seen quoted in another source",
  derived: "worked out from its definition",
  memory: "not yet confirmed in the source document",
};

/**
 * Works one equation of the registry out from the words of a command line.
 *
 * @param args  id, inputs as name=value, --json, --help
 * @returns     exit status, text for standard output, text for the error stream; one line if it cannot be worked out
 */
export function calc(args: readonly string[]): Outcome {
  const flags = args.filter((arg) => arg.startsWith("--"));
  const [id, ...words] = args.filter((arg) => !arg.startsWith("--"));
  const strange = flags.find((flag) => flag !== "--json" && flag !== "--help");
  if (strange)
    return refused("calc", `there is no option ${strange}; did you mean ${closest(strange, ["--json", "--help"])}?`);
  if (id === undefined) return withoutId(flags);
  const equation = equationOf(id);
  if (!equation)
    return refused("calc", `there is no equation "${id}"; did you mean "${closest(id, [...equationIds])}"?`);
  if (flags.includes("--help")) return printed(describe(equation));
  try {
    const inputs = readInputs(equation, words);
    const value = equation.of(inputs as never);
    return printed(flags.includes("--json") ? jsonLine(equation, value, inputs) : plainText(equation, value, inputs));
  } catch (error) {
    if (error instanceof InputError) return refused(`calc ${id}`, error.message);
    throw error;
  }
}

function printed(out: string): Outcome {
  return { code: 0, out, err: "" };
}

function refused(where: string, problem: string): Outcome {
  return { code: 1, out: "", err: `${where}: ${problem}\n` };
}

function withoutId(flags: readonly string[]): Outcome {
  if (flags.includes("--help")) return printed(calcHelp);
  if (flags.includes("--json")) return refused("calc", "expected the id of an equation, received nothing");
  const width = Math.max(...equationIds.map((id) => id.length));
  const lines = [...equationIds].sort().map((id) => {
    const { title, inputs, value } = equationOf(id) as Equation;
    const unit = value.unit === "1" ? "" : ` [${value.unit}]`;
    return `${id.padEnd(width)}  ${title}${unit}\n${" ".repeat(width)}  ${Object.keys(inputs).join(" ")}\n`;
  });
  return printed(lines.join(""));
}

function describe({ id, title, inputs, value, source }: Equation): string {
  const lines = Object.entries(inputs).map(([name, spec]) => `  ${name}  ${acceptedText(spec)}\n`);
  return `${id}: ${title}, in ${value.unit}\n${lines.join("")}${sourceText(source)}\n`;
}

function acceptedText(spec: InputSpec): string {
  return spec.kind === "many" ? `a list, each ${rangeText(spec)}` : rangeText(spec);
}

/** Reads name=value words; @throws {InputError} for an unknown, repeated or missing name and for text in the place of a number */
function readInputs(equation: Equation, words: readonly string[]): Values {
  const values = new Map<string, number | readonly number[]>();
  const names = Object.keys(equation.inputs);
  for (const word of words) {
    const at = word.indexOf("=");
    const name = at < 0 ? word : word.slice(0, at);
    const spec = Object.hasOwn(equation.inputs, name) ? equation.inputs[name] : undefined;
    if (!spec)
      throw new InputError("input", name, `one of ${names.join(", ")}`, `Did you mean "${closest(name, names)}"?`);
    if (at < 0) throw new InputError(name, undefined, `${name}=value, ${acceptedText(spec)}`);
    if (values.has(name)) throw new InputError(name, word, "each input once");
    values.set(name, readValue(name, spec, word.slice(at + 1)));
  }
  const missing = Object.entries(equation.inputs).find(([name]) => !values.has(name));
  if (missing) throw new InputError(missing[0], undefined, acceptedText(missing[1]));
  return Object.fromEntries(values);
}

function readValue(name: string, spec: InputSpec, text: string): number | readonly number[] {
  const numbers = (spec.kind === "many" ? text.split(",") : [text]).map((part) =>
    /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(part) ? Number(part) : undefined,
  );
  if (!numbers.every((number) => number !== undefined)) throw new InputError(name, text, acceptedText(spec));
  return spec.kind === "many" ? numbers : (numbers[0] as number);
}

function jsonLine({ id, version, value: { unit } }: Equation, value: number, inputs: Values): string {
  return `${JSON.stringify({ equation: id, version, value, unit, inputs })}\n`;
}

function plainText(equation: Equation, value: number, inputs: Values): string {
  const lines = plainLines(equation, inputs);
  const symbol = (lines[0] ?? "").split(" = ")[0];
  const unit = equation.value.unit === "1" ? "" : ` ${equation.value.unit}`;
  const unrounded = String(Number(value.toPrecision(9))).replace("-", "−");
  return `${symbol} = ${unrounded}${unit}\n${lines.map((line) => `  ${line}\n`).join("")}${sourceText(equation.source)}\n`;
}

function sourceText({ document, edition, clause, checked }: Equation["source"]): string {
  return `${document}, ${edition}: ${clause} (${checkedWords[checked]})`;
}
