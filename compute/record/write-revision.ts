import { linkSync, mkdirSync, unlinkSync, writeFileSync } from "node:fs";
import path from "node:path";
import type { Revision } from "../documents/types/revision.gen.ts";
import { revisionFile } from "./issued-revisions.ts";
import { shapeProblem } from "./shape-problem.ts";

/**
 * Writes a revision's file whole or not at all, and never over another.
 *
 * @returns path of the file
 * @throws {Error} if the shape is wrong, which is our fault, or if the number is already taken
 */
export function writeRevision(content: string, revision: Revision): string {
  const problem = shapeProblem("revision", revision);
  if (problem) throw new Error(`revision ${revision.number} of ${revision.project}/${revision.phase}: ${problem}`);
  const file = revisionFile(content, revision.project, revision.phase, revision.number);
  mkdirSync(path.dirname(file), { recursive: true });
  const part = path.join(path.dirname(file), `.${revision.number}.${process.pid}.part`);
  writeFileSync(part, `${JSON.stringify(revision)}\n`);
  try {
    // A link, unlike a rename, fails if the name is taken.
    linkSync(part, file);
  } finally {
    unlinkSync(part);
  }
  return file;
}
