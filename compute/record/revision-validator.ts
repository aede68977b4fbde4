import { Ajv2020 } from "ajv/dist/2020.js";
import addFormats from "ajv-formats";
import figures from "../../schema/figures.schema.json" with { type: "json" };
import revision from "../../schema/revision.schema.json" with { type: "json" };
import { schemas } from "../documents/schemas.ts";

let ajv: Ajv2020 | undefined;

/**
 * What is wrong with the shape of a file that the tool itself writes; nothing if it is right.
 *
 * @param kind   which of the two files
 * @param value  the parsed file
 */
export function shapeProblem(kind: "revision" | "figures", value: unknown): string | undefined {
  ajv ??= makeAjv();
  const check = ajv.getSchema(`${kind}.schema.json`);
  if (!check) throw new Error(`there is no schema of the kind ${kind}`);
  if (check(value)) return undefined;
  const [first] = check.errors ?? [];
  return `${first?.instancePath || "/"} ${first?.message ?? "has the wrong shape"}`;
}

function makeAjv(): Ajv2020 {
  const made = new Ajv2020({ strict: true, strictRequired: false, discriminator: true });
  made.addKeyword({ keyword: "unit", schemaType: "string" });
  addFormats.default(made, ["date", "email", "uri"]);
  for (const schema of Object.values(schemas)) made.addSchema(schema);
  made.addSchema(revision);
  made.addSchema(figures);
  return made;
}
