import { readFileSync } from "node:fs";
import path from "node:path";
import { parse } from "csv-parse/sync";
import { describe, expect, test } from "vitest";
import { revisionDigest } from "../../compute/record/digest.ts";
import { shapeProblem } from "../../compute/record/shape-problem.ts";
import { siteFiles } from "../helpers/site-files.ts";
import { siteMade } from "../helpers/site-made.ts";
import { sealedRevision } from "../helpers/site-revision.ts";

const folder = siteMade("site");
const text = (file: string) => readFileSync(path.join(folder, file), "utf8");
const folders = siteFiles(folder)
  .filter((file) => file.endsWith("/figures.json"))
  .map((file) => path.posix.dirname(file));

test("there are data files beside every statement, in force and sealed", () => {
  expect(folders).toEqual(
    ["breaking-out", "breaking-out/r1", "sheet-piling", "sheet-piling/r1"].map((each) => `saltpan-quay/${each}`),
  );
});

describe.each(folders)("%s", (at) => {
  const sealed = sealedRevision(folder, at);

  test("figures.json has the shape of its schema and the sealed figures", () => {
    const file = JSON.parse(text(`${at}/figures.json`)) as { digest: string; figures: unknown };
    expect(shapeProblem("figures", file)).toBeUndefined();
    expect(file.digest).toBe(sealed.digest);
    expect(file.figures).toEqual(sealed.figures);
  });

  test("figures.csv reads as a table with a row for each figure", () => {
    const rows = parse(text(`${at}/figures.csv`), { columns: true }) as Record<string, string>[];
    const figures = rows.filter(({ row }) => row === "figure");
    expect(figures.map(({ figure, value, unit }) => ({ key: figure, value: Number(value), unit }))).toEqual(
      sealed.figures.map(({ key, value, unit }) => ({ key, value, unit })),
    );
  });

  test("revision.json is the sealed file", () => {
    expect(revisionDigest(sealed)).toBe(sealed.digest);
    const own = path.join("content/projects", sealed.project, sealed.phase, `issued/${sealed.number}.json`);
    expect(JSON.parse(readFileSync(own, "utf8"))).toEqual(sealed);
  });
});
