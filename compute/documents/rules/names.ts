import type { Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { receivedText } from "../received-text.ts";
import { statementsOf } from "../statements-of.ts";

/** The id inside a document is the name of its file or folder. */
export const names: Rule = (set) => {
  const found: Mistake[] = [];
  const same = (file: string, pointer: string, expected: string, received: string, place: "file" | "folder") => {
    if (expected === received) return;
    const advice = `Rename the ${place}, or write its name here.`;
    found.push(
      mistakeAt(set.texts, file, pointer, `"${expected}", the name of the ${place}`, receivedText(received), advice),
    );
  };
  for (const kind of ["plant", "panel", "lining", "silencer", "limit-set", "duty-set"] as const) {
    for (const [name, { sheet, file }] of set[kind].valid) same(file, "/id", name, sheet.id, "file");
  }
  for (const [name, { sheet, file }] of set.wording.valid) same(file, "/language", name, sheet.language, "file");
  for (const [name, { sheet, file }] of set.project.valid) same(file, "/id", name, sheet.id, "folder");
  for (const { projectId, phase, file, statement } of statementsOf(set)) {
    same(file, "/project", projectId, statement.project, "folder");
    same(file, "/phase", phase, statement.phase, "folder");
  }
  return found;
};
