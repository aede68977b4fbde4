import type { JsonSchema } from "./json-schema.ts";
import { listText } from "./list-text.ts";
import { resolveSchema } from "./resolve-schema.ts";

/** What a schema accepts, in words, with unit and range: `a number above 0 and up to 24 h`. */
export function expectedText(given: JsonSchema, home: JsonSchema): string {
  const { schema, root } = resolveSchema(given, home);
  if (schema.const !== undefined) return JSON.stringify(schema.const);
  if (schema.enum) return listText(schema.enum, "or");
  if (schema.anyOf && !schema.type) return schema.anyOf.map((branch) => expectedText(branch, root)).join(" or ");
  if (schema.oneOf) return `an object of the kind ${listText(kindsOf(schema, root), "or")}`;
  switch (schema.type) {
    case "number":
      return `a number${rangeText(schema)}`;
    case "integer":
      return `a whole number${rangeText(schema)}`;
    case "boolean":
      return "true or false";
    case "array":
      return schema.minItems ? `a list of at least ${schema.minItems}` : "a list";
    case "string":
      return schema.pattern || schema.format
        ? `text such as ${JSON.stringify(schema.examples?.[0])}`
        : "text that is not empty";
    default:
      return schema.examples ? `an object such as ${JSON.stringify(schema.examples[0])}` : "an object";
  }
}

function kindsOf(schema: JsonSchema, root: JsonSchema): string[] {
  return (schema.oneOf ?? []).map((branch) => String(resolveSchema(branch, root).schema.properties?.kind?.const));
}

function rangeText(schema: JsonSchema): string {
  const unit = schema.unit === undefined || schema.unit === "1" ? "" : ` ${schema.unit}`;
  const { minimum, exclusiveMinimum, maximum } = schema;
  if (exclusiveMinimum !== undefined)
    return ` above ${exclusiveMinimum}${maximum === undefined ? "" : ` and up to ${maximum}`}${unit}`;
  if (minimum !== undefined && maximum !== undefined) return ` from ${minimum} to ${maximum}${unit}`;
  return unit ? ` in${unit}` : "";
}
