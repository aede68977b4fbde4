import { copyFileSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { createRequire } from "node:module";
import path from "node:path";
import { pathToFileURL } from "node:url";
import type { Site } from "../../templates/models/site.ts";
import type { Place } from "./command.ts";
import { RenderError } from "./render-error.ts";

/** Weights of the text face that the site ships. */
const FONTS = ["source-sans-3-latin-400-normal.woff2", "source-sans-3-latin-600-normal.woff2"];

/**
 * Writes a site into a folder: pages by the site engine, then data files, styles and fonts.
 *
 * @param site    pages and files
 * @param folder  an empty folder
 * @param place   where the program and its running bundle stand
 */
export async function writeSite(site: Site, folder: string, place: Place): Promise<void> {
  await writePages(site, folder, place);
  for (const { file, text } of site.files) writeText(path.join(folder, file), text);
  writeText(path.join(folder, "assets/equations.css"), site.equationCss);
  copyAssets(folder, place.root);
}

/** Eleventy only puts models into templates; it computes nothing. */
async function writePages(site: Site, folder: string, place: Place): Promise<void> {
  const plan = path.join(place.root, ".cache", `plan-${process.pid}.json`);
  const models = Object.fromEntries(site.pages.map(({ file, model }) => [file, model]));
  const pages = site.pages.map(({ file, template }) => ({ file, template: `templates/pages/${template}.njk` }));
  const output = path.relative(process.cwd(), folder);
  writeText(plan, JSON.stringify({ bundle: pathToFileURL(place.bundle).href, pages, models, output }));
  process.env.STILLBOARD_PLAN = plan;
  try {
    const { default: Eleventy } = await import("@11ty/eleventy");
    const engine = new Eleventy("templates", output, { configPath: ".eleventy.js", quietMode: true });
    engine.disableLogger();
    await engine.write();
  } catch (error) {
    throw new RenderError(error);
  } finally {
    rmSync(plan, { force: true });
  }
}

function copyAssets(folder: string, root: string): void {
  const require = createRequire(path.join(root, "package.json"));
  const assets = path.join(folder, "assets");
  for (const name of ["site.css", "icon.svg"]) copy(path.join(root, "templates/assets", name), path.join(assets, name));
  const face = path.dirname(require.resolve("@fontsource/source-sans-3/package.json"));
  for (const font of FONTS) copy(path.join(face, "files", font), path.join(assets, "fonts", font));
  copy(path.join(face, "LICENSE"), path.join(assets, "fonts/LICENSE-source-sans-3.txt"));
  const katex = path.join(path.dirname(require.resolve("katex/package.json")), "dist");
  writeText(path.join(assets, "katex.css"), onlyWoff2(readFileSync(path.join(katex, "katex.min.css"), "utf8")));
  for (const font of readdirSync(path.join(katex, "fonts")).filter((name) => name.endsWith(".woff2"))) {
    copy(path.join(katex, "fonts", font), path.join(assets, "fonts", font));
  }
  copy(path.join(katex, "../LICENSE"), path.join(assets, "fonts/LICENSE-katex.txt"));
}

/** The older font formats are left out: every browser that typesets these pages reads woff2. */
function onlyWoff2(css: string): string {
  return css.replace(/,url\([^)]*\) format\("(?:woff|truetype)"\)/g, "");
}

function copy(from: string, to: string): void {
  mkdirSync(path.dirname(to), { recursive: true });
  copyFileSync(from, to);
}

function writeText(file: string, text: string): void {
  mkdirSync(path.dirname(file), { recursive: true });
  writeFileSync(file, text);
}
