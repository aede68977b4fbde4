import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { expect, onTestFinished, test } from "vitest";
import { typicalPages } from "../../compute/command/typical-pages.ts";

test("one page stands for each type, that in force for all revisions", () => {
  const folder = mkdtempSync(path.join(tmpdir(), "typical-"));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  const files = [
    "index.html",
    "assets/site.css",
    "calculation/index.html",
    "limits/consent/index.html",
    "data-sheets/plant/crane/index.html",
    "quay/index.html",
    "quay/piling/index.html",
    "quay/piling/workings/index.html",
    "quay/piling/r1/index.html",
    "quay/piling/r1/workings/index.html",
    "quay/piling/r1/ear-protection/index.html",
  ];
  for (const file of files) {
    mkdirSync(path.dirname(path.join(folder, file)), { recursive: true });
    writeFileSync(path.join(folder, file), "");
  }
  expect(typicalPages(folder).map(({ type, file }) => `${type} ${file}`)).toEqual([
    "home index.html",
    "project quay/index.html",
    "statement quay/piling/index.html",
    "workings quay/piling/workings/index.html",
    "plant-sheet data-sheets/plant/crane/index.html",
    "limit-set limits/consent/index.html",
    "calculation calculation/index.html",
  ]);
});
