import type { Expression } from "./expression.ts";

/** The same expression with each of its direct parts replaced. Conditions of cases are left alone. */
export function mapChildren(expression: Expression, change: (part: Expression) => Expression): Expression {
  switch (expression.kind) {
    case "number":
    case "constant":
    case "symbol":
      return expression;
    case "negate":
    case "root":
    case "group":
      return { ...expression, of: change(expression.of) };
    case "add":
    case "multiply":
      return { ...expression, left: change(expression.left), right: change(expression.right) };
    case "divide":
      return { ...expression, top: change(expression.top), bottom: change(expression.bottom) };
    case "power":
      return { ...expression, base: change(expression.base), exponent: change(expression.exponent) };
    case "call":
    case "apply":
      return { ...expression, args: expression.args.map(change) };
    case "terms":
      return { ...expression, terms: expression.terms.map(change) };
    case "series":
      return { ...expression, from: change(expression.from), to: change(expression.to), of: change(expression.of) };
    case "cases":
      return {
        ...expression,
        branches: expression.branches.map((branch) => ({ ...branch, value: change(branch.value) })),
      };
  }
}
