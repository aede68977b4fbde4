import path from "node:path";
import { pathToFileURL } from "node:url";
import type { Browser, BrowserContext } from "playwright-core";
import { afterAll, beforeAll, expect, test } from "vitest";
import { connectBrowser, openPage } from "../helpers/browser.ts";
import { siteMade } from "../helpers/site-made.ts";
import { pageTypes } from "../helpers/site-page-types.ts";

let browser: Browser;
let context: BrowserContext;

beforeAll(async () => {
  browser = await connectBrowser();
  context = await browser.newContext({ javaScriptEnabled: false, viewport: { width: 1280, height: 800 } });
});
afterAll(() => browser?.close());

const EQUATIONS = new Set(["workings", "calculation"]);

test.each(pageTypes)(
  "%s opens from a folder with its styles and fonts, under the strict policy",
  async (type, file) => {
    const { page, requests, said } = await openPage(context, pathToFileURL(path.join(siteMade("site"), file)).href);
    try {
      expect(said).toEqual([]);
      expect(requests.filter(({ address }) => !address.startsWith("file:///"))).toEqual([]);
      const { family, fonts, sheets } = await page.evaluate(() => ({
        family: getComputedStyle(document.body).fontFamily,
        fonts: [...document.fonts].filter(({ status }) => status === "loaded").map((font) => font.family),
        sheets: [...document.styleSheets].map(({ href }) => (href ?? "").split("/").at(-1)),
      }));
      expect(family).toMatch(/^"Source Sans 3", /);
      expect(fonts).toContain("Source Sans 3");
      expect(sheets).toEqual(EQUATIONS.has(type) ? ["site.css", "katex.css", "equations.css"] : ["site.css"]);
      if (EQUATIONS.has(type)) {
        expect(fonts).toContain("KaTeX_Main");
        const family = await page
          .locator(".katex")
          .first()
          .evaluate((element) => getComputedStyle(element).fontFamily);
        expect(family).toMatch(/^KaTeX_Main, /);
      }
    } finally {
      await page.close();
    }
  },
);
