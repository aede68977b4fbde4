import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Equation } from "../../../compute/equations/equation.ts";
import { equationIds, equationOf, type equations } from "../../../compute/equations/registry.ts";
import { evaluate } from "../../../compute/equations/tex/evaluate.ts";
import { katexTree } from "../../../compute/equations/tex/katex-tree.ts";
import { numberLine } from "../../../compute/equations/tex/number-line.ts";
import { readExpression } from "../../../compute/equations/tex/read-expression.ts";
import { readTokens } from "../../../compute/equations/tex/read-tokens.ts";
import type { Token } from "../../../compute/equations/tex/token.ts";
import { accepts } from "../../helpers/accepts.ts";
import { type AnyInputs, validInputs } from "../../helpers/valid-inputs.ts";
import { branchEdges } from "../branch-edges.ts";

const SEED = 20251128;
const nothing = { numbers: new Map(), lists: new Map(), definitions: new Map(), indexes: new Map() };

/** Each printed relation as its parts between the equals signs. */
function relationsOf(line: string): readonly (readonly (readonly Token[])[])[] {
  const tokens = readTokens(katexTree(line));
  const block = tokens[0];
  const rows = tokens.length === 1 && block?.kind === "rows" ? block.rows.map((cells) => cells.flat()) : [tokens];
  return rows.map((row) => {
    const parts: Token[][] = [[]];
    for (const token of row) {
      if (token.kind === "relation" && token.sign === "=") parts.push([]);
      else parts.at(-1)?.push(token);
    }
    return parts;
  });
}

/** A printed value without its unit, and half of its last digit. */
function printedValue(tokens: readonly Token[]): { value: number; half: number } {
  const bare = tokens.at(-1)?.kind === "symbol" ? tokens.slice(0, -1) : tokens;
  const value = evaluate(readExpression(bare, new Set()), nothing);
  const digits = bare.find((token) => token.kind === "number");
  const decimals = digits?.kind === "number" ? (digits.text.split(".")[1]?.length ?? 0) : 0;
  const scale = bare.at(-1)?.power ? evaluate(readExpression(bare.slice(-1), new Set()), nothing) : 1;
  return { value, half: 0.5 * 10 ** -decimals * scale };
}

function expectLineHolds(equation: Equation, inputs: AnyInputs): void {
  const line = numberLine(equation, inputs, { everyTerm: true });
  const relations = relationsOf(line);
  for (const [, ...parts] of relations) {
    const printed = printedValue(parts.at(-1) ?? []);
    const right = parts.length > 1 ? evaluate(readExpression(parts[0] ?? [], new Set()), nothing) : printed.value;
    const message = `${equation.id} ${JSON.stringify(inputs)}\n${line}\ngives ${right}`;
    expect(Math.abs(right - printed.value), message).toBeLessThanOrEqual(printed.half * (1 + 1e-9));
  }
  const shown = printedValue(relations[0]?.at(-1) ?? []);
  expect(Math.abs(equation.of(inputs as never) - shown.value), line).toBeLessThanOrEqual(shown.half * (1 + 1e-6));
}

describe.each(equationIds)("%s: the line with numbers works out again to what it prints", (id) => {
  const equation = equationOf(id) as Equation;

  test("on random inputs and every branch edge", () => {
    for (const inputs of branchEdges[id] ?? []) expectLineHolds(equation, inputs);
    fc.assert(
      fc.property(validInputs(equation), (inputs) => {
        fc.pre(accepts(equation, inputs));
        expectLineHolds(equation, inputs);
      }),
      { seed: SEED, numRuns: 100 },
    );
  });
});

describe("the line with numbers", () => {
  const line = (id: keyof typeof equations, inputs: AnyInputs) => numberLine(equationOf(id) as Equation, inputs);

  test("prints display decimals where they suffice", () => {
    expect(line("sum-levels", { levelsDb: [60, 63] })).toBe(
      String.raw`L = 10 \lg\left(10^{0.1 \cdot 60.0} + 10^{0.1 \cdot 63.0}\right) = 64.8\,\text{dB}`,
    );
  });

  test("prints more decimals where the line would not work out otherwise", () => {
    // 60.04 + 0.04 = 60.08, prints 60.1; 60.0 + 0.0 would print 60.0
    expect(line("facade-level", { levelDb: 60.04, facadeDb: 0.04 })).toBe(
      String.raw`L_{\text{facade}} = 60.04 + 0.04 = 60.1\,\text{dB}`,
    );
  });

  test("shows the first and the largest term of a long sum", () => {
    expect(line("sum-levels", { levelsDb: [60, 61, 62, 90, 61, 60] })).toBe(
      String.raw`L = 10 \lg\left(10^{0.1 \cdot 60.0} + \dots + 10^{0.1 \cdot 90.0} + \dots\right) = 90.0\,\text{dB}`,
    );
    expect(line("sum-levels", { levelsDb: [90, 61, 62, 60, 61] })).toBe(
      String.raw`L = 10 \lg\left(10^{0.1 \cdot 90.0} + \dots\right) = 90.0\,\text{dB}`,
    );
  });

  test("prints only the branch that holds, and the definitions it uses", () => {
    expect(line("met-correction", { planDistanceM: 60, sourceHeightM: 1, receptorHeightM: 2, c0Db: 2 })).toBe(
      String.raw`C_{\text{met}} = 2.0 \left(1 - \frac{10 \left(1.0 + 2.0\right)}{60.0}\right) = 1.0\,\text{dB}`,
    );
    const ground = { bandHz: 63, sourceHeightM: 1, receptorHeightM: 2, planDistanceM: 50 };
    expect(line("ground-effect", { ...ground, groundSource: 1, groundMiddle: 1, groundReceptor: 1 })).toBe(
      String.raw`\begin{aligned}
A_{\text{gr}} &= -1.5 + \left(-1.5\right) + 0 = -3.0\,\text{dB} \\
A_{\text{s}} &= -1.5 \\
A_{\text{r}} &= -1.5 \\
A_{\text{m}} &= -3 \cdot 0 = 0 \\
q &= 0
\end{aligned}`,
    );
  });

  test("brackets negative numbers and writes very small ones with a power of ten", () => {
    expect(line("exceedance", { levelDb: -3, limitDb: 40 })).toBe(
      String.raw`\Delta L = -3.0 - 40.0 = -43.0\,\text{dB}`,
    );
    expect(line("level-of-intensity", { intensityWm2: 1e-6 })).toBe(
      String.raw`L_I = 10 \lg \frac{1.0 \cdot 10^{-6}}{10^{-12}} = 60.0\,\text{dB}`,
    );
  });
});
