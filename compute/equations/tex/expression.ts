/** What an equation says, freed of how it is typeset. Read from TeX, evaluated, and printed again with numbers. */
export type Expression =
  | { readonly kind: "number"; readonly text: string }
  | { readonly kind: "constant"; readonly tex: string; readonly value: number }
  | SymbolExpression
  | { readonly kind: "negate"; readonly of: Expression }
  | { readonly kind: "add"; readonly sign: "+" | "-"; readonly left: Expression; readonly right: Expression }
  | { readonly kind: "multiply"; readonly sign: ProductSign; readonly left: Expression; readonly right: Expression }
  | { readonly kind: "divide"; readonly line: "bar" | "slash"; readonly top: Expression; readonly bottom: Expression }
  | { readonly kind: "power"; readonly base: Expression; readonly exponent: Expression }
  | { readonly kind: "root"; readonly of: Expression }
  | { readonly kind: "group"; readonly bracket: "(" | "["; readonly of: Expression }
  | { readonly kind: "call"; readonly name: FunctionName; readonly args: readonly Expression[] }
  | { readonly kind: "apply"; readonly name: string; readonly tex: string; readonly args: readonly Expression[] }
  | { readonly kind: "cases"; readonly branches: readonly Branch[] }
  | {
      readonly kind: "series";
      readonly index: string;
      readonly from: Expression;
      readonly to: Expression;
      readonly of: Expression;
    }
  /** A series written out term by term. */
  | { readonly kind: "terms"; readonly terms: readonly Expression[] };

export interface SymbolExpression {
  readonly kind: "symbol";
  /** One spelling per symbol: `h_s` for both `h_s` and `h_{\text{s}}`. */
  readonly name: string;
  readonly tex: string;
}

/** How a product is written: side by side, with a dot, with a cross. */
export type ProductSign = "" | "\\cdot" | "\\times";

export const functionNames = ["lg", "ln", "exp", "sin", "cos", "tan", "tanh", "min", "max", "floor", "abs"] as const;
export type FunctionName = (typeof functionNames)[number];

export interface Branch {
  readonly value: Expression;
  /** Relations that must all hold; none for "otherwise". */
  readonly when: readonly Relation[];
}

export interface Relation {
  readonly left: Expression;
  readonly sign: RelationSign;
  readonly right: Expression;
}

export const relationSigns = ["=", "<", ">", "\\le", "\\ge"] as const;
export type RelationSign = (typeof relationSigns)[number];
