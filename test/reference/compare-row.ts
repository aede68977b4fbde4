import type { ReferenceRow, TestedRows } from "./row.ts";

export interface Comparison {
  readonly computed: number;
  readonly expected: number;
  readonly allowed: number;
}

/**
 * Works a row out and sets each value beside the expected one. Of a row with named values only those that the
 * equations give are compared.
 */
export function compareRow(group: TestedRows, row: ReferenceRow): readonly Comparison[] {
  const computed = group.work(row.inputs as never);
  const { expected } = row;
  const tolerance = group.tolerance?.value ?? row.tolerance;
  if (typeof computed === "number") return [compare(row, tolerance, computed, expected as number, 0)];
  if (Array.isArray(expected)) {
    const values = computed as readonly number[];
    if (values.length !== expected.length) throw new Error(`${row.id}: ${values.length} values for ${expected.length}`);
    return expected.map((value, i) => compare(row, tolerance, values[i] as number, value as number, i));
  }
  const named = expected as Readonly<Record<string, number>>;
  return Object.entries(computed).map(([name, value]) => compare(row, tolerance, value, named[name] as number, 0));
}

function compare(
  row: ReferenceRow,
  tolerance: ReferenceRow["tolerance"],
  computed: number,
  expected: number,
  place: number,
): Comparison {
  if (typeof expected !== "number") throw new Error(`${row.id}: nothing to compare ${computed} with`);
  const relative = typeof tolerance === "string" ? /^([0-9.]+) % relative$/.exec(tolerance) : null;
  const stated = relative
    ? (Number(relative[1]) / 100) * Math.abs(expected)
    : Array.isArray(tolerance)
      ? tolerance[place]
      : tolerance;
  // A hundred-millionth of a millionth for double precision, where the row allows nothing at all.
  return { computed, expected, allowed: (stated as number) + 1e-12 * Math.max(1, Math.abs(expected)) };
}
