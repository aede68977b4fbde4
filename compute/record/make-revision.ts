import type { Revision } from "../documents/types/revision.gen.ts";
import type { Wording } from "../documents/types/wording.gen.ts";
import { noting } from "../equations/working.ts";
import { figuresOf } from "../statement/figures-of.ts";
import { governing } from "../statement/governing.ts";
import type { StatementInputs } from "../statement/inputs.ts";
import { termTables } from "../statement/term-tables.ts";
import { revisionDigest } from "./digest.ts";
import { sealedEquation } from "./sealed-equation.ts";

/** What a revision is given beside its documents. */
export interface Issue {
  readonly number: number;
  /** Date of issue. */
  readonly issuedOn: string;
  readonly toolVersion: string;
}

/** Version of the revision's shape that this program writes. */
const SCHEMA_VERSION = 1;

/**
 * A statement as issued: documents, words, equations, figures, term tables and zones, with the digest over all of it.
 *
 * @param inputs   documents of the statement
 * @param wording  words by language
 * @param issue    number, date and program version
 */
export function makeRevision(
  inputs: StatementInputs,
  wording: Readonly<Record<string, Wording>>,
  issue: Issue,
): Revision {
  const used = new Set<string>();
  const { figures, periods, earProtection, assessment } = figuresOf(noting(used), inputs);
  const content = plain({
    schemaVersion: SCHEMA_VERSION,
    project: inputs.project.id,
    phase: inputs.statement.phase,
    ...issue,
    inputs,
    wording,
    equations: [...used].sort().map(sealedEquation),
    figures,
    periods,
    terms: termTables(assessment),
    governing: governing(inputs, periods),
    earProtection,
  }) as Omit<Revision, "digest">;
  return { ...content, digest: revisionDigest(content) };
}

/** The value as its JSON reads: undefined members gone, nothing shared. */
function plain(value: unknown): unknown {
  return JSON.parse(JSON.stringify(value));
}
