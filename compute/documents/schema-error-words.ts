import type { ErrorObject } from "ajv";
import { didYouMean } from "./did-you-mean.ts";
import { expectedText } from "./expected-text.ts";
import { fieldSchema } from "./field-schema.ts";
import type { JsonSchema } from "./json-schema.ts";
import { listText } from "./list-text.ts";
import { nearest } from "./nearest.ts";
import { nearestField } from "./nearest-field.ts";
import { pointerSegments } from "./pointer-segments.ts";
import { pointerTo } from "./pointer-to.ts";
import { receivedText } from "./received-text.ts";
import { resolveSchema } from "./resolve-schema.ts";

interface CheckedDocument {
  readonly top: JsonSchema;
  readonly value: unknown;
}
type Words = readonly [pointer: string, expected: string, received: string, advice: string, place?: "name"];

/** What is said about one error of the schema check: where, what was expected and received, what to do. */
export function schemaErrorWords(error: ErrorObject, place: CheckedDocument): Words {
  const { instancePath: here, params, data } = error;
  if (error.propertyName !== undefined) {
    return [
      pointerTo(here, error.propertyName),
      expectedName(error.parentSchema as JsonSchema),
      receivedText(error.propertyName),
      giveText(error.parentSchema as JsonSchema),
      "name",
    ];
  }
  switch (error.keyword) {
    case "additionalProperties":
      return unknownField(error);
    case "required":
      return missingField(pointerTo(here, params.missingProperty), "", place);
    case "dependentRequired":
      return missingField(pointerTo(here, params.missingProperty), ` beside "${params.property}"`, place);
    case "discriminator":
      return wrongKind(error, place);
    case "not":
      return [
        here,
        "an id that the site does not keep for its own addresses",
        receivedText(data),
        reservedText(error.schema as JsonSchema),
      ];
    case "uniqueItems":
      return [
        pointerTo(here, params.i),
        "each entry once",
        `${receivedText((data as unknown[])[params.i])} twice`,
        "Take one of the two away.",
      ];
    case "minProperties":
      return [here, "at least one entry", receivedText(data), giveAt(here, place)];
    default:
      return wrongValue(error, place);
  }
}

function unknownField(error: ErrorObject): Words {
  const name: string = error.params.additionalProperty;
  const known = Object.keys((error.parentSchema as JsonSchema).properties ?? {}).filter((field) => field !== "$schema");
  const near = nearestField(error);
  const advice = near === undefined ? `Fields here: ${listText(known, "and")}.` : `Did you mean "${near}"?`;
  return [pointerTo(error.instancePath, name), "a field of this object", receivedText(name), advice, "name"];
}

function missingField(pointer: string, beside: string, place: CheckedDocument): Words {
  const found = fieldSchema(place.top, place.value, pointerSegments(pointer));
  const expected = found ? expectedText(found.schema, found.root) : "a value";
  return [pointer, `${expected}${beside}`, "nothing", giveAt(pointer, place)];
}

function wrongKind(error: ErrorObject, place: CheckedDocument): Words {
  const found = fieldSchema(place.top, place.value, pointerSegments(error.instancePath));
  const kinds = (found?.schema.oneOf ?? []).map((branch) =>
    String(resolveSchema(branch, found?.root ?? place.top).schema.properties?.kind?.const),
  );
  const given: unknown = error.params.tagValue;
  const advice = given === undefined ? "The kind says which fields follow." : didYouMean(given, kinds, "kind");
  return [pointerTo(error.instancePath, "kind"), listText(kinds, "or"), receivedText(given), advice];
}

function wrongValue(error: ErrorObject, place: CheckedDocument): Words {
  const { instancePath: here, data } = error;
  const found = fieldSchema(place.top, place.value, pointerSegments(here)) ?? {
    schema: error.parentSchema as JsonSchema,
    root: place.top,
  };
  const near = found.schema.enum && typeof data === "string" ? nearest(data, found.schema.enum) : undefined;
  const advice = near === undefined ? giveText(found.schema) : `Did you mean "${near}"?`;
  return [here, expectedText(found.schema, found.root), receivedText(data), advice];
}

function giveAt(pointer: string, place: CheckedDocument): string {
  return giveText(fieldSchema(place.top, place.value, pointerSegments(pointer))?.schema ?? {});
}

function expectedName(schema: JsonSchema): string {
  return `a name such as ${JSON.stringify(schema.examples?.[0])}`;
}

/** The description of a field as advice. */
function giveText(schema: JsonSchema): string {
  const words = schema.description ?? "";
  return words === ""
    ? ""
    : `Give: ${/^[A-Z][a-z]/.test(words) ? words.charAt(0).toLowerCase() + words.slice(1) : words}`;
}

function reservedText(not: JsonSchema): string {
  const [kept] = not.anyOf ?? [];
  return `Kept are ${listText(kept?.enum ?? [], "and")}, and r with a number.`;
}
