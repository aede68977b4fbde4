import { describe, expect, test } from "vitest";
import type { Wording } from "../../compute/documents/types/wording.gen.ts";
import type { StatementInputs } from "../../compute/statement/inputs.ts";
import type { Standing } from "../../templates/models/revision-view.ts";
import type { Writable } from "../helpers/scene-inputs.ts";
import { sceneInputs } from "../helpers/scene-inputs.ts";
import { parsePage, textOf } from "../helpers/site-page.ts";
import { renderPage } from "../helpers/site-render.ts";
import { pageWords, quieten, scenePages, sceneRevision } from "../helpers/site-scenes.ts";

type Alter = (inputs: Writable<StatementInputs>) => void;

// [derived] By hand, test/reference/worked-scene: the loudest place is 109.365 dB(A), 1 m from the breaker, 6 dB of it for two
// walls inside its zone; a small zone has no wall in it: 103.365 less what is taken off. With a shift of 10 h and U = 3 dB the
// values 85 and 80 are met from 85 − 10 lg(10/8) − 3 = 81.031 and from 76.031, a law's 95 from 91.031.
const SCENES: readonly (readonly [
  name: string,
  kind: "mandatory" | "information" | "none",
  lead: RegExp,
  alter: Alter,
])[] = [
  ["as it stands", "mandatory", /makes ear protection compulsory/, () => undefined],
  ["1 dB over the value", "mandatory", /makes ear protection compulsory/, (inputs) => quieten(inputs, 21.3)],
  ["just under the value", "information", /^/, (inputs) => quieten(inputs, 22.4)],
  ["just over the lower value", "information", /^/, (inputs) => quieten(inputs, 27.3)],
  ["just under the lower value", "none", /^/, (inputs) => quieten(inputs, 27.4)],
  [
    "quiet, but with bangs that nobody has measured",
    "mandatory",
    /makes ear protection compulsory/,
    (inputs) => {
      quieten(inputs, 60);
      const saw = inputs.plant["floor-saw"];
      if (!saw) throw new Error("the scene has no saw");
      saw.emission.character.impulsive = true;
    },
  ],
  [
    "under the value of a law above 85 dB(A), over 85 dB(A)",
    "mandatory",
    /As good practice/,
    (inputs) => {
      quieten(inputs, 21);
      const set = inputs.duties["worked-scene-duties"];
      if (!set) throw new Error("the scene has no duty set");
      set.mandatoryFrom.levelDba = 95;
    },
  ],
];
const STANDINGS: readonly Standing[] = [{ kind: "in-force" }, { kind: "superseded", by: 2, from: "2027-01-11" }];

/** The notice of each page that has to carry it: statement, workings, ear-protection page. */
function notices(inputs: StatementInputs, standing: Standing = { kind: "in-force" }, wording: Wording = pageWords) {
  const pages = scenePages(sceneRevision(inputs, wording), standing);
  expect(pages.map(({ template }) => template)).toEqual(["statement", "workings", "ear-protection"]);
  return pages.map((page) => {
    const { withClass, all } = parsePage(renderPage(page));
    return {
      template: page.template,
      sections: withClass("notice"),
      none: withClass("notice-none"),
      signs: withClass("sign").map((sign) => all("title", sign).map(textOf).join()),
      headings: withClass("notice").map((section) => all("h2", section).map(textOf).join()),
      leads: withClass("notice-lead").map(textOf),
    };
  });
}

describe.each(SCENES)("%s", (_, kind, lead, alter) => {
  const inputs = sceneInputs(alter);

  test.each(STANDINGS)(`a revision $kind carries the notice "${kind}" on every page`, (standing) => {
    for (const { sections, none, signs, headings, leads } of notices(inputs, standing)) {
      const classes = sections.map(({ attribs }) => attribs.class);
      if (kind === "mandatory") {
        expect(classes).toEqual(["notice notice-mandatory"]);
        expect(headings).toEqual(["Ear protection must be worn"]);
        expect(signs).toEqual(["Mandatory sign: wear ear protection"]);
      } else if (kind === "information") {
        expect(classes).toEqual(["notice notice-information"]);
        expect(headings).toEqual(["Ear protection is available"]);
        expect(signs).toEqual([]);
      } else {
        expect(classes).toEqual([]);
        expect(none.map(textOf)).toEqual([expect.stringMatching(/^No machine of this phase comes near/)]);
      }
      if (kind !== "none") {
        expect(leads).toEqual([expect.stringMatching(/^For everyone working on or visiting the site\./)]);
        expect(leads[0]).toMatch(lead);
        expect(none).toEqual([]);
      }
    }
  });
});

