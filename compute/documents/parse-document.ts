import { type Node, type ParseError, parseTree, printParseErrorCode } from "jsonc-parser";
import type { Mistake } from "./mistake.ts";
import { pointerTo } from "./pointer-to.ts";
import { positionAt } from "./position-at.ts";

export type Parsed =
  | { readonly kind: "parsed"; readonly value: unknown }
  | { readonly kind: "broken"; readonly mistakes: readonly Mistake[] };

/** What the parser missed or met, by its own names. */
const WORDS: Readonly<Record<string, readonly [expected: string, advice: string]>> = {
  InvalidSymbol: ["a JSON value", "Write text in double quotes; true, false and numbers without."],
  InvalidNumberFormat: ["a number such as 0.5", "Write a digit before the point and no leading zeros."],
  PropertyNameExpected: [
    "the name of a field in double quotes",
    "Take the comma before a closing brace away, or add the field.",
  ],
  ValueExpected: ["a value", "Take the comma before a closing bracket away, or add the value."],
  ColonExpected: ["a colon after the name of the field", ""],
  CommaExpected: ["a comma", "Put a comma between two fields or entries."],
  CloseBraceExpected: ["a closing brace", ""],
  CloseBracketExpected: ["a closing bracket", ""],
  EndOfFileExpected: ["the end of the file", "One file holds one document."],
  InvalidCommentToken: ["JSON without comments", "Take the comment away; a source may have a note."],
  UnexpectedEndOfComment: ["JSON without comments", "Take the comment away; a source may have a note."],
  UnexpectedEndOfString: ["a closing double quote", ""],
  UnexpectedEndOfNumber: ["a number such as 0.5", ""],
  InvalidUnicode: ["a sign as \\u and four hexadecimal digits", ""],
  InvalidEscapeCharacter: ["an escape of JSON", "Write a backslash as \\\\."],
  InvalidCharacter: ["text without control characters", "Write a new line as \\n and a tab as \\t."],
};

/** The value of a JSON document, or its syntax errors and its doubled fields. */
export function parseDocument(file: string, text: string): Parsed {
  const errors: ParseError[] = [];
  const root = parseTree(text, errors, { disallowComments: true, allowTrailingComma: false });
  const [first] = errors;
  // Later errors follow from the first as a rule: one mistake, one line.
  if (first) return { kind: "broken", mistakes: [syntaxMistake(file, text, first)] };
  if (!root) return { kind: "broken", mistakes: [syntaxMistake(file, text, { error: 4, offset: 0, length: 0 })] };
  const doubled = doubledFields(file, text, root, "");
  return doubled.length > 0 ? { kind: "broken", mistakes: doubled } : { kind: "parsed", value: JSON.parse(text) };
}

function syntaxMistake(file: string, text: string, error: ParseError): Mistake {
  const [expected, advice] = WORDS[printParseErrorCode(error.error)] ?? ["JSON", ""];
  const met = text.slice(error.offset, error.offset + Math.max(error.length, 1)).slice(0, 40);
  const received =
    met.trim() === ""
      ? error.offset >= text.trimEnd().length
        ? "the end of the file"
        : "white space"
      : JSON.stringify(met);
  return { file, ...positionAt(text, error.offset), pointer: "", expected, received, advice };
}

function doubledFields(file: string, text: string, node: Node, pointer: string): Mistake[] {
  if (node.type === "array")
    return (node.children ?? []).flatMap((child, index) => doubledFields(file, text, child, pointerTo(pointer, index)));
  if (node.type !== "object") return [];
  const seen = new Map<string, number>();
  return (node.children ?? []).flatMap((property) => {
    const [name, value] = property.children ?? [];
    if (!name || !value) return [];
    const here = pointerTo(pointer, name.value);
    const before = seen.get(name.value);
    seen.set(name.value, before ?? name.offset);
    const below = doubledFields(file, text, value, here);
    if (before === undefined) return below;
    const received = `${JSON.stringify(name.value)} again (first on line ${positionAt(text, before).line})`;
    const advice = "Take one of the two away.";
    return [
      { file, ...positionAt(text, name.offset), pointer: here, expected: "each field once", received, advice },
      ...below,
    ];
  });
}
