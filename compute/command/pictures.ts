import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { pathToFileURL } from "node:url";
import type { BrowserContext } from "playwright-core";
import { startBrowser } from "./browser.ts";
import { buildSite } from "./build.ts";
import type { Command, Outcome, Place } from "./command.ts";
import { usage } from "./command.ts";
import { readOptions } from "./options.ts";
import { pdfPictures } from "./pdf-pictures.ts";
import { progressOn } from "./progress.ts";
import type { TypicalPage } from "./typical-pages.ts";
import { typicalPages } from "./typical-pages.ts";

/** A phone and a desk. */
const WIDTHS_PX = [360, 1280];
/** Browsers draw no picture that is taller than this. */
const TALLEST_PX = 12_000;

export const pictures: Command = {
  summary: "takes pictures of one page of each type, on screen and in print",
  help: `npm run pictures -- [--as-of YYYY-MM-DD] [--content DIR] [--out DIR]

Builds the site in a temporary folder and opens one page of each type in a browser: the whole page at 360 and at 1280 px, and in
print as PDF with its first pages as pictures. Takes the browser that CHROMIUM_PATH names, or /usr/bin/chromium, or the one of the
development packages.

  --as-of DATE   date that decides which revision is in force (today in the first project's time zone)
  --content DIR  content folder (content)
  --out DIR      folder of the pictures (.cache/pictures)
`,
  run: (args, place) => {
    const parsed = readOptions(args, { "as-of": "string", content: "string", out: "string" });
    if (parsed.kind === "wrong") return usage("pictures", parsed.problem);
    if (parsed.rest.length > 0)
      return usage("pictures", `expected no further words, received ${parsed.rest.join(" ")}`);
    const options = parsed.options as Readonly<Record<string, string | undefined>>;
    return takePictures(options.content ?? "content", options.out ?? ".cache/pictures", options["as-of"], place);
  },
};

async function takePictures(content: string, out: string, asOf: string | undefined, place: Place): Promise<Outcome> {
  const folder = mkdtempSync(path.join(tmpdir(), "pictures-"));
  const site = path.join(folder, "site");
  try {
    const built = await buildSite({ content, out: site, asOf }, place);
    if (built.code !== 0) return built;
    const { count, name } = await photographed(site, out);
    return { code: 0, out: `${count} pages in ${out}, taken with ${name}\n`, err: "" };
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

async function photographed(site: string, out: string): Promise<{ readonly count: number; readonly name: string }> {
  const { server, name } = await startBrowser();
  const progress = progressOn();
  try {
    const { chromium } = await import("playwright-core");
    const browser = await chromium.connect(server.wsEndpoint());
    const context = await browser.newContext({ javaScriptEnabled: false });
    const pages = typicalPages(site);
    mkdirSync(out, { recursive: true });
    for (const page of pages) {
      progress.tell(`${page.type}: ${page.file}`);
      await picturesOf(context, page, site, out);
    }
    await browser.close();
    return { count: pages.length, name };
  } finally {
    progress.done();
    await server.close();
  }
}

async function picturesOf(
  context: BrowserContext,
  { type, file }: TypicalPage,
  site: string,
  out: string,
): Promise<void> {
  const page = await context.newPage();
  for (const width of WIDTHS_PX) {
    await page.setViewportSize({ width, height: 800 });
    await page.goto(pathToFileURL(path.join(site, file)).href, { waitUntil: "load" });
    await page.evaluate(() => document.fonts.ready.then(() => undefined));
    const height = await page.evaluate(() => document.documentElement.scrollHeight);
    const clip = { x: 0, y: 0, width, height: Math.min(height, TALLEST_PX) };
    await page.screenshot({ path: path.join(out, `${type}-${width}.png`), fullPage: true, clip });
  }
  const pdf = await page.pdf({ preferCSSPageSize: true, tagged: true });
  await page.close();
  writeFileSync(path.join(out, `${type}-print.pdf`), pdf);
  for (const [index, png] of (await pdfPictures(pdf)).entries())
    writeFileSync(path.join(out, `${type}-print-${index + 1}.png`), png);
}
