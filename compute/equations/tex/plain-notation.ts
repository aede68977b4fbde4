import type { Notation } from "./print-expression.ts";

/** Plain text for a terminal, e.g. `10·lg(10^(0.1·60.0) + 10^(0.1·63.0))`. */
export const plainNotation: Notation = {
  constant: (tex) => (tex === "\\pi" ? "π" : "e"),
  power: (base, exponent) => `${base}^${exponent.operand}`,
  tenTo: (digits, exponent) => `${digits}·10^${exponent < 0 ? `(−${-exponent})` : exponent}`,
  divide: (top, bottom) => `${top.operand}/${bottom.operand}`,
  root: (of) => `sqrt(${of})`,
  group: (of) => `(${of})`,
  call: (name, args) => `${name}(${args.map((arg) => arg.bare).join("; ")})`,
  product: (left, _sign, right) => `${left}·${right}`,
  minus: "−",
  dots: "…",
};
