import type { ErrorObject } from "ajv";
import type { JsonSchema } from "./json-schema.ts";
import { nearest } from "./nearest.ts";

/** The field that an unknown field most likely stands for: one that the object does not have yet. */
export function nearestField(error: ErrorObject): string | undefined {
  const known = Object.keys((error.parentSchema as JsonSchema).properties ?? {});
  const free = known.filter((field) => field !== "$schema" && !Object.hasOwn(error.data as object, field));
  return nearest(error.params.additionalProperty, free);
}
