import { readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { siteMade } from "../helpers/site-made.ts";
import { printedNumber } from "../helpers/site-numbers.ts";
import type { PageElement } from "../helpers/site-page.ts";
import { parsePage, textOf } from "../helpers/site-page.ts";
import { sealedRevision } from "../helpers/site-revision.ts";

const folder = siteMade("site");
/** Noise of floating point where a value lies on the edge between two printed digits. */
const EDGE = 1e-9;

function meets(printed: string, value: number, what: string): void {
  const { value: shown, half } = printedNumber(printed);
  expect(Math.abs(shown - value), `${what}: printed ${printed}, sealed ${value}`).toBeLessThanOrEqual(half + EDGE);
}

const places = ["saltpan-quay/breaking-out", "saltpan-quay/sheet-piling"].flatMap((at) => [at, `${at}/r1`]);

describe.each(places)("numbers on the pages of %s", (at) => {
  const sealed = sealedRevision(folder, at);
  const page = (name: string) => parsePage(readFileSync(path.join(folder, at, name, "index.html"), "utf8"));
  const statement = page("");
  const workings = page("workings");
  const ear = page("ear-protection");
  const sealedValue = (key: string) => {
    const figure = sealed.figures.find((each) => each.key === key);
    if (!figure) throw new Error(`there is no figure ${key}`);
    return figure.value;
  };
  const cells = (row: PageElement) => statement.all("td", row).map(textOf);

  test.each([
    ["statement", statement],
    ["workings", workings],
  ] as const)("each judged level of the %s is the sealed one", (_, on) => {
    expect(sealed.periods.length).toBeGreaterThan(3);
    for (const { key } of sealed.periods) {
      const [level = "", limit = "", stands = "", without = "", reduction = ""] = cells(on.withId(key));
      const other = (quantity: string, controls: string) =>
        sealedValue([quantity, ...key.split("/").slice(1, 5), controls].join("/"));
      const limitDb = other("limit", "all");
      const levelDb = sealedValue(key);
      const [shown = "", about = ""] = level.split(" about ");
      // "just over 75.0" stands for a level that would print as the limit or less.
      if (shown.startsWith("just over ")) expect([shown, levelDb > limitDb]).toEqual([`just over ${limit}.0`, true]);
      else meets(shown, levelDb, key);
      if (about.startsWith("just over ")) expect([about, levelDb > limitDb]).toEqual([`just over ${limit}`, true]);
      else meets(about, levelDb, key);
      if (levelDb > limitDb)
        for (const text of [shown, about])
          expect(text.startsWith("just over ") || printedNumber(text).value > limitDb, `${key}: ${text}`).toBe(true);
      meets(limit, limitDb, `limit of ${key}`);
      expect(printedNumber(limit).value).toBe(limitDb);
      expect(stands.includes("over the limit"), stands).toBe(levelDb > limitDb);
      if (/ dB (over|below) the limit$/.test(stands)) meets(stands, Math.abs(levelDb - limitDb), `margin of ${key}`);
      meets(without, other("level", "none"), `without controls, ${key}`);
      meets(reduction, other("total-reduction", "all"), `all controls, ${key}`);
    }
  });

  test("each effect of a control on a judged level is the sealed one", () => {
    const effects = sealed.figures.filter(
      ({ quantity, period }) => (quantity === "insertion-loss" || quantity === "reduction") && period !== "window",
    );
    expect(effects.length).toBeGreaterThan(3);
    for (const { key, value } of effects) meets(textOf(statement.withId(key)), value, key);
  });

  test.each([
    ["statement", statement],
    ["workings", workings],
    ["ear-protection page", ear],
  ] as const)("each zone of the %s is the sealed one, up to the next whole metre", (_, on) => {
    expect(sealed.earProtection.zones.length).toBeGreaterThan(2);
    for (const { item, activity, zone, besideDba } of sealed.earProtection.zones) {
      const [mark = "", , beside = ""] = cells(on.withId(`zone-distance/LAeq/${item}/shift/${activity}/all`));
      meets(beside, besideDba, `level beside ${item}`);
      expect(/^\d+ m around/.test(mark), mark).toBe(zone.kind === "distance");
      if (zone.kind !== "distance") continue;
      const { value: metres } = printedNumber(mark);
      expect(Number.isInteger(metres)).toBe(true);
      expect(metres).toBeGreaterThanOrEqual(zone.distanceM - 1e-6);
      expect(metres - 1).toBeLessThan(zone.distanceM);
    }
  });

  test("the workings show every figure of the revision, unrounded", () => {
    const table = workings
      .all("tr", workings.withId("figures").parent as PageElement)
      .map((row) => [...workings.all("th", row).map(textOf), ...workings.all("td", row).map(textOf)]);
    const shown = new Map(table.map(([key = "", value = "", unit = ""]) => [key, `${value} ${unit}`]));
    for (const { key, value, unit } of sealed.figures) expect(shown.get(key), key).toBe(`${value} ${unit}`);
  });

  test("the seal is on every page of the revision", () => {
    const signs = sealed.digest.slice(0, 12).match(/.{4}/g)?.join(" ");
    for (const on of [statement, workings, ear]) {
      const [block] = on.withClass("title-block");
      expect(block && textOf(block)).toContain(signs);
    }
  });
});
