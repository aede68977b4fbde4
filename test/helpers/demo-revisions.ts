import type { Checked } from "../../compute/command/load-valid.ts";
import { loadValid } from "../../compute/command/load-valid.ts";
import type { Revision } from "../../compute/documents/types/revision.gen.ts";
import { makeRevision } from "../../compute/record/make-revision.ts";

/** What every revision of the tests is issued as. */
export const ISSUE = { number: 1, issuedOn: "2026-12-01", toolVersion: "0.0.0" } as const;

let checked: Extract<Checked, { kind: "valid" }> | undefined;
let revisions: readonly Revision[] | undefined;

/** The demo's drafts and words, loaded once. */
export function demo(): Extract<Checked, { kind: "valid" }> {
  if (checked) return checked;
  const loaded = loadValid("content");
  if (loaded.kind === "invalid") throw new Error(JSON.stringify(loaded.mistakes));
  checked = loaded;
  return loaded;
}

/** Revisions made now from the demo's drafts: issued files may be of another day. */
export function demoRevisions(): readonly Revision[] {
  const { drafts, content } = demo();
  revisions ??= drafts.map(({ inputs }) => makeRevision(inputs, Object.fromEntries(content.wording), ISSUE));
  return revisions;
}
