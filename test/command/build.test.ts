import { mkdirSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { runCommand } from "../helpers/site-command.ts";
import type { ContentCopy } from "../helpers/site-content.ts";
import { contentCopy, contentsOf, namesIn } from "../helpers/site-content.ts";

const STATEMENT = "projects/saltpan-quay/breaking-out/statement.json";
const REVISION = "projects/saltpan-quay/breaking-out/issued/1.json";

/** Before the first revision: a site of two pages is made soon. */
const EARLY = "2020-01-01";

function build({ content, folder }: ContentCopy, asOf = EARLY) {
  return runCommand(["build", "--as-of", asOf, "--content", content, "--out", path.join(folder, "site")]);
}

/** A site that is not one, small enough to compare: the build knows a site by its first page. */
function lastSite({ folder }: ContentCopy): string {
  const site = path.join(folder, "site");
  mkdirSync(site);
  writeFileSync(path.join(site, "index.html"), "the last site");
  return site;
}

describe("a build that succeeds", () => {
  test("takes the last site's place, leaves nothing beside it, and tells its steps in plain lines", async () => {
    const copy = contentCopy();
    const site = lastSite(copy);
    const { code, out, err } = await build(copy, "2027-03-15");
    expect(err).toMatch(/^checking the content\nwriting \d+ pages\n$/);
    expect(out).toMatch(/^\d+ pages in .*site, as of 2027-03-15\n$/);
    expect(code).toBe(0);
    expect(readFileSync(path.join(site, "index.html"), "utf8")).toMatch(/^<!doctype html>/);
    expect(namesIn(copy.folder)).toEqual(["content", "site"]);
  });

  test("holds what was issued by its date: nothing before the first, with every sheet after", async () => {
    const copy = contentCopy();
    expect(await build(copy)).toMatchObject({ code: 0, out: expect.stringMatching(/^2 pages /) });
    expect(Object.keys(contentsOf(path.join(copy.folder, "site"))).filter((file) => file.endsWith(".html"))).toEqual([
      "calculation/index.html",
      "index.html",
    ]);
  });
});

/** What is wrong, how the content is spoilt, and what the build says. */
const MISTAKES: readonly (readonly [string, (copy: ContentCopy) => void, RegExp])[] = [
  [
    "an invalid document",
    ({ change }) => change(STATEMENT, '"shiftH": 9.5', '"shiftH": 95'),
    /breaking-out\/statement\.json:\d+:\d+ \/shiftH: expected .*, received 95\..*\nNothing was written; the last site stays\.\n$/,
  ],
  [
    "an unknown field",
    ({ change }) => change(STATEMENT, '"shiftH"', '"shiftHours": 9, "shiftH"'),
    /statement\.json:\d+:\d+ \/shiftHours: expected .*\nNothing was written; the last site stays\.\n$/,
  ],
  [
    "a revision changed by one sign",
    ({ change }) => change(REVISION, '"toolVersion":"0.1.0"', '"toolVersion":"0.1.1"'),
    /breaking-out\/issued\/1\.json: expected the digest [0-9a-f]{12}… that it was issued with, received [0-9a-f]{12}…\. The file was changed after issue: restore it, or issue a new revision\.\n$/,
  ],
  [
    "a missing word",
    ({ change }) =>
      change("wording/en.json", '"title": "How levels are calculated"', '"titel": "How levels are calculated"'),
    /content\/wording\/en\.json: expected the word "calculation\.title", received nothing\. Write every word that pages print\.\n$/,
  ],
  [
    "a word that a template prints is missing",
    ({ change }) => change("wording/en.json", '"lead": "Choose a project', '"leed": "Choose a project'),
    /\nindex\.html\.w\.lead: the page model has no such key\. Write the word in content\/wording if it is one \(w, common\), else mend the template or its model\.\n$/,
  ],
  [
    "a link that leads nowhere",
    ({ content }) => writeFileSync(path.join(content, "method/zz-more.md"), "## More\n\nSee [there](nowhere.html).\n"),
    /calculation\/index\.html: expected a link to a file of the site, received "nowhere\.html"\nThe last site stays\.\n$/,
  ],
  [
    "a gap in the text",
    ({ content }) => writeFileSync(path.join(content, "method/zz-more.md"), "## More\n\nLevel: {level} dB.\n"),
    /calculation\/index\.html: expected text, received "\{level\}"\nThe last site stays\.\n$/,
  ],
];

describe("a build that finds a mistake says so and keeps the last site", () => {
  test.each(MISTAKES)("%s", async (_, spoil, says) => {
    const copy = contentCopy();
    const site = lastSite(copy);
    spoil(copy);
    const { code, out, err } = await build(copy);
    expect(err).toMatch(says);
    expect(err).not.toMatch(/\n {4}at /);
    expect([code, out]).toEqual([1, ""]);
    expect(contentsOf(site)).toEqual({ "index.html": "the last site" });
    expect(namesIn(copy.folder)).toEqual(["content", "site"]);
  });

  test("a first build that finds a mistake writes nothing", async () => {
    const copy = contentCopy();
    copy.change(STATEMENT, '"shiftH": 9.5', '"shiftH": 95');
    expect(await build(copy)).toMatchObject({ code: 1, out: "" });
    expect(namesIn(copy.folder)).toEqual(["content"]);
  });
});

describe("a build that was interrupted", () => {
  test("between the two renames is mended at the next start, even if that finds a mistake", async () => {
    const copy = contentCopy();
    const site = lastSite(copy);
    renameSync(site, `${site}.old`);
    mkdirSync(`${site}.new`);
    writeFileSync(path.join(`${site}.new`, "half.html"), "half a page");
    copy.change(STATEMENT, '"shiftH": 9.5', '"shiftH": 95');
    expect(await build(copy)).toMatchObject({ code: 1, out: "" });
    expect(contentsOf(site)).toEqual({ "index.html": "the last site" });
    expect(namesIn(copy.folder)).toEqual(["content", "site"]);
  });

  test("while it wrote pages leaves nothing of them in the next site", async () => {
    const copy = contentCopy();
    const site = lastSite(copy);
    for (const rest of [`${site}.new`, `${site}.old`]) {
      mkdirSync(rest);
      writeFileSync(path.join(rest, "half.html"), "half a page");
    }
    expect(await build(copy)).toMatchObject({ code: 0 });
    expect(namesIn(copy.folder)).toEqual(["content", "site"]);
    expect(Object.keys(contentsOf(site))).not.toContain("half.html");
  });
});

describe("an output folder that is not a site", () => {
  test("is refused and keeps its files", async () => {
    const copy = contentCopy();
    const site = path.join(copy.folder, "site");
    mkdirSync(site);
    writeFileSync(path.join(site, "letter.txt"), "do not lose");
    const { code, out, err } = await build(copy);
    expect([code, out]).toEqual([1, ""]);
    expect(err).toMatch(
      /site: expected a new folder or a site made before, received a folder with other files\. Name another one with --out\.\n$/,
    );
    expect(contentsOf(site)).toEqual({ "letter.txt": "do not lose" });
    expect(namesIn(copy.folder)).toEqual(["content", "site"]);
  });

  test("is refused if it is a file", async () => {
    const copy = contentCopy();
    writeFileSync(path.join(copy.folder, "site"), "do not lose");
    const { code, out, err } = await build(copy);
    expect([code, out]).toEqual([1, ""]);
    expect(err).toMatch(
      /site: expected a new folder or a site made before, received a file\. Name another one with --out\.\n$/,
    );
    expect(readFileSync(path.join(copy.folder, "site"), "utf8")).toBe("do not lose");
  });
});
