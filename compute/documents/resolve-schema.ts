import type { JsonSchema } from "./json-schema.ts";
import { schemas } from "./schemas.ts";

/** A schema with what its reference leads to; words beside the reference win. */
export function resolveSchema(
  schema: JsonSchema,
  root: JsonSchema,
): { readonly schema: JsonSchema; readonly root: JsonSchema } {
  if (schema.$ref === undefined) return { schema, root };
  const [file = "", pointer = ""] = schema.$ref.split("#");
  const home = file === "" ? root : schemas[file.replace(/\.schema\.json$/, "") as keyof typeof schemas];
  const found = pointer === "" ? home : home?.$defs?.[pointer.replace("/$defs/", "")];
  if (!home || !found) throw new Error(`nothing stands behind the schema reference ${schema.$ref}`);
  const resolved = resolveSchema(found, home);
  const { $ref: _, ...beside } = schema;
  return { schema: { ...resolved.schema, ...beside }, root: resolved.root };
}
