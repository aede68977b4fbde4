import { readFileSync } from "node:fs";
import path from "node:path";
import { HtmlValidate, StaticConfigLoader } from "html-validate";
import { describe, expect, test } from "vitest";
import { siteFiles } from "../helpers/site-files.ts";
import { htmlRules } from "../helpers/site-html-rules.ts";
import { siteMade } from "../helpers/site-made.ts";
import { parsePage, textOf } from "../helpers/site-page.ts";

const folder = siteMade("site");
const files = siteFiles(folder);
const pages = files.filter((file) => file.endsWith(".html"));
const text = (file: string) => readFileSync(path.join(folder, file), "utf8");
/** Nothing but the site's own styles, fonts and pictures; no script at all. */
const POLICY =
  "default-src 'none'; style-src 'self'; font-src 'self'; img-src 'self'; base-uri 'none'; form-action 'none'";

describe("the site", () => {
  test("has the pages of its addresses, each as index.html in a folder of its own", () => {
    const phases = ["breaking-out", "sheet-piling"];
    const ofRevision = ["", "workings/", "ear-protection/"];
    for (const phase of phases)
      for (const revision of ["", "r1/"])
        for (const page of ofRevision) expect(pages).toContain(`saltpan-quay/${phase}/${revision}${page}index.html`);
    for (const page of ["", "saltpan-quay/", "calculation/", "data-sheets/plant/crawler-crane/"])
      expect(pages).toContain(`${page}index.html`);
    for (const page of ["limits/merrow-haven-consent/", "duties/uk-noise-at-work-2005/"])
      expect(pages).toContain(`${page}index.html`);
    expect(pages.filter((page) => path.posix.basename(page) !== "index.html")).toEqual([]);
  });

  test("asks no other host for anything in its styles", () => {
    const styles = files.filter((file) => file.endsWith(".css"));
    expect(styles).toEqual(["assets/equations.css", "assets/katex.css", "assets/site.css"]);
    for (const style of styles) {
      expect(text(style)).not.toMatch(/@import|https?:|\/\//);
      for (const [, url = ""] of text(style).matchAll(/url\(["']?([^"')]*)["']?\)/g))
        expect(files, `${style} names ${url}`).toContain(path.posix.join("assets", url));
    }
  });

  test("says on the pages in force what the pages of that revision say", () => {
    const inForce = pages.filter((page) => pages.includes(page.replace(/^([^/]+\/[^/]+\/)/, "$1r1/")));
    expect(inForce.length).toBeGreaterThanOrEqual(6);
    // The demo has revisions 1 in force alone: their pages differ in their place, so in the way back and in links, only.
    const withoutPlace = (html: string) => html.replace(/(href|src)="[^"]*"/g, "$1");
    for (const page of inForce) {
      const sealed = page.replace(/^([^/]+\/[^/]+\/)/, "$1r1/");
      expect(withoutPlace(text(sealed)) === withoutPlace(text(page)), `${sealed} differs from ${page}`).toBe(true);
    }
  });
});

describe.each(pages)("%s", (page) => {
  const html = text(page);
  const { all } = parsePage(html);

  test("is valid HTML", async () => {
    const validator = new HtmlValidate(new StaticConfigLoader(htmlRules));
    const { results } = await validator.validateString(html, page);
    const messages = results.flatMap((result) =>
      result.messages.map(({ line, ruleId, message }) => `${line} ${ruleId}: ${message}`),
    );
    expect(messages).toEqual([]);
  });

  test("has a language, a title, a description and the strict policy", () => {
    expect(all("html").map((element) => element.attribs.lang)).toEqual(["en"]);
    const [title, ...more] = all("title").filter((element) => element.parent === all("head")[0]);
    expect(more).toEqual([]);
    expect(title && textOf(title)).toMatch(/\S{3}/);
    expect(all("h1").map(textOf)).toEqual([title && textOf(title)]);
    const meta = (key: string, value: string) =>
      all("meta")
        .filter((element) => element.attribs[key] === value)
        .map((element) => element.attribs.content);
    expect(meta("name", "description")).toEqual([expect.stringMatching(/^\S.{20,}\.$/)]);
    expect(meta("http-equiv", "Content-Security-Policy")).toEqual([POLICY]);
  });

  test("has no script and no style of its own", () => {
    expect(all("script")).toEqual([]);
    expect(all("style")).toEqual([]);
    const own = all("*").filter(({ attribs }) =>
      Object.keys(attribs).some((name) => name === "style" || name.startsWith("on")),
    );
    expect(own.map(({ name, attribs }) => `${name} ${JSON.stringify(attribs)}`)).toEqual([]);
  });

  test("links to files of the site by their names", () => {
    const links = all("*").flatMap(({ attribs }) => [
      attribs.href,
      attribs.src,
      attribs.srcset,
      attribs.action,
      attribs.data,
    ]);
    const ways = links.filter((link) => link !== undefined && !/^(#|tel:|mailto:)/.test(link)) as string[];
    expect(ways.length).toBeGreaterThan(0);
    for (const way of ways) {
      expect(way, "a way from this page").toMatch(/^\.{1,2}\/|^[a-z]/);
      expect(way).not.toMatch(/^[a-z]+:|^\/|\\/);
      const target = path.posix.join(path.posix.dirname(page), way.split("#")[0] ?? "");
      expect(files, way).toContain(target);
    }
  });
});

test.each(pages.filter((page) => /^(index|saltpan-quay|limits)\b/.test(page)))(
  "%s says that it is invented",
  (page) => {
    expect(parsePage(text(page)).withClass("invented").map(textOf)).toEqual(["Invented example"]);
  },
);
