// Node 20 cannot run TypeScript: bundle it to a file named by its hash, then import that file.
import { createHash } from "node:crypto";
import { existsSync, mkdirSync, renameSync, writeFileSync } from "node:fs";
import path from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import esbuild from "esbuild";

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), "../..");

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
const hash = createHash("sha256").update(code).digest("hex").slice(0, 16);
const file = path.join(root, ".cache", `stillboard-${hash}.mjs`);
if (!existsSync(file)) {
  mkdirSync(path.dirname(file), { recursive: true });
  writeFileSync(`${file}.${process.pid}`, code);
  renameSync(`${file}.${process.pid}`, file);
}
const { run } = await import(pathToFileURL(file).href);
process.exitCode = await run(process.argv.slice(2), { root, bundle: file });
