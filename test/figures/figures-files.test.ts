import { parse } from "csv-parse/sync";
import { describe, expect, test } from "vitest";
import { validator } from "../../compute/documents/validator.ts";
import { CSV_COLUMNS, figuresCsv } from "../../compute/figures/figures-csv.ts";
import { figuresFile } from "../../compute/figures/figures-file.ts";
import { demoRevisions } from "../helpers/demo-revisions.ts";
import { otherMethodRevision } from "../helpers/other-method.ts";

type Row = Readonly<Record<(typeof CSV_COLUMNS)[number], string>>;

const revisions = [...demoRevisions(), otherMethodRevision()];

test("the files that are read have reflected paths, a solid-angle index and a meteorological correction among them", () => {
  const terms = revisions.flatMap((revision) => revision.terms);
  expect(terms.some(({ paths }) => paths.some(({ kind }) => kind === "reflected"))).toBe(true);
  expect(terms.some(({ directivityDb }) => directivityDb > 0)).toBe(true);
  expect(terms.some(({ metDb }) => metDb > 0)).toBe(true);
});

describe.each(revisions.map((revision) => [revision.phase, revision] as const))("files of %s", (_, revision) => {
  const rows = parse(figuresCsv(revision), { columns: true }) as readonly Row[];
  const figures = rows.filter(({ row }) => row === "figure");
  const terms = rows.filter(({ row }) => row === "term");

  test("figures.csv names its columns once and has a row of either kind in every line", () => {
    expect(Object.keys(rows[0] ?? {})).toEqual([...CSV_COLUMNS]);
    expect(figures.length + terms.length).toBe(rows.length);
  });
  test("figures.csv has every figure once, unrounded", () => {
    expect(figures.map(({ figure, value, unit }) => [figure, Number(value), unit])).toEqual(
      revision.figures.map(({ key, value, unit }) => [key, value, unit]),
    );
  });
  test("every judged level can be made again from its term rows, as a spreadsheet would", () => {
    const levels = new Set(terms.map(({ figure }) => figure));
    expect([...levels].sort()).toEqual([...new Set(revision.periods.map(({ key }) => key))].sort());
    for (const key of levels) {
      const own = terms.filter(({ figure }) => figure === key);
      const energy = own.reduce(
        (sum, row) =>
          sum +
          Number(row.share) * 10 ** ((Number(row.path_level_db) + Number(row.a_weight_db) - Number(row.met_db)) / 10),
        0,
      );
      const value = 10 * Math.log10(energy) + Number(own[0]?.facade_db);
      // Path levels are whole thousandths: half a thousandth, and what two others leave beside it.
      expect(Math.abs(value - Number(own[0]?.value)), key).toBeLessThanOrEqual(0.0006);
    }
  });
  test("every path level is what its terms leave of the sound power", () => {
    for (const row of terms) {
      const db = (name: keyof Row) => Number(row[name]);
      const left =
        db("sound_power_db") -
        db("control_loss_db") -
        db("reflection_db") +
        db("directivity_db") -
        db("divergence_db") -
        db("air_db") -
        db("ground_db") -
        db("screen_db") -
        db("cap_db");
      // Ten numbers rounded to a thousandth: at most ten half-thousandths apart.
      expect(Math.abs(left - db("path_level_db")), JSON.stringify(row)).toBeLessThanOrEqual(0.005 + 1e-9);
    }
  });
  test("paths are numbered in each source's table and say what they are and what they pass", () => {
    const kinds = ["direct", "over", "left", "right", "left-then-over", "right-then-over", "through", "reflected"];
    for (const row of terms) {
      const [number = "", kind = ""] = row.path.split(" ");
      expect(Number(number)).toBeGreaterThan(0);
      expect(kinds).toContain(kind);
      expect(row.past === "", JSON.stringify(row)).toBe(kind === "direct");
      expect(Number(row.distance_m)).toBeGreaterThan(0);
    }
  });
  test("whole-period shares are on-time and hours", () => {
    for (const row of terms.filter(({ figure }) => figure.startsWith("level/LAeq/")))
      expect(Number(row.share)).toBeCloseTo(
        (Number(row.on_time_pct) / 100) * (Number(row.window_h) / Number(row.period_h)),
        12,
      );
  });
  test("figures.json is as its schema says, says which revision it is of, and has every figure", () => {
    const file = JSON.parse(JSON.stringify(figuresFile(revision))) as ReturnType<typeof figuresFile>;
    const check = validator("figures");
    expect(check(file), JSON.stringify(check.errors)).toBe(true);
    expect(file).toEqual({
      schemaVersion: revision.schemaVersion,
      project: revision.project,
      phase: revision.phase,
      revision: revision.number,
      issuedOn: revision.issuedOn,
      digest: revision.digest,
      figures: revision.figures,
    });
  });
});
