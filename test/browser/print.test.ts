import type { Browser, BrowserContext } from "playwright-core";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { connectBrowser, openPage } from "../helpers/browser.ts";
import { isSignBlue, pixelShare, pixelsOf } from "../helpers/browser-pixels.ts";
import type { PrintedPdf } from "../helpers/pdf.ts";
import { readPdf } from "../helpers/pdf.ts";
import { siteMade } from "../helpers/site-made.ts";
import { PAGE_TYPES } from "../helpers/site-page-types.ts";
import type { SiteServer } from "../helpers/site-server.ts";
import { serveSite } from "../helpers/site-server.ts";

let server: SiteServer;
let browser: Browser;
let context: BrowserContext;

beforeAll(async () => {
  server = await serveSite(siteMade("site"));
  browser = await connectBrowser();
  context = await browser.newContext({ javaScriptEnabled: false });
});
afterAll(async () => {
  await browser?.close();
  await server?.close();
});

/** A4 in points; printers' software rounds to whole ones. */
const A4 = [(210 / 25.4) * 72, (297 / 25.4) * 72] as const;
const NOTICE = [
  "Ear protection must be worn",
  "For everyone working on or visiting the site.",
  "Protectors are available and must be worn.",
];

/** Width of an A4 sheet between its margins of 15 mm, in px of 1/96 inch. */
const SHEET_PX = Math.floor(((210 - 2 * 15) / 25.4) * 96);

interface PrintedTables {
  readonly count: number;
  /** Names of tables that reach over the sheet's edge. */
  readonly tooWide: readonly string[];
  /** How rows behave at the end of a sheet. */
  readonly rowBreaks: readonly string[];
}

function printedTables(): PrintedTables {
  const tables = [...document.querySelectorAll("table")];
  const edge = document.body.getBoundingClientRect().right + 1;
  const isTooWide = (table: Element) =>
    [table, ...table.querySelectorAll("td, th")].some((part) => part.getBoundingClientRect().right > edge);
  const rows = [...document.querySelectorAll("tr")];
  return {
    count: tables.length,
    tooWide: tables.filter(isTooWide).map((table) => table.caption?.textContent ?? ""),
    rowBreaks: [...new Set(rows.map((row) => getComputedStyle(row).breakInside))],
  };
}

describe.each(["statement", "workings", "ear-protection"] as const)("%s in print", (type) => {
  let pdf: PrintedPdf;
  let tables: PrintedTables;
  beforeAll(async () => {
    const { page } = await openPage(context, server.address + PAGE_TYPES[type]);
    pdf = await readPdf(await page.pdf({ preferCSSPageSize: true, tagged: true }));
    await page.emulateMedia({ media: "print" });
    await page.setViewportSize({ width: SHEET_PX, height: 1000 });
    tables = await page.evaluate(printedTables);
    await page.close();
  });

  test("keeps tables on the sheet and rows whole", () => {
    expect(tables.count).toBeGreaterThan(0);
    expect(tables.tooWide).toEqual([]);
    expect(tables.rowBreaks).toEqual(["avoid"]);
  });

  test("is A4 and tagged", () => {
    expect(pdf.isTagged).toBe(true);
    for (const [width, height] of pdf.sizesPt) {
      expect(Math.abs(width - A4[0])).toBeLessThan(1);
      expect(Math.abs(height - A4[1])).toBeLessThan(1);
    }
  });

  test("has the notice in its text, and the seal", () => {
    const text = pdf.texts.join(" ");
    for (const sentence of NOTICE) expect(text).toContain(sentence);
    expect(pdf.texts[0]).toContain(NOTICE[0]);
    expect(pdf.texts[0]).toMatch(/Seal ?[0-9a-f]{4} [0-9a-f]{4} [0-9a-f]{4}/);
  });

  test("has ink on its first page, and the sign in blue", async () => {
    const pixels = pixelsOf(await pdf.firstPage(1));
    const ink = pixelShare(pixels, ([red, green, blue]) => red + green + blue < 3 * 200);
    expect(ink).toBeGreaterThan(0.01);
    expect(ink).toBeLessThan(0.5);
    // A sign 20 mm across, half of it blue: π/4 · 20² / 2 of the 210 · 297 mm² of the page.
    expect(pixelShare(pixels, isSignBlue)).toBeGreaterThan(0.0025);
  });
});
