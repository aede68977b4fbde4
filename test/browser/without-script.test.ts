import type { Browser, BrowserContext } from "playwright-core";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { connectBrowser, openPage } from "../helpers/browser.ts";
import { siteMade } from "../helpers/site-made.ts";
import { pageTypes } from "../helpers/site-page-types.ts";
import type { SiteServer } from "../helpers/site-server.ts";
import { serveSite } from "../helpers/site-server.ts";

let server: SiteServer;
let browser: Browser;

beforeAll(async () => {
  server = await serveSite(siteMade("site"));
  browser = await connectBrowser();
});
afterAll(async () => {
  await browser?.close();
  await server?.close();
});

describe.each([360, 1280])("without JavaScript, %i px wide", (width) => {
  let context: BrowserContext;
  beforeAll(async () => {
    context = await browser.newContext({ javaScriptEnabled: false, viewport: { width, height: 800 } });
  });
  afterAll(() => context?.close());

  test.each(pageTypes)("%s", async (_, file) => {
    const { page, requests, said } = await openPage(context, server.address + file);
    try {
      expect(said).toEqual([]);
      expect(requests.filter(({ address, status }) => !address.startsWith(server.address) || status !== 200)).toEqual(
        [],
      );
      const asked = requests.map(({ address }) => address.slice(server.address.length));
      expect(asked).toEqual(
        expect.arrayContaining([file, "assets/site.css", expect.stringMatching(/source-sans-3.*woff2$/)]),
      );
      expect(await page.locator("h1").isVisible()).toBe(true);
      expect(await page.locator("main").isVisible()).toBe(true);
      expect((await page.locator("main").textContent())?.length).toBeGreaterThan(100);
      // Tables and equations may scroll inside a box of their own; the page may not.
      const { scrollWidth, clientWidth } = await page.evaluate(() => {
        const { scrollWidth, clientWidth } = document.scrollingElement as Element;
        return { scrollWidth, clientWidth };
      });
      expect(scrollWidth).toBeLessThanOrEqual(clientWidth);
      expect(clientWidth).toBe(width);
    } finally {
      await page.close();
    }
  });
});
