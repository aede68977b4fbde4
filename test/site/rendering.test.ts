import { readFileSync } from "node:fs";
import path from "node:path";
import { expect, test } from "vitest";
import { loadContent } from "../../compute/documents/load-content.ts";
import { issuedRevisions } from "../../compute/record/issued-revisions.ts";
import { siteOf } from "../../templates/models/site.ts";
import { siteFiles } from "../helpers/site-files.ts";
import { siteMade } from "../helpers/site-made.ts";
import { renderPage } from "../helpers/site-render.ts";
import { pageWords } from "../helpers/site-scenes.ts";

test("the site engine adds nothing to what the templates make of the models", () => {
  const loaded = loadContent("content");
  if (loaded.kind === "invalid") throw new Error(JSON.stringify(loaded.mistakes));
  const { method } = loaded.content;
  const { pages } = siteOf({ phases: issuedRevisions("content"), wording: pageWords, method, asOf: "2027-03-15" });
  const site = siteMade("site");
  expect(pages.map(({ file }) => file).sort()).toEqual(siteFiles(site).filter((file) => file.endsWith(".html")));
  const differing = pages.filter((page) => renderPage(page) !== readFileSync(path.join(site, page.file), "utf8"));
  expect(differing.map(({ file }) => file)).toEqual([]);
});
