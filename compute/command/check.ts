import { loadContent } from "../documents/load-content.ts";
import { mistakeText } from "../documents/mistake-text.ts";

/** Validates the content folder: one line for each mistake and their number, or one line that there are none. */
export function check(options: { readonly content: string }): { code: number; out: string; err: string } {
  const loaded = loadContent(options.content);
  if (loaded.kind === "valid")
    return { code: 0, out: `${counted(loaded.content.texts.size, "document")}, no mistakes\n`, err: "" };
  const lines = loaded.mistakes.map((mistake) => `${mistakeText(mistake)}\n`).join("");
  const files = new Set(loaded.mistakes.map((mistake) => mistake.file)).size;
  return {
    code: 1,
    out: "",
    err: `${lines}${counted(loaded.mistakes.length, "mistake")} in ${counted(files, "file")}\n`,
  };
}

function counted(count: number, what: string): string {
  return `${count} ${what}${count === 1 ? "" : "s"}`;
}
