import { mkdirSync, readdirSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import { typesFromSchemas } from "../documents/types-from-schemas.ts";
import type { Command } from "./command.ts";
import { usage } from "./command.ts";

export const command: Command = {
  summary: "writes the TypeScript types of the schemas",
  help: `npm run types

Writes compute/documents/types/<name>.gen.ts for every schema/<name>.schema.json. Needs the development packages.
`,
  run: (args, place) => (args.length > 0 ? usage("types", "expected no further words") : types(place.root)),
};

/** Writes compute/documents/types/<name>.gen.ts for every schema/<name>.schema.json. */
export async function types(root: string): Promise<{ code: number; out: string; err: string }> {
  const folder = path.join(root, "compute/documents/types");
  const texts = await typesFromSchemas(readSchemas(path.join(root, "schema")));
  mkdirSync(folder, { recursive: true });
  for (const [name, text] of texts) writeFileSync(path.join(folder, `${name}.gen.ts`), text);
  return { code: 0, out: `${texts.size} type files written\n`, err: "" };
}

function readSchemas(folder: string): ReadonlyMap<string, { readonly [key: string]: unknown }> {
  const files = readdirSync(folder)
    .filter((file) => file.endsWith(".schema.json"))
    .sort();
  return new Map(
    files.map((file) => [
      file.slice(0, -".schema.json".length),
      JSON.parse(readFileSync(path.join(folder, file), "utf8")),
    ]),
  );
}
