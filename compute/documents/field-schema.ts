import type { JsonSchema } from "./json-schema.ts";
import { resolveSchema } from "./resolve-schema.ts";

interface Found {
  readonly schema: JsonSchema;
  readonly root: JsonSchema;
}

/**
 * The schema of a field, with the words that stand at the field itself, not at the shared shape behind it.
 *
 * @param value     the document, which says by its `kind` which variant holds
 * @param segments  the way to the field
 * @returns         the schema, or nothing where the way leaves the schema
 */
export function fieldSchema(top: JsonSchema, value: unknown, segments: readonly string[]): Found | undefined {
  let found: Found = variant(resolveSchema(top, top), value);
  let at = value;
  for (const segment of segments) {
    const next = below(found, segment);
    if (!next) return undefined;
    at = typeof at === "object" && at !== null ? (at as Record<string, unknown>)[segment] : undefined;
    found = variant(next, at);
  }
  return found;
}

function below({ schema, root }: Found, segment: string): Found | undefined {
  const { items, additionalProperties: more } = schema as {
    items?: JsonSchema;
    additionalProperties?: JsonSchema | false;
  };
  const child = schema.properties?.[segment] ?? items ?? (more || undefined);
  return child && resolveSchema(child, root);
}

/** The variant that the value's own kind names, with the words of the field kept. */
function variant(found: Found, value: unknown): Found {
  const kind = typeof value === "object" && value !== null ? (value as { kind?: unknown }).kind : undefined;
  if (!found.schema.oneOf || kind === undefined) return found;
  for (const branch of found.schema.oneOf) {
    const one = resolveSchema(branch, found.root);
    if (one.schema.properties?.kind?.const === kind) return one;
  }
  return found;
}
