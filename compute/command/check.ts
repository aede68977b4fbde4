import { mistakeText } from "../documents/mistake-text.ts";
import { issuedRevisions } from "../record/issued-revisions.ts";
import type { Command, Outcome } from "./command.ts";
import { usage } from "./command.ts";
import { loadValid } from "./load-valid.ts";
import { readOptions } from "./options.ts";

export const check: Command = {
  summary: "validates the content and names every mistake",
  help: `npm run check -- [--content DIR]

Holds every document against its schema, every reference, date and place against each other, every issued revision against its
digest, and works every draft out. All mistakes are printed at once, one line each:

  file:line:column /pointer: expected …, received …. What to do

Exit status 1 if there is one. Nothing is written.

  --content DIR  content folder (content)
`,
  run: (args) => {
    const parsed = readOptions(args, { content: "string" });
    if (parsed.kind === "wrong") return usage("check", parsed.problem);
    if (parsed.rest.length > 0) return usage("check", `expected no further words, received ${parsed.rest.join(" ")}`);
    return checkContent((parsed.options.content as string | undefined) ?? "content");
  },
};

/** Validates a content folder: documents, drafts as scenes, and sealed revisions. */
export function checkContent(content: string): Outcome {
  const checked = loadValid(content);
  if (checked.kind === "invalid") {
    const lines = checked.mistakes.map((mistake) => `${mistakeText(mistake)}\n`).join("");
    const files = new Set(checked.mistakes.map(({ file }) => file)).size;
    return {
      code: 1,
      out: "",
      err: `${lines}${counted(checked.mistakes.length, "mistake")} in ${counted(files, "file")}\n`,
    };
  }
  const revisions = issuedRevisions(content).reduce((count, phase) => count + phase.revisions.length, 0);
  const documents = checked.content.texts.size;
  return {
    code: 0,
    out: `${counted(documents, "document")} and ${counted(revisions, "issued revision")}, no mistakes\n`,
    err: "",
  };
}

function counted(count: number, what: string): string {
  return `${count} ${what}${count === 1 ? "" : "s"}`;
}
