import { Ajv2020, type ValidateFunction } from "ajv/dist/2020.js";
import addFormats from "ajv-formats";
import { type FileKind, schemas } from "./schemas.ts";

let ajv: Ajv2020 | undefined;

/** The schema check of one kind of file; made once. */
export function validator(kind: FileKind): ValidateFunction {
  ajv ??= makeAjv();
  const check = ajv.getSchema(`${kind}.schema.json`);
  if (!check) throw new Error(`there is no schema of the kind ${kind}`);
  return check;
}

function makeAjv(): Ajv2020 {
  const made = new Ajv2020({
    strict: true,
    strictRequired: false,
    discriminator: true,
    allErrors: true,
    verbose: true,
    // Each schema is compiled once and run on a few small documents: compiling fast matters more than running fast.
    code: { optimize: false },
  });
  made.addKeyword({ keyword: "unit", schemaType: "string" });
  addFormats.default(made, ["date", "email", "uri"]);
  for (const schema of Object.values(schemas)) made.addSchema(schema);
  return made;
}
