import { AxeBuilder } from "@axe-core/playwright";
import type { Browser, BrowserContext } from "playwright-core";
import { afterAll, beforeAll, expect, test } from "vitest";
import { connectBrowser, openPage } from "../helpers/browser.ts";
import { siteMade } from "../helpers/site-made.ts";
import type { PageType } from "../helpers/site-page-types.ts";
import { pageTypes } from "../helpers/site-page-types.ts";
import type { SiteServer } from "../helpers/site-server.ts";
import { serveSite } from "../helpers/site-server.ts";

let server: SiteServer;
let browser: Browser;
let context: BrowserContext;

beforeAll(async () => {
  server = await serveSite(siteMade("site"));
  browser = await connectBrowser();
  // The checker is a script that the test puts into the page; the page's policy does not keep the test out.
  context = await browser.newContext({ viewport: { width: 1280, height: 800 } });
});
afterAll(async () => {
  await browser?.close();
  await server?.close();
});

/**
 * Takes away what a page repeats: receptor points, steps, rows and equations after the first few. The checker needs a minute
 * for some ten thousand parts of equations; ids and names of the whole page are held by the test of its HTML.
 */
function thinPage(): void {
  for (const point of [...document.querySelectorAll("main > section:has(.steps)")].slice(1)) point.remove();
  for (const part of document.querySelectorAll(".steps > li:nth-child(n+7), tbody > tr:nth-child(n+9)")) part.remove();
  for (const title of [...document.querySelectorAll("h3[id^=equation-]")].slice(8)) {
    for (let next = title.nextElementSibling; next && next.tagName !== "H3"; next = title.nextElementSibling)
      next.remove();
    title.remove();
  }
}

/** Rules that the checker cannot decide, by page type, and why. */
const LEFT_OPEN: Readonly<Record<PageType, readonly string[]>> = {
  home: [],
  project: [],
  statement: [],
  // Contrast of single letters in equations: they have the ink of the text around them.
  workings: ["color-contrast"],
  "ear-protection": [],
  "data sheet": [],
  "limit set": [],
  "duty set": [],
  calculation: ["color-contrast"],
};

test.each(pageTypes)("%s has nothing that keeps anybody out", async (type, file) => {
  const { page } = await openPage(context, server.address + file);
  try {
    await page.evaluate(thinPage);
    const { violations, incomplete } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(" ")}`)).toEqual([]);
    expect(incomplete.map(({ id }) => id).sort()).toEqual(LEFT_OPEN[type]);
  } finally {
    await page.close();
  }
});
