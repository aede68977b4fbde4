import { cpSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { runCommand } from "../helpers/site-command.ts";
import { printedNumber } from "../helpers/site-numbers.ts";
import type { PageElement, ParsedPage } from "../helpers/site-page.ts";
import { parsePage, textOf } from "../helpers/site-page.ts";
import type { HandScene } from "../reference/hand-work.ts";

// [derived] Worked out by hand in test/reference/worked-scene/worked-scene.md; nothing in expected.json comes from the program.
// Here the numbers are read from the pages, as a reader would, after the scene was issued and built.
const SCENE = "test/reference/worked-scene";
const PHASE = "tide-mill/sluice";
const BANDS = ["63", "125", "250", "500", "1000", "2000", "4000", "8000"];

interface Names {
  readonly activities: readonly {
    readonly id: string;
    readonly title: { readonly en: string };
    readonly plant: readonly { readonly id: string; readonly name: { readonly en: string } }[];
  }[];
}

const read = <T>(file: string) => JSON.parse(readFileSync(path.join(SCENE, file), "utf8")) as T;
const hand = read<HandScene>("expected.json");
const names = read<Names>("content/projects/tide-mill/sluice/statement.json");
const activityName = (id: string) => names.activities.find((each) => each.id === id)?.title.en ?? id;
const itemName = (id: string) =>
  names.activities.flatMap(({ plant }) => plant).find((item) => item.id === id)?.name.en ?? id;

let folder: string;
let statement: ParsedPage;
let workings: ParsedPage;
let ear: ParsedPage;

beforeAll(async () => {
  folder = mkdtempSync(path.join(tmpdir(), "worked-scene-"));
  const content = path.join(folder, "content");
  const site = path.join(folder, "site");
  cpSync(path.join(SCENE, "content"), content, { recursive: true });
  // The scene has no words for pages of its own.
  cpSync("content/wording", path.join(content, "wording"), { recursive: true });
  for (const command of [
    ["issue", PHASE, "--as-of", "2026-12-01", "--content", content],
    ["build", "--as-of", "2027-03-08", "--content", content, "--out", site],
  ]) {
    const { code, err } = await runCommand(command);
    if (code !== 0) throw new Error(err);
  }
  const page = (name: string) => parsePage(readFileSync(path.join(site, PHASE, name, "index.html"), "utf8"));
  statement = page("");
  workings = page("workings");
  ear = page("ear-protection");
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

/** Half a printed digit, and half a thousandth by which the hand value was rounded. */
function meets(printed: string, byHand: number, what: string): void {
  const { value, half } = printedNumber(printed);
  expect(Math.abs(value - byHand), `${what}: printed ${printed}, by hand ${byHand}`).toBeLessThanOrEqual(
    half + 0.0005 + 1e-9,
  );
}

function byHand(key: string): number {
  const figure = hand.figures.find((each) => each.key === key);
  if (!figure) throw new Error(`the hand work has no ${key}`);
  return figure.value;
}

const isJudged = (key: string) => key.startsWith("level/") && key.endsWith("/phase/all");
const judged = hand.figures.map(({ key }) => key).filter(isJudged);

describe("levels of the scene worked by hand, read from the pages", () => {
  test("there is one for each rule and receptor point", () => {
    expect(judged).toHaveLength(4);
  });

  test.each(judged)("%s", (key) => {
    const like = (quantity: string, controls: string) =>
      byHand([quantity, ...key.split("/").slice(1, 5), controls].join("/"));
    for (const page of [statement, workings]) {
      const [level = "", limit = "", stands = "", without = "", reduction = ""] = page
        .all("td", page.withId(key))
        .map(textOf);
      const [tenths = "", whole = ""] = level.split(" about ");
      const exceedance = like("exceedance", "all");
      meets(tenths, byHand(key), "level");
      meets(whole, byHand(key), "level in whole decibels");
      meets(limit, like("limit", "all"), "limit");
      expect(stands).toMatch(exceedance > 0 ? / dB over the limit$/ : / dB below the limit$/);
      meets(stands, Math.abs(exceedance), "margin");
      meets(without, like("level", "none"), "without controls");
      meets(reduction, like("total-reduction", "all"), "all controls together");
    }
  });

  const effects = hand.figures.filter(
    ({ key }) => /^(insertion-loss|reduction)\//.test(key) && !key.includes("/window/"),
  );
  test.each(effects)("$key", ({ key, value }) => {
    meets(textOf(statement.withId(key)), value, key);
  });

  test("every figure stands unrounded in the table of all figures", () => {
    const rows = workings.all("tr", workings.withId("figures").parent as PageElement);
    const shown = new Map(
      rows.map((row) => [workings.all("th", row).map(textOf).join(), workings.all("td", row).map(textOf)]),
    );
    expect(hand.figures).toHaveLength(75);
    for (const { key, value, unit } of hand.figures) {
      const [number = "", shownUnit = ""] = shown.get(key) ?? [];
      // The edge of a zone is halved down to a millimetre.
      const within = 0.0005 + (key.startsWith("zone-distance/") ? 0.001 : 0) + 1e-9;
      expect(Math.abs(Number(number) - value), `${key}: printed ${number}, by hand ${value}`).toBeLessThanOrEqual(
        within,
      );
      expect(shownUnit).toBe(unit);
    }
  });
});

describe("zones of the scene worked by hand, read from the pages", () => {
  test.each(hand.zones)("$item: $printedM m", ({ item, printedM }) => {
    const beside = hand.figures.find(({ key }) => key.startsWith(`beside-level/LAeq/${item}/`));
    for (const page of [statement, workings, ear]) {
      const row = page.withId(beside?.key.replace("beside-level", "zone-distance") ?? "");
      const [mark = "", , level = ""] = page.all("td", row).map(textOf);
      expect(mark).toMatch(new RegExp(`^${printedM} m around outline and swing`));
      meets(level, beside?.value ?? Number.NaN, `level beside ${item}`);
    }
  });

  test("the level at which zones end is printed", () => {
    const [said = ""] = statement
      .all("p")
      .map(textOf)
      .filter((text) => text.startsWith("Zones end where"));
    meets(said.match(/below ([\d.]+) dB\(A\)/)?.[1] ?? "", byHand("zone-edge/LAeq/site/shift/phase/all"), "edge");
  });

  test("the notice names each machine with its distance", () => {
    for (const page of [statement, workings, ear]) {
      const text = page.withClass("notice-mandatory").map(textOf).join();
      for (const { item, printedM } of hand.zones) expect(text).toContain(`${printedM} m around ${itemName(item)}`);
    }
  });
});

describe("term tables of the scene worked by hand, read from the workings", () => {
  const PATHS = {
    direct: /straight$/,
    over: /over Screen /,
    left: /round the left side of Screen /,
    right: /round the right side of Screen /,
    "left-then-over": /round the left side of .*, then over /,
    "right-then-over": /round the right side of .*, then over /,
    through: /through Screen /,
    reflected: /reflected by /,
  };

  test.each(hand.terms)("$item at $point", (terms) => {
    const section = workings.withId(terms.point).parent as PageElement;
    const title = `${itemName(terms.item)} (${activityName(terms.activity)}), `;
    const tables = workings
      .withClass("terms", section)
      .filter((table) => workings.all("caption", table).map(textOf).join().startsWith(title));
    expect(tables).toHaveLength(1);
    const [head = [], ...rows] = workings
      .all("tr", tables[0] as PageElement)
      .map((row) => row.children.flatMap((cell) => ("name" in cell ? [textOf(cell as PageElement)] : [])));
    expect(head.slice(1)).toEqual(BANDS);
    const row = (label: RegExp, values: readonly number[]) => {
      const found = rows.filter(([name = ""]) => label.test(name));
      expect(found, String(label)).toHaveLength(1);
      const cells = found[0]?.slice(1) ?? [];
      expect(cells).toHaveLength(values.length);
      for (const [band, value] of values.entries()) meets(cells[band] ?? "", value, `${label} at ${BANDS[band]} Hz`);
    };
    row(/^Sound power/, terms.powerDb);
    row(/^− enclosure/, terms.controlLossDb);
    row(
      /^− divergence/,
      BANDS.map(() => terms.divergenceDb),
    );
    row(/^− air/, terms.airDb);
    row(/^− ground/, terms.groundDb);
    for (const { kind, screenDb, capDb, levelDb } of terms.paths) {
      const of = (start: string) => new RegExp(`^${start}.*${PATHS[kind].source}`);
      if (kind !== "direct") row(of("− screen"), screenDb);
      // Where nothing is taken off, no row says so.
      if (capDb.some((value) => value !== 0)) row(of("− kept to the unscreened level"), capDb);
      row(of("= level"), levelDb);
    }
    const total = workings
      .all("p", section)
      .map(textOf)
      .filter((text) => text.startsWith("Together over all paths"));
    const place = workings.withClass("terms", section).indexOf(tables[0] as PageElement);
    meets(total[place]?.match(/: ([\d.]+) dB\(A\)/)?.[1] ?? "", terms.levelDba, "level while running");
  });

  test("shares of time", () => {
    // The tables that have a column of shares stand in the order of receptor points and rules, as the hand work does.
    const tables = workings
      .all("table")
      .filter((table) => workings.all("th", table).map(textOf).includes("Share of the period, %"));
    const rules = [...new Set(hand.shares.map(({ rule }) => rule))];
    expect(tables).toHaveLength(rules.length);
    for (const [index, table] of tables.entries()) {
      const rows = workings.all("tr", table).slice(1);
      const own = hand.shares.filter(({ rule }) => rule === rules[index]);
      expect(rows.map((row) => workings.all("th", row).map(textOf).join())).toEqual(
        own.map(({ item }) => itemName(item)),
      );
      for (const [place, { item, share }] of own.entries())
        meets(workings.all("td", rows[place]).map(textOf)[3] ?? "", 100 * share, `share of ${item}, ${rules[index]}`);
    }
  });
});
