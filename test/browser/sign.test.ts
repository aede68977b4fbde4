import type { Browser } from "playwright-core";
import { afterAll, beforeAll, expect, test } from "vitest";
import { connectBrowser, openPage } from "../helpers/browser.ts";
import type { Pixels, Rgb } from "../helpers/browser-pixels.ts";
import { isSignBlue, pixelShare, pixelsOfPng } from "../helpers/browser-pixels.ts";
import { siteMade } from "../helpers/site-made.ts";
import { PAGE_TYPES } from "../helpers/site-page-types.ts";
import type { SiteServer } from "../helpers/site-server.ts";
import { serveSite } from "../helpers/site-server.ts";

let server: SiteServer;
let browser: Browser;
let sign: Pixels;

beforeAll(async () => {
  server = await serveSite(siteMade("site"));
  browser = await connectBrowser();
  const context = await browser.newContext({ deviceScaleFactor: 8, javaScriptEnabled: false });
  const { page } = await openPage(context, server.address + PAGE_TYPES["ear-protection"]);
  sign = await pixelsOfPng(await page.locator(".sign").screenshot());
});
afterAll(async () => {
  await browser?.close();
  await server?.close();
});

/** Relative luminance, WCAG 2.2. */
function luminance([red, green, blue]: Rgb): number {
  const linear = (part: number) => (part / 255 <= 0.04045 ? part / 255 / 12.92 : ((part / 255 + 0.055) / 1.055) ** 2.4);
  return 0.2126 * linear(red) + 0.7152 * linear(green) + 0.0722 * linear(blue);
}

function isWhite([red, green, blue]: Rgb): boolean {
  return red + green + blue === 3 * 255;
}

function mostFrequent(pixels: Pixels, among: (colour: Rgb) => boolean): Rgb {
  const counts = new Map<string, number>();
  for (let y = 0; y < pixels.height; y++)
    for (let x = 0; x < pixels.width; x++) {
      const colour = pixels.at(x, y);
      if (among(colour)) counts.set(colour.join(), (counts.get(colour.join()) ?? 0) + 1);
    }
  const [most = ["0,0,0", 0]] = [...counts].sort(([, a], [, b]) => b - a);
  const [red = 0, green = 0, blue = 0] = most[0].split(",").map(Number);
  return [red, green, blue];
}

const distance = (x: number, y: number) => Math.hypot(x + 0.5 - sign.width / 2, y + 0.5 - sign.height / 2) / sign.width;

// [read] S.I. 1996/341, Schedule 1, and Directive 92/58/EEC: round, a white picture on blue, blue at least half of the area.
// [derived] The drawing counted on a raster of 1000 × 1000: blue 66.4 %; one in a hundred is left to the soft edges of lines.
test("at least half of the sign's disc is blue", () => {
  expect(sign.width).toBe(sign.height);
  const share = pixelShare(sign, isSignBlue, (x, y) => distance(x, y) <= 0.5);
  expect(share).toBeGreaterThanOrEqual(0.5);
  expect(Math.abs(share - 0.664)).toBeLessThan(0.01);
});

// [read] BGV A8, Annex 2, 4.3: a light edge 0.025 of the diameter wide, which belongs to the sign.
test("the disc has a white edge", () => {
  const edge = pixelShare(sign, isWhite, (x, y) => distance(x, y) > 0.48 && distance(x, y) < 0.495);
  expect(edge).toBe(1);
});

// [derived] #004f9f against white: 8.0 : 1. WCAG 2.2 asks 4.5 : 1 of text (1.4.3) and 3 : 1 of pictures (1.4.11).
test("the picture is white and stands out", () => {
  const contrast = (1 + 0.05) / (luminance(mostFrequent(sign, isSignBlue)) + 0.05);
  expect(contrast).toBeGreaterThanOrEqual(4.5);
  expect(Math.abs(contrast - 8.0)).toBeLessThan(0.05);
  expect(pixelShare(sign, isWhite, (x, y) => distance(x, y) < 0.45)).toBeGreaterThan(0.2);
});