/** What an author may write, choose or leave out without making anything quieter. */
const OPTIONS: readonly (readonly [name: string, alter: Alter])[] = [
  ["other texts", (inputs) => retell(inputs.project) ?? retell(inputs.statement)],
  [
    "no mark of an invented example",
    (inputs) => [inputs.project, inputs.statement].map((each) => Object.assign(each, { invented: false })),
  ],
  ["no controls", (inputs) => inputs.statement.controls.splice(0)],
  [
    "every control offered",
    (inputs) => inputs.statement.controls.map((each) => Object.assign(each, { state: { kind: "offered" } })),
  ],
  [
    "every enclosure closed and named",
    (inputs) =>
      inputs.statement.controls.map(
        (each) => each.kind === "enclosure" && Object.assign(each, { namedClosedOnNotice: true }),
      ),
  ],
  ["nobody to ask", (inputs) => inputs.statement.earProtection.entrances.splice(0)],
  ["no public ways", (inputs) => inputs.project.publicWays.splice(0)],
  ["no receptors", (inputs) => inputs.project.receptors.splice(0)],
  ["no limits", (inputs) => inputs.project.limitSets.splice(0)],
  [
    "plant that cannot run together",
    (inputs) =>
      inputs.statement.activities.map((each) =>
        Object.assign(each, { runTogether: { kind: "cannot", why: { en: "One driver." } } }),
      ),
  ],
  [
    "hardly any running time",
    (inputs) =>
      inputs.statement.activities.flatMap(({ plant }) => plant.map((item) => Object.assign(item, { onTimePct: 1 }))),
  ],
  [
    "short windows",
    (inputs) =>
      inputs.statement.activities.flatMap(({ windows }) =>
        windows.map((window) => Object.assign(window, { from: "09:00", to: "09:15" })),
      ),
  ],
  ["a short shift", (inputs) => Object.assign(inputs.statement, { shiftH: 1 })],
  ["a confirmed and an acknowledged level", (inputs) => confirm(inputs)],
  [
    "people kept out for every crossing",
    (inputs) =>
      inputs.statement.zoneAnswers.map((each) =>
        Object.assign(each, { answer: { kind: "kept-out", how: { en: "A fence." } } }),
      ),
  ],
];

/** Puts one word in the place of every text. */
function retell(value: unknown): void {
  if (typeof value !== "object" || value === null) return;
  for (const [key, part] of Object.entries(value)) {
    if (key === "en") Object.assign(value, { en: "Words" });
    else retell(part);
  }
}

function confirm({ project }: Writable<StatementInputs>): void {
  const document = "plant/rock-breaker";
  const by = { role: { en: "Adviser" }, organisation: { en: "Sluice Works" } };
  const date = "2026-11-30";
  const pointer = "/emission";
  Object.assign(project, {
    confirmed: [{ document, pointer, by, date, against: { document: "Test report", clause: "1" } }],
    acknowledged: [{ document, pointer, by, date, reason: { en: "Known from use." } }],
  });
}

describe("no content switches the notice off", () => {
  test.each(OPTIONS)("%s", (_, alter) => {
    const inputs = sceneInputs((all) => void alter(all));
    if (inputs.statement.zoneAnswers.length === 0) throw new Error("a zone without an answer is a mistake of its own");
    for (const { sections, signs } of notices(inputs)) {
      expect(sections.map(({ attribs }) => attribs.class)).toEqual(["notice notice-mandatory"]);
      expect(signs).toHaveLength(1);
    }
  });

  test("no word, however short", () => {
    const sections = Object.fromEntries(
      Object.entries(pageWords.sections).map(([name, words]) => [
        name,
        Object.fromEntries(Object.keys(words).map((key) => [key, "."])),
      ]),
    );
    for (const { sections: found, signs } of notices(
      sceneInputs(),
      { kind: "in-force" },
      { language: "en", sections },
    )) {
      expect(found.map(({ attribs }) => attribs.class)).toEqual(["notice notice-mandatory"]);
      expect(signs).toEqual(["."]);
    }
  });
});
