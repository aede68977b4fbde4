import type { FunctionName, RelationSign } from "./expression.ts";

/** A stretch of TeX that belongs together, before precedence is settled. */
export type Token = { readonly power?: readonly Token[] } & (
  | { readonly kind: "number"; readonly text: string }
  | { readonly kind: "constant"; readonly tex: string; readonly value: number }
  | { readonly kind: "symbol"; readonly name: string; readonly tex: string }
  | { readonly kind: "sign"; readonly sign: "+" | "-" | "\\cdot" | "\\times" | "/" }
  | { readonly kind: "relation"; readonly sign: RelationSign }
  | { readonly kind: "comma" }
  | { readonly kind: "open" | "close"; readonly bracket: string }
  | { readonly kind: "bracketed"; readonly open: string; readonly inside: readonly Token[] }
  | { readonly kind: "fraction"; readonly top: readonly Token[]; readonly bottom: readonly Token[] }
  | { readonly kind: "root"; readonly inside: readonly Token[] }
  | { readonly kind: "function"; readonly name: FunctionName }
  | { readonly kind: "series"; readonly below: readonly Token[]; readonly above: readonly Token[] }
  /** Rows of cells: an `aligned` block, or `cases` when `brace` is true. */
  | { readonly kind: "rows"; readonly brace: boolean; readonly rows: readonly (readonly (readonly Token[])[])[] }
);
