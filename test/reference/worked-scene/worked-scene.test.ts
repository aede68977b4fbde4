import { readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { loadValid } from "../../../compute/command/load-valid.ts";
import { zoneMetres } from "../../../compute/figures/display.ts";
import { makeRevision } from "../../../compute/record/make-revision.ts";

// [derived] Worked out by hand in worked-scene.md from ISO 9613-1, ISO 9613-2:1996, Bies (7.103) and (7.111) and the rules for
// time shares and zones; nothing in expected.json comes from the program.
const folder = path.dirname(new URL(import.meta.url).pathname);

interface Expected {
  readonly figures: readonly { readonly key: string; readonly value: number; readonly unit: string }[];
  readonly terms: readonly ExpectedTerms[];
  readonly shares: readonly {
    readonly rule: string;
    readonly activity: string;
    readonly item: string;
    readonly share: number;
  }[];
  readonly zones: readonly {
    readonly item: string;
    readonly printedM: number;
    readonly nearField: boolean;
    readonly crossings: readonly string[];
  }[];
  readonly notice: { readonly kind: string; readonly by: string; readonly reasons: readonly string[] };
}
interface ExpectedTerms {
  readonly activity: string;
  readonly item: string;
  readonly point: string;
  readonly powerDb: readonly number[];
  readonly controlLossDb: readonly number[];
  readonly divergenceDb: number;
  readonly airDb: readonly number[];
  readonly groundDb: readonly number[];
  readonly paths: readonly {
    readonly path: string;
    readonly screenDb: readonly number[];
    readonly capDb: readonly number[];
    readonly levelDb: readonly number[];
  }[];
  readonly levelDba: number;
}

const expected = JSON.parse(readFileSync(path.join(folder, "expected.json"), "utf8")) as Expected;
const checked = loadValid(path.relative(process.cwd(), path.join(folder, "content")));
if (checked.kind === "invalid") throw new Error(JSON.stringify(checked.mistakes));
const draft = checked.drafts[0];
if (!draft) throw new Error("the worked scene has no draft");
const revision = makeRevision(draft.inputs, Object.fromEntries(checked.content.wording), {
  number: 1,
  issuedOn: "2026-12-01",
  toolVersion: "0.0.0",
});

/** The hand values are rounded to three decimals: half a unit of the last one, and floating-point noise. */
const ROUNDED = 0.0005 + 1e-9;
/** The program halves the edge of a zone down to a millimetre and takes the outer side. */
const HALVED_M = 0.001;

function near(actual: number, hand: number, within: number, what: string): void {
  expect(Math.abs(actual - hand), `${what}: by hand ${hand}, by the program ${actual}`).toBeLessThanOrEqual(within);
}

describe("the scene worked out by hand", () => {
  test("has the figures of the hand work and no others", () => {
    expect(revision.figures.map(({ key }) => key).sort()).toEqual(expected.figures.map(({ key }) => key).sort());
    expect(expected.figures).toHaveLength(75);
  });

  test.each(expected.figures)("$key", ({ key, value, unit }) => {
    const figure = revision.figures.find((each) => each.key === key);
    expect(figure?.unit).toBe(unit);
    near(figure?.value ?? Number.NaN, value, key.startsWith("zone-distance/") ? ROUNDED + HALVED_M : ROUNDED, key);
  });

  test("has a term table for each source and receptor point", () => {
    const name = (terms: { activity: string; item: string; point: string }) =>
      `${terms.activity} ${terms.item} ${terms.point}`;
    expect(revision.terms.map(name).sort()).toEqual(expected.terms.map(name).sort());
    expect(expected.terms).toHaveLength(6);
  });

  test.each(expected.terms)("terms of $item at $point", (hand) => {
    const terms = revision.terms.find(({ item, point }) => item === hand.item && point === hand.point);
    if (!terms) throw new Error("no such terms");
    const list = (what: string, stored: readonly number[], values: readonly number[]) => {
      expect(stored).toHaveLength(values.length);
      // Both sides are whole thousandths, each rounded once from the same unrounded value.
      for (const [band, value] of values.entries())
        near((stored[band] ?? Number.NaN) / 1000, value, 1e-9, `${what}, band ${band}`);
    };
    list("sound power", terms.powerDb, hand.powerDb);
    list("control loss", terms.controlLossDb, hand.controlLossDb);
    list("divergence and level", [terms.divergenceDb, terms.levelDba], [hand.divergenceDb, hand.levelDba]);
    list("air", terms.airDb, hand.airDb);
    list("ground", terms.groundDb, hand.groundDb);
    expect(terms.paths.map((each) => each.path)).toEqual(hand.paths.map((each) => each.path));
    for (const [index, { path: way, screenDb, capDb, levelDb }] of hand.paths.entries()) {
      list(`screen, ${way}`, terms.paths[index]?.screenDb ?? [], screenDb);
      list(`cap, ${way}`, terms.paths[index]?.capDb ?? [], capDb);
      list(`level, ${way}`, terms.paths[index]?.levelDb ?? [], levelDb);
    }
  });

  test("each figure of a period is made of the loudest day's activities with their shares of time", () => {
    const shares = revision.periods.flatMap((period) =>
      period.activities.flatMap(({ id, shares: own }) =>
        own.map(({ item, share }) => ({
          rule: period.rule.replace("tide-mill-consent.", ""),
          activity: id,
          item,
          share: Number(share.toFixed(6)),
        })),
      ),
    );
    expect(shares).toEqual(expected.shares);
  });

  test.each(expected.zones)("zone of $item", ({ item, printedM, nearField, crossings }) => {
    const zone = draft.figures.earProtection.zones.find((each) => each.item === item);
    if (zone?.zone.kind !== "distance") throw new Error(`${item} has no distance`);
    expect(zoneMetres(zone.zone.distanceM)).toBe(printedM);
    expect(zone.zone.nearField).toBe(nearField);
    expect(zone.crossings.map((each) => ("id" in each ? `${each.kind} ${each.id}` : each.kind))).toEqual(crossings);
  });

  test("notice", () => {
    const { notice } = draft.figures.earProtection;
    expect({ ...notice, reasons: notice.reasons.map((reason) => `${reason.kind} ${reason.machine}`) }).toEqual(
      expected.notice,
    );
  });
});
