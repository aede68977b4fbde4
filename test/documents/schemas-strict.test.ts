import { readdirSync, readFileSync } from "node:fs";
import { Ajv2020 } from "ajv/dist/2020.js";
import addFormats from "ajv-formats";
import { describe, expect, test } from "vitest";

type Shape = { readonly [key: string]: unknown };
interface Place {
  readonly at: string;
  readonly shape: Shape;
}

const FILES = readdirSync("schema").sort();
const SCHEMAS = new Map(FILES.map((file) => [file, JSON.parse(readFileSync(`schema/${file}`, "utf8")) as Shape]));
const AUTHORED = FILES.filter((file) => !["figures.schema.json", "revision.schema.json"].includes(file));

function ajv(): Ajv2020 {
  const made = new Ajv2020({ strict: true, discriminator: true, allErrors: true });
  made.addKeyword({ keyword: "unit", schemaType: "string" });
  addFormats.default(made, ["date", "email", "uri"]);
  for (const schema of SCHEMAS.values()) made.addSchema(schema);
  return made;
}

/** Every schema inside a schema, itself first. */
function* shapes(at: string, shape: Shape): Generator<Place> {
  yield { at, shape };
  for (const key of ["properties", "$defs"]) {
    for (const [name, inner] of Object.entries((shape[key] ?? {}) as Shape))
      yield* shapes(`${at}/${key}/${name}`, inner as Shape);
  }
  for (const key of ["oneOf", "anyOf"]) {
    for (const [index, inner] of ((shape[key] ?? []) as Shape[]).entries())
      yield* shapes(`${at}/${key}/${index}`, inner);
  }
  for (const key of ["items", "additionalProperties", "propertyNames"]) {
    if (typeof shape[key] === "object") yield* shapes(`${at}/${key}`, shape[key] as Shape);
  }
}

const places = AUTHORED.flatMap((file) => [...shapes(file, SCHEMAS.get(file) ?? {})]);
const isLeaf = ({ shape }: Place) => ["string", "number", "integer", "boolean"].includes(String(shape.type));
const at = (found: readonly Place[]) => found.map((place) => place.at);

describe("schemas of what authors write", () => {
  test("there is one for each kind of document", () => {
    expect(AUTHORED).toEqual(
      [
        "common",
        "duty-set",
        "limit-set",
        "lining",
        "panel",
        "plant",
        "project",
        "silencer",
        "statement",
        "wording",
      ].map((name) => `${name}.schema.json`),
    );
  });

  test.each(AUTHORED)("%s compiles in strict mode", (file) => {
    expect(ajv().getSchema(file)).toBeTypeOf("function");
  });

  test("every object refuses fields it does not know, or says what each of them is", () => {
    const open = places.filter(
      ({ shape }) => shape.type === "object" && !shape.oneOf && shape.additionalProperties === undefined,
    );
    expect(at(open)).toEqual([]);
    const maps = places
      .filter(({ shape }) => typeof shape.additionalProperties === "object")
      .map(({ at: place }) => place);
    expect(maps).toEqual([
      "common.schema.json/$defs/text",
      "wording.schema.json/properties/sections",
      "wording.schema.json/$defs/section",
    ]);
  });

  test("every field has a description", () => {
    const silent = places.filter(
      ({ at: place, shape }) => /\/properties\/[^/]+$/.test(place) && !shape.description && !shape.$ref,
    );
    expect(at(silent)).toEqual([]);
    const unnamed = places.filter(({ shape }) => shape.type !== undefined && !shape.description);
    expect(at(unnamed)).toEqual([]);
  });

  test("every number has a unit", () => {
    const bare = places.filter(({ shape }) => (shape.type === "number" || shape.type === "integer") && !shape.unit);
    expect(at(bare)).toEqual([]);
    expect(
      at(places.filter(({ shape }) => shape.unit !== undefined && !["number", "integer"].includes(String(shape.type)))),
    ).toEqual([]);
  });

  test("every leaf has examples that it accepts itself", () => {
    const leaves = places.filter((place) => isLeaf(place) && place.shape.const === undefined);
    expect(leaves.length).toBeGreaterThan(150);
    expect(at(leaves.filter(({ shape }) => !Array.isArray(shape.examples) || shape.examples.length === 0))).toEqual([]);
    const checker = ajv();
    const wrong = leaves.filter(({ shape }) =>
      (shape.examples as unknown[]).some((example) => !checker.validate(shape, example)),
    );
    expect(at(wrong)).toEqual([]);
  });

  test("every choice is told apart by its kind", () => {
    const choices = places.filter(({ shape }) => shape.oneOf !== undefined);
    expect(choices.length).toBeGreaterThan(12);
    expect(
      at(choices.filter(({ shape }) => (shape.discriminator as Shape | undefined)?.propertyName !== "kind")),
    ).toEqual([]);
  });
});
