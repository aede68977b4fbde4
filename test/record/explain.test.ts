import { describe, expect, test } from "vitest";
import { explain } from "../../compute/record/explain.ts";
import { makeRevision } from "../../compute/record/make-revision.ts";
import { demoRevisions, ISSUE } from "../helpers/demo-revisions.ts";
import { otherMethodRevision } from "../helpers/other-method.ts";
import { sceneInputs } from "../helpers/scene-inputs.ts";

describe.each([...demoRevisions(), otherMethodRevision()].map((revision) => [revision.phase, revision] as const))(
  "every figure of %s",
  (_, revision) => {
    test("is worked out again as issued, with the terms that are stored", () => {
      expect(revision.figures.length).toBeGreaterThan(50);
      for (const { key, value } of revision.figures) {
        const explanation = explain(revision, key);
        expect(explanation?.figure.key).toBe(key);
        // Same documents, same equations, same order: only the last digits of a sum may differ.
        expect(Math.abs((explanation?.value ?? Number.NaN) - value), key).toBeLessThanOrEqual(1e-9);
        // Terms are stored as whole thousandths: half of one.
        expect(explanation?.termDifferenceDb, key).toBeLessThanOrEqual(0.0005 + 1e-9);
      }
    }, 120_000);
  },
);

describe("the chain of a figure", () => {
  const wording = { en: { language: "en", sections: { common: { invented: "Invented example" } } } };
  const revision = makeRevision(sceneInputs(), wording, ISSUE);
  const level = "level/LAeq/sluice-terrace.first-floor/tide-mill-consent.dwelling-day/phase/all";

  test("runs from sound power to the judged level, with the values of the hand work", () => {
    // [derived] worked-scene.md 5, 6, 8, 9: saw over and through the screen at 1 kHz; 10 lg 0.57; the sum of saw and pump; + 3 dB.
    const steps = explain(revision, level)?.steps ?? [];
    const value = (term: string, ...at: readonly string[]) =>
      steps.find((step) => step.term === term && at.every((place) => step.at.includes(place)))?.value;
    expect(value("divergence", "item:saw")).toBeCloseTo(44.897, 3);
    expect(value("ground", "item:saw", "band:1000")).toBeCloseTo(-2.296, 3);
    expect(value("screen", "item:saw", "path:over", "band:1000")).toBeCloseTo(5.639, 3);
    expect(value("path-level", "item:saw", "path:over", "band:1000")).toBeCloseTo(51.514, 3);
    expect(value("screen-index", "activity:sawing", "band:1000")).toBeCloseTo(21.25, 3);
    expect(value("path-level", "item:saw", "path:through-north-screen", "band:1000")).toBeCloseTo(35.903, 3);
    expect(value("item-level", "item:saw")).toBeCloseTo(57.677, 3);
    expect(value("period-share", "item:saw")).toBeCloseTo(57.677 + 10 * Math.log10(0.57), 3);
    expect(value("facade")).toBeCloseTo(58.584, 3);
  });
  test("leaves out what has no part in it: the breaker works on other days", () => {
    const steps = explain(revision, level)?.steps ?? [];
    expect(steps.some((step) => step.at.includes("item:breaker"))).toBe(false);
    expect(steps.some((step) => step.at.includes("item:pump"))).toBe(true);
  });
  test("ends in the documents it rests on, with their sources", () => {
    const documents = explain(revision, level)?.documents ?? [];
    const named = documents.map(({ document, pointer }) => `${document} ${pointer}`);
    expect(named).toEqual(
      expect.arrayContaining([
        "plant/floor-saw /emission",
        "plant/pit-pump /emission",
        "panels/house-wall ",
        "panels/screen-board ",
        "linings/bare-board ",
        "silencers/air-splitter ",
        "project /method",
        "project /receptors/0/points/0",
        "limits/tide-mill-consent /rules/0",
      ]),
    );
    expect(named.some((each) => each.includes("rock-breaker"))).toBe(false);
    expect(documents.find(({ document }) => document === "plant/floor-saw")?.source?.place).toBe("Plant, row 1");
  });
  test("a sheet that lends its octave shape is named too", () => {
    const documents = explain(revision, level)?.documents ?? [];
    expect(documents.map(({ document }) => document)).toContain("plant/diesel-set");
  });
  test("a stored term that was altered shows as a difference", () => {
    const altered = structuredClone(revision) as { -readonly [K in keyof typeof revision]: (typeof revision)[K] };
    const saw = altered.terms.find(({ item, point }) => item === "saw" && point.startsWith("sluice"));
    if (!saw) throw new Error("no terms of the saw");
    (saw.groundDb as number[])[4] = (saw.groundDb[4] ?? 0) + 100;
    expect(explain(altered, level)?.termDifferenceDb).toBeCloseTo(0.1, 3);
  });
  test("a key that the revision has not is not explained", () => {
    expect(explain(revision, "level/LAeq/nowhere/x/phase/all")).toBeUndefined();
  });
});
