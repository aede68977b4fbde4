import type { EquationId } from "../../compute/equations/registry.ts";

/** What a row of a reference table expects: one value, one per band, or several by name. */
export type Expected = number | readonly (number | null)[] | Readonly<Record<string, unknown>>;

export interface ReferenceRow {
  readonly id: string;
  readonly quantity: string;
  readonly inputs: unknown;
  readonly expected: Expected;
  readonly unit: string;
  readonly tolerance: number | readonly number[] | string;
  readonly source: string;
  readonly status: "read" | "derived" | "memory";
}

/** Rows that equations are held against, all worked out in the same way. */
export interface TestedRows {
  readonly kind: "tested";
  readonly ids: readonly string[];
  /** Equations whose own value, in its own unit up to `toUnit`, is compared. */
  readonly equations: readonly EquationId[];
  /** What the rows come from, as the accuracy table names it. */
  readonly against: string;
  /** Factor from the unit of the rows to the unit of the equations, e.g. 1/60 from minutes to hours. */
  readonly toUnit?: number;
  readonly note?: string;
  /** In the place of the tolerance stated in the row, and why. */
  readonly tolerance?: { readonly value: number; readonly reason: string };
  readonly work: (inputs: never) => number | readonly number[] | Readonly<Record<string, number>>;
}

export interface LeftOutRows {
  readonly kind: "left-out";
  readonly ids: readonly string[];
  readonly reason: string;
}

export type RowGroup = TestedRows | LeftOutRows;

/** Rows to test; `I` is the shape of their inputs. */
export function tested<I>(
  group: Omit<TestedRows, "kind" | "work"> & { work: (inputs: I) => ReturnType<TestedRows["work"]> },
): TestedRows {
  return { ...group, kind: "tested", work: group.work as unknown as TestedRows["work"] };
}

/** Rows that are not tested, and why. */
export function leftOut(reason: string, ids: readonly string[]): LeftOutRows {
  return { kind: "left-out", ids, reason };
}
