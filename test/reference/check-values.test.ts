import { describe, expect, test } from "vitest";
import { compareRow } from "./compare-row.ts";
import type { ReferenceRow, TestedRows } from "./row.ts";
import { tables } from "./tables.ts";

describe.each(tables)("the check values of $name", ({ rows, groups, count }) => {
  test("are all tested or left out with a reason", () => {
    const listed = groups.flatMap((group) => group.ids);
    expect(rows.size).toBe(count);
    expect([...listed].sort()).toEqual([...rows.keys()].sort());
  });

  const testedRows = groups
    .filter((group) => group.kind === "tested")
    .flatMap((group) => group.ids.map((id) => [id, group, rows.get(id)] as const))
    .filter((entry): entry is readonly [string, TestedRows, ReferenceRow] => entry[2] !== undefined);

  test.each(testedRows)("%s", (_, group, row) => {
    const comparisons = compareRow(group, row);
    expect(comparisons.length).toBeGreaterThan(0);
    for (const { computed, expected, allowed } of comparisons) {
      const message = `${row.source} [${row.status}] gives ${expected} ${row.unit}, computed ${computed}`;
      expect(Math.abs(computed - expected), message).toBeLessThanOrEqual(allowed);
    }
  });
});
