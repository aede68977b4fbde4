import { createHash } from "node:crypto";
import canonicalize from "canonicalize";

/**
 * SHA-256 over the canonical form of a JSON value (RFC 8785): white space and the order of keys do not count.
 *
 * @returns 64 hexadecimal signs
 */
export function digestOf(value: unknown): string {
  const canonical = canonicalize(value);
  if (canonical === undefined) throw new Error("a value without a JSON form has no digest");
  return createHash("sha256").update(canonical).digest("hex");
}

/** Digest of a revision: everything in its file but the digest itself and the editor's `$schema`. */
export function revisionDigest(revision: { readonly digest?: string; readonly $schema?: string }): string {
  const { digest: _digest, $schema: _schema, ...content } = revision;
  return digestOf(content);
}
