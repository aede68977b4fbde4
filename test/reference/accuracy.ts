import { equationIds, equations } from "../../compute/equations/registry.ts";
import { compareRow } from "./compare-row.ts";
import { handCalculations } from "./hand-calculations.ts";
import { tables } from "./tables.ts";

/** How well one equation meets what it was checked against. */
export interface Accuracy {
  readonly id: string;
  readonly unit: string;
  /** Sources with their marks. */
  readonly against: readonly string[];
  readonly rows: number;
  /** In the unit of the equation; the rounding of printed tables is part of it. */
  readonly largestDifference: number;
}

interface Check {
  readonly id: string;
  readonly against: string;
  readonly mark: string;
  readonly difference: number;
}

function checksOfTables(): readonly Check[] {
  return tables.flatMap(({ groups, rows }) =>
    groups.flatMap((group) => {
      if (group.kind !== "tested" || group.equations.length === 0) return [];
      return group.ids.flatMap((rowId) => {
        const row = rows.get(rowId);
        if (!row) throw new Error(`no row ${rowId}`);
        const differences = compareRow(group, row).map(({ computed, expected }) => Math.abs(computed - expected));
        const difference = Math.max(...differences) * (group.toUnit ?? 1);
        return group.equations.map((id) => ({ id, against: group.against, mark: row.status, difference }));
      });
    }),
  );
}

function checksByHand(): readonly Check[] {
  return handCalculations.map(({ equation, mark, computed, printed }) => ({
    id: equation,
    against: "calculation by hand",
    mark,
    difference: Math.abs(computed() - Number(printed)),
  }));
}

/** What each equation was checked against, in how many rows, and the largest difference found. */
export function accuracy(): readonly Accuracy[] {
  const checks = [...checksOfTables(), ...checksByHand()];
  return [...equationIds].sort().map((id) => {
    const own = checks.filter((check) => check.id === id);
    return {
      id,
      unit: equations[id].value.unit,
      against: sourcesOf(own),
      rows: own.length,
      largestDifference: Math.max(...own.map((check) => check.difference)),
    };
  });
}

/** Each source once, with all marks that its rows carry. */
function sourcesOf(checks: readonly Check[]): readonly string[] {
  const marks = new Map<string, Set<string>>();
  for (const { against, mark } of checks) marks.set(against, (marks.get(against) ?? new Set()).add(mark));
  return [...marks].map(([against, found]) => `${against} [${[...found].join("; ")}]`);
}
