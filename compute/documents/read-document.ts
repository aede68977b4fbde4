import { readFileSync } from "node:fs";
import type { Mistake } from "./mistake.ts";

export type Read =
  | { readonly kind: "text"; readonly text: string }
  | { readonly kind: "unreadable"; readonly mistake: Mistake };

/** The text of a file, which has to be UTF-8 without a byte order mark. */
export function readDocument(file: string): Read {
  try {
    const text = new TextDecoder("utf-8", { fatal: true, ignoreBOM: true }).decode(readFileSync(file));
    return text.startsWith("\uFEFF") ? unreadable(file, "a byte order mark") : { kind: "text", text };
  } catch (error) {
    if (error instanceof TypeError) return unreadable(file, "other bytes");
    throw error;
  }
}

function unreadable(file: string, received: string): Read {
  const advice = "Save the file as UTF-8 without a byte order mark.";
  return {
    kind: "unreadable",
    mistake: { file, line: 1, column: 1, pointer: "", expected: "UTF-8 text", received, advice },
  };
}
