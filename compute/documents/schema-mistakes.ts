import type { ErrorObject } from "ajv";
import type { Mistake } from "./mistake.ts";
import { mistakeAt } from "./mistake-at.ts";
import { nearestField } from "./nearest-field.ts";
import { pointerTo } from "./pointer-to.ts";
import { schemaErrorWords } from "./schema-error-words.ts";
import { type DocumentKind, schemas } from "./schemas.ts";
import { validator } from "./validator.ts";

/** What the schema of its kind finds wrong with a document: one mistake, one line. */
export function schemaMistakes(
  texts: ReadonlyMap<string, string>,
  file: string,
  kind: DocumentKind,
  value: unknown,
): Mistake[] {
  const check = validator(kind);
  if (check(value)) return [];
  const errors = withoutEchoes(check.errors ?? []);
  const document = { top: schemas[kind], value };
  return errors.map((error) => mistakeAt(texts, file, ...schemaErrorWords(error, document)));
}

/** Leaves out errors that only repeat another one. */
function withoutEchoes(errors: readonly ErrorObject[]): readonly ErrorObject[] {
  const choices = new Set(errors.filter((error) => error.keyword === "anyOf").map((error) => error.instancePath));
  const misspelt = new Set(errors.filter((error) => error.keyword === "additionalProperties").map(meantField));
  return errors.filter((error) => {
    if (error.keyword === "propertyNames") return false;
    if (error.keyword === "required") return !misspelt.has(pointerTo(error.instancePath, error.params.missingProperty));
    return error.keyword === "anyOf" || !choices.has(error.instancePath);
  });
}

/** Pointer of the field that an unknown field most likely stands for. */
function meantField(error: ErrorObject): string {
  return pointerTo(error.instancePath, nearestField(error) ?? "");
}
