import { readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { loadValid } from "../../compute/command/load-valid.ts";
import { zoneMetres } from "../../compute/figures/display.ts";
import { resolvedPath } from "../../compute/figures/resolved-path.ts";
import { makeRevision } from "../../compute/record/make-revision.ts";
import type { HandScene, HandTerms } from "./hand-work.ts";

/** The hand values are rounded to three decimals: half a unit of the last one, and floating-point noise. */
const ROUNDED = 0.0005 + 1e-9;
/** The program halves the edge of a zone down to a millimetre and takes the outer side. */
const HALVED_M = 0.001;

function near(actual: number, hand: number, within: number, what: string): void {
  expect(Math.abs(actual - hand), `${what}: by hand ${hand}, by the program ${actual}`).toBeLessThanOrEqual(within);
}

const nameOf = (terms: { activity: string; item: string; point: string }) =>
  `${terms.activity} ${terms.item} ${terms.point}`;

/** Holds the program against a scene worked out by hand: `content/` and `expected.json` of a folder, and how much stands there. */
export function holdAgainstHandWork(
  folder: string,
  counts: { readonly figures: number; readonly terms: number },
): void {
  const expected = JSON.parse(readFileSync(path.join(folder, "expected.json"), "utf8")) as HandScene;
  const checked = loadValid(path.relative(process.cwd(), path.join(folder, "content")));
  if (checked.kind === "invalid") throw new Error(JSON.stringify(checked.mistakes));
  const draft = checked.drafts[0];
  if (!draft) throw new Error("the scene has no draft");
  const revision = makeRevision(draft.inputs, Object.fromEntries(checked.content.wording), {
    number: 1,
    issuedOn: "2026-12-01",
    toolVersion: "0.0.0",
  });

  describe("the scene worked out by hand", () => {
    test("has the figures of the hand work and no others", () => {
      expect(revision.figures.map(({ key }) => key).sort()).toEqual(expected.figures.map(({ key }) => key).sort());
      expect(expected.figures).toHaveLength(counts.figures);
    });

    test.each(expected.figures)("$key", ({ key, value, unit }) => {
      const figure = revision.figures.find((each) => each.key === key);
      expect(figure?.unit).toBe(unit);
      near(figure?.value ?? Number.NaN, value, key.startsWith("zone-distance/") ? ROUNDED + HALVED_M : ROUNDED, key);
    });

    test("has a term table for each source and receptor point", () => {
      expect(revision.terms.map(nameOf).sort()).toEqual(expected.terms.map(nameOf).sort());
      expect(expected.terms).toHaveLength(counts.terms);
    });

    test.each(expected.terms)("terms of $item at $point", (hand: HandTerms) => {
      const terms = revision.terms.find((each) => nameOf(each) === nameOf(hand));
      if (!terms) throw new Error("no such terms");
      const list = (what: string, stored: readonly number[], values: readonly number[]) => {
        expect(stored, what).toHaveLength(values.length);
        // Both sides are whole thousandths, each rounded once from the same unrounded value.
        for (const [band, value] of values.entries())
          near((stored[band] ?? Number.NaN) / 1000, value, 1e-9, `${what}, band ${band}`);
      };
      list("sound power", terms.powerDb, hand.powerDb);
      list("control loss", terms.controlLossDb, hand.controlLossDb);
      list("divergence and level", [terms.divergenceDb, terms.levelDba], [hand.divergenceDb, hand.levelDba]);
      list("air", terms.airDb, hand.airDb);
      list("ground", terms.groundDb, hand.groundDb);
      const name = (each: { kind: string; past: readonly string[] }) => [each.kind, ...each.past].join(" ");
      expect(terms.paths.map(name)).toEqual(hand.paths.map(name));
      for (const [index, way] of hand.paths.entries()) {
        const stored = terms.paths[index];
        if (!stored) throw new Error("no such path");
        const path = resolvedPath(terms, stored);
        list(`screen, ${name(way)}`, path.screenDb, way.screenDb);
        list(`cap, ${name(way)}`, path.capDb, way.capDb);
        list(`level, ${name(way)}`, path.levelDb, way.levelDb);
        expect(stored.own !== undefined).toBe(way.own !== undefined);
        if (!way.own) continue;
        list(`divergence, ${name(way)}`, [path.divergenceDb], [way.own.divergenceDb]);
        list(`air, ${name(way)}`, path.airDb, way.own.airDb);
        list(`ground, ${name(way)}`, path.groundDb, way.own.groundDb);
        list(`reflection, ${name(way)}`, path.reflectionDb, way.own.reflectionDb);
      }
    });

    test("each figure of a period is made of the loudest day's activities with their shares of time", () => {
      const shares = revision.periods.flatMap((period) =>
        period.activities.flatMap(({ id, shares: own }) =>
          own.map(({ item, share }) => ({
            rule: period.rule.slice(period.rule.indexOf(".") + 1),
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
}
