import type { Notation } from "./print-expression.ts";

/** TeX as the equations themselves are written, so that a printed line can be read again. */
export const texNotation: Notation = {
  constant: (tex) => tex,
  power: (base, exponent) => `${base}^{${exponent.bare}}`,
  tenTo: (digits, exponent) => `${digits} \\cdot 10^{${exponent}}`,
  divide: (top, bottom, line) =>
    line === "bar" ? `\\frac{${top.bare}}{${bottom.bare}}` : `${top.operand}/${bottom.operand}`,
  root: (of) => `\\sqrt{${of}}`,
  group: (of) => `\\left(${of}\\right)`,
  call: (name, args) => {
    const [first] = args;
    const list = args.map((arg) => arg.bare).join(", ");
    if (name === "floor") return `\\left\\lfloor ${list} \\right\\rfloor`;
    if (name === "abs") return `\\left|${list}\\right|`;
    return args.length === 1 && first?.simple && name !== "exp"
      ? `\\${name} ${first.bare}`
      : `\\${name}\\left(${list}\\right)`;
  },
  // Two numbers side by side would read as one, a number before a fraction as a mixed number.
  product: (left, sign, right) => {
    const needsDot = sign === "" && (/^[0-9.]/.test(right) || (right.startsWith("\\frac") && /[0-9]$/.test(left)));
    return `${left} ${needsDot ? "\\cdot " : sign && `${sign} `}${right}`;
  },
  minus: "-",
  dots: "\\dots",
};
