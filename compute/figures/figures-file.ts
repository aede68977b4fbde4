import type { Revision } from "../documents/types/revision.gen.ts";

/** The figures of a revision as figures.json, unrounded (`schema/figures.schema.json`). */
export function figuresFile(revision: Revision) {
  const { schemaVersion, project, phase, number, issuedOn, digest, figures } = revision;
  return { schemaVersion, project, phase, revision: number, issuedOn, digest, figures };
}
