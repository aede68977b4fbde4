import type { Branch, Expression, FunctionName, ProductSign, Relation } from "./expression.ts";
import type { Token } from "./token.ts";

/** Names of the functions an equation defines itself, such as a'(h). */
export type OwnFunctions = ReadonlySet<string>;

/**
 * Settles precedence: sums of products of powers; a function without brackets takes one factor only.
 *
 * @throws {Error} if anything is left over or missing
 */
export function readExpression(tokens: readonly Token[], own: OwnFunctions): Expression {
  const queue = [...tokens];
  const expression = readSum(queue, own);
  if (queue.length > 0) throw new Error(`left over after an expression: ${JSON.stringify(queue[0])}`);
  return expression;
}

function readSum(queue: Token[], own: OwnFunctions): Expression {
  const negative = takeSign(queue, "-");
  let sum = readProduct(queue, own);
  if (negative) sum = { kind: "negate", of: sum };
  for (;;) {
    const sign = takeSign(queue, "+") ?? takeSign(queue, "-");
    if (!sign) return sum;
    sum = { kind: "add", sign, left: sum, right: readProduct(queue, own) };
  }
}

function readProduct(queue: Token[], own: OwnFunctions): Expression {
  let product = readPower(queue, own);
  for (;;) {
    const sign = takeSign(queue, "\\cdot") ?? takeSign(queue, "\\times");
    if (takeSign(queue, "/")) product = { kind: "divide", line: "slash", top: product, bottom: readPower(queue, own) };
    else if (sign || startsFactor(queue[0])) {
      product = { kind: "multiply", sign: sign ?? ("" as ProductSign), left: product, right: readPower(queue, own) };
    } else return product;
  }
}

function startsFactor(token: Token | undefined): boolean {
  return token !== undefined && !["sign", "relation", "comma"].includes(token.kind);
}

function takeSign<S extends string>(queue: Token[], sign: S): S | undefined {
  const first = queue[0];
  if (first?.kind !== "sign" || first.sign !== sign) return undefined;
  queue.shift();
  return sign;
}

function readPower(queue: Token[], own: OwnFunctions): Expression {
  const token = queue.shift();
  if (!token) throw new Error("an expression ends too early");
  const base = readFactor(token, queue, own);
  return token.power && base.kind !== "apply"
    ? { kind: "power", base, exponent: readExpression(token.power, own) }
    : base;
}

function readFactor(token: Token, queue: Token[], own: OwnFunctions): Expression {
  switch (token.kind) {
    case "number":
      return { kind: "number", text: token.text };
    case "constant":
      return { kind: "constant", tex: token.tex, value: token.value };
    case "symbol":
      return own.has(token.name) ? readApply(token, queue, own) : { kind: "symbol", name: token.name, tex: token.tex };
    case "bracketed":
      return readBracketed(token, own);
    case "fraction":
      return {
        kind: "divide",
        line: "bar",
        top: readExpression(token.top, own),
        bottom: readExpression(token.bottom, own),
      };
    case "root":
      return { kind: "root", of: readExpression(token.inside, own) };
    case "function":
      return readCall(token.name, queue, own);
    case "series":
      return readSeries(token, queue, own);
    case "rows":
      if (token.brace) return { kind: "cases", branches: token.rows.map((row) => readBranch(row, own)) };
  }
  throw new Error(`no reading for a ${token.kind} here`);
}

function readApply(token: Token & { kind: "symbol" }, queue: Token[], own: OwnFunctions): Expression {
  const next = queue.shift();
  if (next?.kind !== "bracketed" || next.power || token.power)
    throw new Error(`${token.name} needs its arguments in brackets`);
  return { kind: "apply", name: token.name, tex: token.tex, args: readList(next.inside, own) };
}

function readBracketed(token: Token & { kind: "bracketed" }, own: OwnFunctions): Expression {
  const of = readExpression(token.inside, own);
  if (token.open === "\\lfloor") return { kind: "call", name: "floor", args: [of] };
  if (token.open === "|") return { kind: "call", name: "abs", args: [of] };
  return { kind: "group", bracket: token.open === "[" ? "[" : "(", of };
}

/** Expressions between commas. */
export function readList(tokens: readonly Token[], own: OwnFunctions): readonly Expression[] {
  const parts: Token[][] = [[]];
  for (const token of tokens) {
    if (token.kind === "comma") parts.push([]);
    else parts.at(-1)?.push(token);
  }
  return parts.map((part) => readExpression(part, own));
}

function readCall(name: FunctionName, queue: Token[], own: OwnFunctions): Expression {
  const next = queue[0];
  if (next?.kind === "bracketed" && next.open !== "\\lfloor" && next.open !== "|") {
    queue.shift();
    const call: Expression = { kind: "call", name, args: readList(next.inside, own) };
    return next.power ? { kind: "power", base: call, exponent: readExpression(next.power, own) } : call;
  }
  if (name === "min" || name === "max") throw new Error(`${name} needs its arguments in brackets`);
  const argument = readPower(queue, own);
  if (startsFactor(queue[0]) && argument.kind !== "series") {
    throw new Error(`${name} takes one factor: put its argument in brackets`);
  }
  return { kind: "call", name, args: [argument] };
}

/** A series reaches over the product that follows it, up to the next + or −. */
function readSeries(token: Token & { kind: "series" }, queue: Token[], own: OwnFunctions): Expression {
  const [index, equals, ...from] = token.below;
  if (index?.kind !== "symbol" || equals?.kind !== "relation") throw new Error("a series needs an index, e.g. i=1");
  const to = readExpression(token.above, own);
  return { kind: "series", index: index.name, from: readExpression(from, own), to, of: readProduct(queue, own) };
}

function readBranch(row: readonly (readonly Token[])[], own: OwnFunctions): Branch {
  const [value, condition] = row;
  if (!value || !condition || row.length !== 2) throw new Error("a branch needs a value and a condition");
  return { value: readExpression(value, own), when: readCondition(condition, own) };
}

/** Relations, also chained as in `1 < x \le 2`; the word "otherwise" holds always. */
function readCondition(tokens: readonly Token[], own: OwnFunctions): readonly Relation[] {
  const first = tokens[0];
  if (tokens.length === 1 && first?.kind === "symbol" && first.name === "otherwise") return [];
  const relations: Relation[] = [];
  let side: Token[] = [];
  let pending: { left: Expression; sign: Relation["sign"] } | undefined;
  for (const token of [...tokens, undefined]) {
    if (token && token.kind !== "relation") {
      side.push(token);
      continue;
    }
    const expression = readExpression(side, own);
    if (pending) relations.push({ ...pending, right: expression });
    pending = token ? { left: expression, sign: token.sign } : undefined;
    side = [];
  }
  if (relations.length === 0) throw new Error("a condition needs a relation");
  return relations;
}
