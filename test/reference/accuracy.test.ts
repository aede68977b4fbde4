import { readFileSync, writeFileSync } from "node:fs";
import { expect, test } from "vitest";
import { accuracyTable } from "./accuracy-table.ts";

const START = "<!-- accuracy:start -->";
const END = "<!-- accuracy:end -->";
const file = new URL("../../README.md", import.meta.url);

/** A table without the padding that a formatter puts into its cells. */
function unpadded(table: string | undefined): string | undefined {
  return table?.trim().replaceAll(/ +\|/g, " |").replaceAll(/-{3,}/g, "---");
}

test("the accuracy table of the README is the one the reference tables give", () => {
  const readme = readFileSync(file, "utf8");
  const [before, rest] = readme.split(START);
  const [printed, after] = rest?.split(END) ?? [];
  expect(printed, `README.md: expected ${START} and ${END}`).toBeDefined();
  if (process.env.UPDATE_ACCURACY) writeFileSync(file, `${before}${START}\n${accuracyTable()}\n${END}${after}`);
  const now = process.env.UPDATE_ACCURACY ? accuracyTable() : printed;
  expect(unpadded(now), "run with UPDATE_ACCURACY=1 and look at what moved").toBe(accuracyTable());
});
