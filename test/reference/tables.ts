import { readFileSync } from "node:fs";
import { acousticsRows } from "./acoustics-rows.ts";
import { hearingRows } from "./hearing-rows.ts";
import { practiceRows } from "./practice-rows.ts";
import type { ReferenceRow, RowGroup } from "./row.ts";

export interface ReferenceTable {
  readonly name: string;
  readonly rows: ReadonlyMap<string, ReferenceRow>;
  readonly groups: readonly RowGroup[];
  /** Rows the file has, so that none can vanish. */
  readonly count: number;
}

function table(name: string, groups: readonly RowGroup[], count: number): ReferenceTable {
  const text = readFileSync(new URL(`./${name}-check-values.json`, import.meta.url), "utf8");
  const rows = JSON.parse(text) as readonly ReferenceRow[];
  return { name, rows: new Map(rows.map((row) => [row.id, row])), groups, count };
}

/** The published tables and hand-worked values that equations are held against. */
export const tables: readonly ReferenceTable[] = [
  table("acoustics", acousticsRows, 222),
  table("practice", practiceRows, 129),
  table("hearing", hearingRows, 284),
];
