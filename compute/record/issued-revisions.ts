import { existsSync, readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import type { Revision } from "../documents/types/revision.gen.ts";
import { revisionDigest } from "./digest.ts";
import { shapeProblem } from "./shape-problem.ts";

/** The revisions of one phase in the order of their numbers. */
export interface IssuedPhase {
  readonly project: string;
  readonly phase: string;
  readonly revisions: readonly Revision[];
}

/** A sealed file that cannot be trusted, in words; stops every command that reads it. */
export class RecordError extends Error {
  override readonly name = "RecordError";
}

/** Path of a revision's file. */
export function revisionFile(content: string, project: string, phase: string, number: number): string {
  return path.join(content, "projects", project, phase, "issued", `${number}.json`);
}

/**
 * All issued revisions of a content folder, each held against its shape and its digest.
 *
 * @param content  the content folder
 * @throws {RecordError} naming the first file that is missing, misnamed, misshapen or changed since issue
 */
export function issuedRevisions(content: string): readonly IssuedPhase[] {
  const projects = path.join(content, "projects");
  return folders(projects).flatMap((project) =>
    folders(path.join(projects, project))
      .map((phase) => ({ project, phase, revisions: revisionsOf(content, project, phase) }))
      .filter(({ revisions }) => revisions.length > 0),
  );
}

/** The revisions of one phase, 1, 2, 3 … without a gap. */
export function revisionsOf(content: string, project: string, phase: string): readonly Revision[] {
  const folder = path.join(content, "projects", project, phase, "issued");
  if (!existsSync(folder)) return [];
  const names = readdirSync(folder).filter((name) => !name.startsWith("."));
  return names.map((_, index) => {
    const file = path.join(folder, `${index + 1}.json`);
    if (!names.includes(`${index + 1}.json`)) {
      throw new RecordError(
        `${file}: expected revision ${index + 1} of ${names.length} files, received nothing. Restore the file; revisions are never removed or renamed.`,
      );
    }
    return readRevision(file, project, phase, index + 1);
  });
}

function readRevision(file: string, project: string, phase: string, number: number): Revision {
  const value: unknown = parse(file);
  const problem = shapeProblem("revision", value);
  if (problem)
    throw new RecordError(
      `${file}: expected a revision as the tool writes it, received one whose ${problem}. Restore the file as it was issued.`,
    );
  const revision = value as Revision;
  const is = `${revision.project}/${revision.phase} ${revision.number}`;
  if (is !== `${project}/${phase} ${number}`) {
    throw new RecordError(
      `${file}: expected revision ${number} of ${project}/${phase}, received ${is}. Restore the file to its own place.`,
    );
  }
  const digest = revisionDigest(revision);
  if (digest !== revision.digest) {
    throw new RecordError(
      `${file}: expected the digest ${revision.digest.slice(0, 12)}… that it was issued with, received ${digest.slice(0, 12)}…. The file was changed after issue: restore it, or issue a new revision.`,
    );
  }
  return revision;
}

function parse(file: string): unknown {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch (error) {
    throw new RecordError(
      `${file}: expected JSON, received text that cannot be read (${(error as Error).message}). Restore the file as it was issued.`,
    );
  }
}

function folders(folder: string): readonly string[] {
  if (!existsSync(folder)) return [];
  return readdirSync(folder, { withFileTypes: true })
    .filter((each) => each.isDirectory())
    .map((each) => each.name)
    .sort();
}
