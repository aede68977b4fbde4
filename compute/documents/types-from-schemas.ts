import { typesIntoFiles } from "./types-into-files.ts";

type Json = unknown;
type JsonObject = { readonly [key: string]: Json };

/** Keywords that restrict values without changing the type, or that the type writer would read differently. */
const LEFT_OUT = new Set([
  "$schema",
  "$id",
  "examples",
  "unit",
  "discriminator",
  "dependentRequired",
  "propertyNames",
  "not",
]);

/**
 * TypeScript types of all schemas, one file per schema, each type written once and imported elsewhere.
 *
 * @param schemas  parsed schemas by name, e.g. `plant` for plant.schema.json
 * @returns        text of `<name>.gen.ts` by name
 * @throws {Error} if two schemas give one name to two shapes
 */
export async function typesFromSchemas(schemas: ReadonlyMap<string, JsonObject>): Promise<ReadonlyMap<string, string>> {
  const { compile } = await import("json-schema-to-typescript");
  const { shapes, owner } = gather(schemas);
  const all = { title: "AllDocuments", type: "object", additionalProperties: false, properties: {}, $defs: shapes };
  const text = await compile(all as never, "AllDocuments", {
    bannerComment: "",
    unreachableDefinitions: true,
    ignoreMinAndMaxItems: true,
    additionalProperties: false,
    style: { printWidth: 120 },
  });
  return typesIntoFiles(text, owner, [...schemas.keys()]);
}

/** All roots and definitions under their type names, and the schema that each belongs to. */
function gather(schemas: ReadonlyMap<string, JsonObject>): {
  shapes: Record<string, Json>;
  owner: Map<string, string>;
} {
  const shapes: Record<string, Json> = {};
  const owner = new Map<string, string>();
  const add = (type: string, file: string, shape: JsonObject) => {
    const other = owner.get(type);
    if (other)
      throw new Error(
        `schema/${file}.schema.json: the type name ${type} is already used by schema/${other}.schema.json. Give it another title.`,
      );
    owner.set(type, file);
    shapes[type] = { ...(rewritten(shape, file, schemas) as JsonObject), title: type };
  };
  for (const [file, schema] of schemas) {
    const { $defs, ...root } = schema;
    if ("type" in root) add(typeName(root, file), file, root);
    for (const [key, shape] of Object.entries(($defs ?? {}) as Record<string, JsonObject>))
      add(typeName(shape, key), file, shape);
  }
  return { shapes, owner };
}

function typeName(shape: JsonObject, key: string): string {
  return typeof shape.title === "string"
    ? shape.title
    : key.replace(/(^|-)([a-z])/g, (_all, _dash, letter: string) => letter.toUpperCase());
}

/** The shape with references into the gathered definitions and without keywords that do not change the type. */
function rewritten(value: Json, file: string, schemas: ReadonlyMap<string, JsonObject>, isMap = false): Json {
  if (Array.isArray(value)) return value.map((item) => rewritten(item, file, schemas));
  if (typeof value !== "object" || value === null) return value;
  const shape = value as JsonObject;
  if (!isMap && typeof shape.$ref === "string") return { $ref: `#/$defs/${target(shape.$ref, file, schemas)}` };
  const kept = Object.entries(shape).filter(
    ([key]) =>
      isMap || !(LEFT_OUT.has(key) || key === "title" || (key === "type" && ("oneOf" in shape || "anyOf" in shape))),
  );
  return Object.fromEntries(
    kept.map(([key, item]) => [key, rewritten(item, file, schemas, !isMap && key === "properties")]),
  );
}

/** Type name behind a reference such as `common.schema.json#/$defs/level`, `#/$defs/window` or `project.schema.json`. */
function target(ref: string, file: string, schemas: ReadonlyMap<string, JsonObject>): string {
  const [where = "", pointer = ""] = ref.split("#");
  const name = where === "" ? file : where.replace(/\.schema\.json$/, "");
  const root = schemas.get(name);
  const key = pointer.replace(/^\/\$defs\//, "");
  const shape = pointer === "" ? root : (root?.$defs as Record<string, JsonObject> | undefined)?.[key];
  if (!shape) throw new Error(`schema/${file}.schema.json: nothing stands behind the reference ${ref}`);
  return typeName(shape, pointer === "" ? name : key);
}
