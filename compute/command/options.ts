import { parseArgs } from "node:util";
import { nearest } from "../documents/nearest.ts";

type Kinds = Readonly<Record<string, "string" | "boolean">>;

export type Options = { readonly [name: string]: string | boolean | undefined };

/** A command line that was read, or what is wrong with it in words. */
export type Parsed =
  | { readonly kind: "read"; readonly options: Options; readonly rest: readonly string[] }
  | { readonly kind: "wrong"; readonly problem: string };

/**
 * Reads a command line; a mistyped option is refused with the nearest right one.
 *
 * @param args   words after the command
 * @param kinds  the options it takes
 */
export function readOptions(args: readonly string[], kinds: Kinds): Parsed {
  for (const word of args) {
    const name = word.startsWith("--") ? (word.slice(2).split("=")[0] ?? "") : undefined;
    if (name === undefined || name in kinds) continue;
    const near = nearest(name, Object.keys(kinds));
    return { kind: "wrong", problem: `there is no option --${name}${near ? `; did you mean --${near}?` : ""}` };
  }
  try {
    const options = Object.fromEntries(Object.entries(kinds).map(([name, type]) => [name, { type }]));
    const { values, positionals } = parseArgs({ args: [...args], options, allowPositionals: true, strict: true });
    return { kind: "read", options: values as Options, rest: positionals };
  } catch (error) {
    return { kind: "wrong", problem: (error as Error).message.split("\n")[0] ?? "the options cannot be read" };
  }
}
