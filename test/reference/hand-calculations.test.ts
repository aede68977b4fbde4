import { expect, test } from "vitest";
import { equationIds } from "../../compute/equations/registry.ts";
import { expectPrinted } from "../helpers/printed.ts";
import { handCalculations } from "./hand-calculations.ts";
import { tables } from "./tables.ts";

test.each(handCalculations)("$equation: $how", ({ computed, printed }) => {
  expectPrinted(computed(), printed);
});

/** Whether anything but memory stands behind a check of the equation. */
function isChecked(id: string): boolean {
  const inTables = tables.some(({ groups, rows }) =>
    groups.some(
      (group) =>
        group.kind === "tested" &&
        (group.equations as readonly string[]).includes(id) &&
        group.ids.some((row) => rows.get(row)?.status !== "memory"),
    ),
  );
  return (
    inTables || handCalculations.some(({ equation, mark }) => equation === id && mark !== "common practice, no source")
  );
}

test.each(equationIds)("%s is checked against something outside the project", (id) => {
  expect(isChecked(id), `${id}: give it a row in hand-calculations.ts`).toBe(true);
});
