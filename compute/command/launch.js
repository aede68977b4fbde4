// Node 20 cannot run TypeScript: bundle it to a file named by its hash, then import that file. Where no source file has changed
// since the last start, the bundle of the last start is imported at once.
import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync, statSync, writeFileSync } from "node:fs";
import path from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), "../..");
const cache = path.join(root, ".cache");
const note = path.join(cache, "last-bundle.json");

const sources = sourceStamp();
const file = lastBundle(sources) ?? (await bundle());
if (file !== lastBundle(sources)) write(note, JSON.stringify({ sources, file }));
const { run } = await import(pathToFileURL(file).href);
process.exitCode = await run(process.argv.slice(2), { root, bundle: file });

/** A digest over names, sizes and times of everything that goes into the bundle. */
function sourceStamp() {
  const hash = createHash("sha256");
  for (const folder of ["compute", "templates/models", "schema"]) {
    for (const name of readdirSync(path.join(root, folder), { recursive: true }).sort()) {
      if (!/\.(ts|json)$/.test(name)) continue;
      const { size, mtimeMs } = statSync(path.join(root, folder, name));
      hash.update(`${folder}/${name} ${size} ${mtimeMs}\n`);
    }
  }
  return hash.digest("hex");
}

function lastBundle(wanted) {
  if (!existsSync(note)) return undefined;
  const { sources: known, file: last } = JSON.parse(readFileSync(note, "utf8"));
  return known === wanted && existsSync(last) ? last : undefined;
}

async function bundle() {
  const { default: esbuild } = await import("esbuild");
  const result = await esbuild.build({
    absWorkingDir: root,
    entryPoints: ["./compute/command/main.ts"],
    bundle: true,
    platform: "node",
    format: "esm",
    target: "node20",
    packages: "external",
    sourcemap: "inline",
    write: false,
    logLevel: "warning",
  });
  const code = result.outputFiles[0].contents;
  const name = createHash("sha256").update(code).digest("hex").slice(0, 16);
  const made = path.join(cache, `stillboard-${name}.mjs`);
  if (!existsSync(made)) write(made, code);
  return made;
}

/** Written aside and renamed, so that two starts at once never read half a file. */
function write(target, content) {
  mkdirSync(cache, { recursive: true });
  writeFileSync(`${target}.${process.pid}`, content);
  renameSync(`${target}.${process.pid}`, target);
}
