import katex from "katex";
import { describe, expect, test } from "vitest";
import { equationIds, equations } from "../../../compute/equations/registry.ts";
import { evaluateTex } from "../../../compute/equations/tex/evaluate-tex.ts";
import { children, type KatexNode, katexTree } from "../../../compute/equations/tex/katex-tree.ts";
import { readEquation } from "../../../compute/equations/tex/read-equation.ts";

/** Every node type of KaTeX 0.19.1 that our equations are made of. A new one must be read on purpose. */
const knownTypes = [
  ...["accent", "array", "atom", "font", "genfrac", "kern", "leftright", "mathord", "op", "ordgroup"],
  ...["sqrt", "styling", "supsub", "text", "textord"],
];

function typesIn(nodes: readonly KatexNode[], found: Set<string>): Set<string> {
  for (const node of nodes) {
    found.add(node.type);
    const parts = [
      node.base,
      node.sup,
      node.sub,
      node.numer,
      node.denom,
      node.type === "array" ? (node.body as unknown[]).flat() : node.body,
    ];
    for (const part of parts)
      typesIn(
        children(part).filter((child) => typeof child === "object"),
        found,
      );
  }
  return found;
}

const one = (symbol: string) => ({ kind: "one", symbol, unit: "1", min: -100, max: 100 }) as const;
const work = (tex: string, values: Readonly<Record<string, number>> = {}) =>
  evaluateTex({ tex, inputs: Object.fromEntries(Object.keys(values).map((symbol) => [symbol, one(symbol)])) }, values);

describe("equations typeset", () => {
  test.each(equationIds)("%s with KaTeX in its strictest setting, symbols and all", (id) => {
    const { tex, value, inputs } = equations[id];
    for (const piece of [tex, value.symbol, ...Object.values(inputs).map((input) => input.symbol)]) {
      const html = katex.renderToString(piece, {
        throwOnError: true,
        strict: "error",
        trust: false,
        displayMode: true,
      });
      expect(html).not.toContain("#cc0000"); // how KaTeX prints what it refuses without throwing
    }
  });

  test.each(equationIds)("%s begins with the symbol of its value", (id) => {
    const { tex, value } = equations[id];
    expect(tex.replace(/^\\begin\{aligned\}\s*/, "").startsWith(value.symbol)).toBe(true);
  });

  test("all of known KaTeX nodes", () => {
    const found = new Set<string>();
    for (const id of equationIds) typesIn(katexTree(equations[id].tex), found);
    expect([...found].sort()).toEqual(knownTypes);
  });
});

describe("the reader of equations", () => {
  test.each([
    [String.raw`x = \overset{a}{b}`, 'no reading for KaTeX node "mclass"'],
    [String.raw`x = \int y`, "no reading for the function \\int"],
    [String.raw`x = a \pm b`, "no reading for the sign \\pm"],
    [String.raw`x = \sqrt[3]{a}`, "no reading for a root with an index"],
    ["x = (a)^2", "no reading for a power on a bare bracket: use \\left and \\right"],
    [String.raw`x = \lg a b`, "lg takes one factor: put its argument in brackets"],
    [String.raw`x = \lg^2 a`, "no reading for a script on a function: put the function in brackets"],
    [String.raw`x = \max a`, "max needs its arguments in brackets"],
    ["x", "a row without = in x"],
    ["x = a +", "an expression ends too early"],
    ["x = (a", "( is never closed"],
    ["x = a)", "a closing ) too many"],
  ])("refuses %s", (tex, message) => {
    expect(() => readEquation(tex)).toThrow(message);
  });

  test("names a symbol that has no value", () => {
    expect(() => work(String.raw`x = K_{\text{mett}}`)).toThrow("no value for the symbol K_mett");
  });

  test.each([
    ["x = 2 + 3 \\cdot 4 - 1", 13],
    ["x = -2^2", -4],
    ["x = 12/3/2", 2],
    ["x = 2 \\left(1 + 2\\right)^{3 - 1}", 18],
    ["x = \\frac{1}{2} 10^{1}", 5],
    ["x = 10 \\lg \\frac{100}{10} - 1", 9],
    ["x = \\min\\left(3, 1, 2\\right) + \\max\\{4, 5\\}", 6],
    ["x = \\left\\lfloor 2.9 \\right\\rfloor + \\lfloor 1.1 \\rfloor", 3],
    ["x = \\left|1 - 3\\right|", 2],
    ["x = \\sqrt{9} + \\exp\\left(0\\right) + \\cos 0 + \\tanh 0", 5],
    ["x = \\mathrm{e}^{0} + \\frac{\\pi}{\\pi}", 2],
    ["x = 1.5 \\times 10^{2}", 150],
    ["x = \\sum_{i=1}^{3} i + 1", 7],
    ["x = \\begin{cases} 1 & 2 < 1 \\\\ 5 & 1 < 2 \\le 2 \\\\ 7 & \\text{otherwise} \\end{cases}", 5],
    ["\\begin{aligned} x &= f\\left(2\\right) + c \\\\ f\\left(y\\right) &= y^2 \\\\ c &= 3 \\end{aligned}", 7],
  ])("works out %s", (tex, value) => {
    expect(work(tex)).toBeCloseTo(value, 12);
  });
});
