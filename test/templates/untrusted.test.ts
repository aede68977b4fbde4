import { describe, expect, test } from "vitest";
import { markdown } from "../../templates/models/markdown.ts";
import { sceneInputs } from "../helpers/scene-inputs.ts";
import { parsePage, textOf } from "../helpers/site-page.ts";
import { renderPage } from "../helpers/site-render.ts";
import { pageWords, scenePages, sceneRevision } from "../helpers/site-scenes.ts";

const HOSTILE = `</p></td></h1><img src=x onerror="alert(1)"><script>alert('2')</script> {{ m.head }} &amp; "quoted"`;
/** Elements that pages are made of; anything else came in with a text. */
const FOREIGN = new Set(["img", "script", "iframe", "object", "embed", "form", "base"]);

/** Puts the hostile text in the place of every text of an author. */
function spoil(value: unknown): void {
  if (typeof value !== "object" || value === null) return;
  for (const [key, part] of Object.entries(value)) {
    if (key === "en") Object.assign(value, { en: HOSTILE });
    else spoil(part);
  }
}

const scene = sceneInputs((inputs) => {
  spoil(inputs);
  for (const contact of inputs.project.contacts) Object.assign(contact, { telephone: HOSTILE, email: HOSTILE });
});
const words = {
  language: "en",
  sections: Object.fromEntries(
    Object.entries(pageWords.sections).map(([name, section]) => [
      name,
      Object.fromEntries(Object.entries(section).map(([key, word]) => [key, `${word} <img src=x>`])),
    ]),
  ),
};

describe("texts are printed as they were written, never as HTML", () => {
  test.each([
    ["of an author", sceneRevision(scene), HOSTILE],
    ["of the wording", sceneRevision(sceneInputs(), words), "<img src=x>"],
  ] as const)("%s", (_, revision, text) => {
    for (const page of scenePages(revision)) {
      const parsed = parsePage(renderPage(page));
      const foreign = parsed.all("*").filter(({ name, attribs }) => FOREIGN.has(name) || "onerror" in attribs);
      expect(foreign.map(({ name }) => `${page.template}: ${name}`)).toEqual([]);
      expect(parsed.all("h1").map(textOf).join()).toContain(text);
    }
  });

  test("in Markdown", () => {
    const html = markdown(`# Levels\n\n${HOSTILE}\n\n<div onclick="x">a</div>\n\n[go](javascript:alert(1))\n`);
    const { all } = parsePage(html);
    expect([...new Set(all("*").map(({ name }) => name))].sort()).toEqual(["h1", "p"]);
    expect(all("a")).toEqual([]);
  });
});
