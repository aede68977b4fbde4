import { execFileSync } from "node:child_process";
import { mkdtempSync, readdirSync, readFileSync, rmSync, statSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { performance } from "node:perf_hooks";
import { brotliCompressSync } from "node:zlib";
import type { Command, Outcome, Place } from "./command.ts";
import { usage } from "./command.ts";
import { readOptions } from "./options.ts";
import { progressOn } from "./progress.ts";
import { typicalPages } from "./typical-pages.ts";

/** What a page may weigh with its styles, compressed by brotli, without fonts [kB]. */
const BUDGET_KB: Readonly<Record<string, number>> = { statement: 60 };

export const bench: Command = {
  summary: "measures how long commands take and what pages weigh",
  help: `npm run bench -- [--content DIR]

Prints two tables: times of whole commands, each in a fresh process, and the weight of one page of each type with its styles,
as it is and compressed by brotli. Times hold for this machine alone; nothing is tested against them.

  --content DIR  content folder (content)
`,
  run: (args, place) => {
    const parsed = readOptions(args, { content: "string" });
    if (parsed.kind === "wrong") return usage("bench", parsed.problem);
    if (parsed.rest.length > 0) return usage("bench", `expected no further words, received ${parsed.rest.join(" ")}`);
    return measured((parsed.options.content as string | undefined) ?? "content", place);
  },
};

function measured(content: string, place: Place): Outcome {
  const folder = mkdtempSync(path.join(tmpdir(), "bench-"));
  const site = path.join(folder, "site");
  const progress = progressOn();
  const run = (name: string, count: number, args: readonly string[]) => {
    progress.tell(`${name}: ${count} runs`);
    return `| ${name} | ${count} | ${medianS(Array.from({ length: count }, () => runS(args, place))).toFixed(2)} |\n`;
  };
  try {
    const times = [
      run("build, cold", 3, ["build", "--content", content, "--out", site]),
      run("check", 5, ["check", "--content", content]),
    ];
    const out = `| Command | Runs | Median, s |\n| --- | --- | --- |\n${times.join("")}\n${weights(site)}`;
    return { code: 0, out, err: "" };
  } catch (error) {
    return { code: 1, out: "", err: `bench: ${(error as Error).message}\n` };
  } finally {
    progress.done();
    rmSync(folder, { recursive: true, force: true });
  }
}

/** Time of a command from start to end of its process [s]; throws with what it says if it fails. */
function runS(args: readonly string[], place: Place): number {
  const from = performance.now();
  execFileSync(process.execPath, ["compute/command/launch.js", ...args], { cwd: place.root, stdio: "pipe" });
  return (performance.now() - from) / 1000;
}

function medianS(times: readonly number[]): number {
  return [...times].sort((a, b) => a - b)[Math.floor(times.length / 2)] ?? Number.NaN;
}

function weights(site: string): string {
  const rows = typicalPages(site).map(({ type, file }) => {
    const page = readFileSync(path.join(site, file), "utf8");
    const styles = [...page.matchAll(/<link rel="stylesheet" href="([^"]+)"/g)].map(([, href = ""]) =>
      path.join(site, path.dirname(file), href),
    );
    const parts = [path.join(site, file), ...styles].map((each) => readFileSync(each));
    const raw = parts.reduce((sum, part) => sum + part.length, 0);
    const small = parts.reduce((sum, part) => sum + brotliCompressSync(part).length, 0);
    const budget = BUDGET_KB[type];
    const held = budget === undefined ? "–" : `${budget}${small / 1000 > budget ? ": over" : ""}`;
    return `| ${type} | ${kilobytes(raw)} | ${kilobytes(small)} | ${held} |\n`;
  });
  return (
    `| Page with its styles, without fonts | Raw, kB | Brotli, kB | Budget, kB brotli |\n| --- | --- | --- | --- |\n${rows.join("")}\n` +
    `Fonts: text ${kilobytes(fonts(site, /^source-sans/))} kB, equations ${kilobytes(fonts(site, /^KaTeX/))} kB if a page used them all.\n`
  );
}

function fonts(site: string, name: RegExp): number {
  const folder = path.join(site, "assets/fonts");
  return readdirSync(folder)
    .filter((file) => name.test(file) && file.endsWith(".woff2"))
    .reduce((sum, file) => sum + statSync(path.join(folder, file)).size, 0);
}

function kilobytes(bytes: number): string {
  return (bytes / 1000).toFixed(1);
}
