import { readdirSync, readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { typesFromSchemas } from "../../compute/documents/types-from-schemas.ts";

const FOLDER = "compute/documents/types";

test("making the types again from the schemas changes nothing", async () => {
  const files = readdirSync("schema").sort();
  const schemas = new Map(
    files.map((file) => [file.replace(".schema.json", ""), JSON.parse(readFileSync(`schema/${file}`, "utf8"))]),
  );
  const made = await typesFromSchemas(schemas);
  const kept = new Map(
    readdirSync(FOLDER)
      .sort()
      .map((file) => [file.replace(".gen.ts", ""), readFileSync(`${FOLDER}/${file}`, "utf8")]),
  );
  expect([...made.keys()]).toEqual([...kept.keys()]);
  for (const [name, text] of made) expect(text, name).toBe(kept.get(name));
});

test("two schemas cannot give one type name to two shapes", async () => {
  const schema = { title: "Same", type: "object", additionalProperties: false, properties: {} };
  await expect(
    typesFromSchemas(
      new Map([
        ["a", schema],
        ["b", schema],
      ]),
    ),
  ).rejects.toThrow(
    "schema/b.schema.json: the type name Same is already used by schema/a.schema.json. Give it another title.",
  );
});
