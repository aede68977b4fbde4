import { readFileSync } from "node:fs";
import { expect } from "vitest";

interface CheckValue {
  readonly id: string;
  readonly expected: number | readonly number[];
  readonly tolerance: number;
  readonly source: string;
  readonly status: string;
}

const file = new URL("../reference/acoustics-check-values.json", import.meta.url);
const values = JSON.parse(readFileSync(file, "utf8")) as readonly CheckValue[];

/** Holds one value or a list of them against a row of the acoustic check values, within the tolerance the row states. */
export function expectCheckValue(id: string, actual: number | readonly number[]): void {
  const row = values.find((each) => each.id === id);
  if (!row) throw new Error(`there is no check value "${id}"`);
  const expected = [row.expected].flat();
  const computed = [actual].flat();
  expect(computed, `${id} has ${expected.length} values`).toHaveLength(expected.length);
  for (const [index, value] of expected.entries()) {
    const message = `${id} [${row.status}] ${row.source}: expected ${value}, received ${computed[index]}`;
    // A billionth for double precision where the row allows nothing at all.
    expect(Math.abs((computed[index] ?? Number.NaN) - value), message).toBeLessThanOrEqual(row.tolerance + 1e-9);
  }
}
