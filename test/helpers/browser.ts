import type { Browser, BrowserContext, Page } from "playwright-core";
import { chromium } from "playwright-core";
import { siteMade } from "./site-made.ts";

/** The browser that runs for all tests; fails with what to do if none could be started. */
export function connectBrowser(): Promise<Browser> {
  return chromium.connect(siteMade("browser"));
}

/** A page with everything it asked for and said. */
export interface WatchedPage {
  readonly page: Page;
  /** Address and status of each request; 0 where it failed. */
  readonly requests: readonly { readonly address: string; readonly status: number }[];
  /** Console messages and errors. */
  readonly said: readonly string[];
}

/** Opens an address in a new page and waits until styles and fonts are there. */
export async function openPage(context: BrowserContext, address: string): Promise<WatchedPage> {
  const page = await context.newPage();
  const requests: { address: string; status: number }[] = [];
  const said: string[] = [];
  page.on("console", (message) => said.push(`${message.type()}: ${message.text()}`));
  page.on("pageerror", (error) => said.push(`error: ${error.message}`));
  page.on("requestfailed", (request) => requests.push({ address: request.url(), status: 0 }));
  page.on("response", (response) => requests.push({ address: response.url(), status: response.status() }));
  await page.goto(address, { waitUntil: "load" });
  await page.evaluate(() => document.fonts.ready.then(() => undefined));
  return { page, requests, said };
}
