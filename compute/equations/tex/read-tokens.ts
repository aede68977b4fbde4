import { type FunctionName, functionNames, type RelationSign, relationSigns } from "./expression.ts";
import { children, type KatexNode } from "./katex-tree.ts";
import { isDelta, primeCount, spellNode, withDelta } from "./read-symbol.ts";
import type { Token } from "./token.ts";

const signs = ["+", "-", "\\cdot", "\\times", "/"] as const;
type Sign = (typeof signs)[number];
const spellings: Readonly<Record<string, string>> = {
  "\\leq": "\\le",
  "\\geq": "\\ge",
  "\\neq": "\\ne",
  "\\log": "\\lg",
};

/**
 * Turns KaTeX nodes into tokens: digits joined to numbers, brackets paired, powers hung on what they raise.
 *
 * @throws {Error} naming any node type or sign it has no reading for
 */
export function readTokens(nodes: readonly KatexNode[]): readonly Token[] {
  const tokens: Token[] = [];
  let delta = false;
  for (const node of nodes) {
    if (isDelta(node)) {
      delta = true;
      continue;
    }
    for (const token of tokensOf(node)) {
      const last = tokens.at(-1);
      if (token.kind === "number" && last?.kind === "number" && !last.power) {
        tokens[tokens.length - 1] = { ...token, text: last.text + token.text };
      } else tokens.push(delta && token.kind === "symbol" ? { ...token, ...withDelta(token) } : token);
      delta = false;
    }
  }
  return paired(tokens);
}

function tokensOf(node: KatexNode): readonly Token[] {
  switch (node.type) {
    case "kern":
    case "spacing":
      return [];
    case "ordgroup":
    case "styling":
      return readTokens(children(node.body));
    case "textord":
    case "atom":
      return [signToken(String(node.text))];
    case "mathord":
      return [node.text === "\\pi" ? { kind: "constant", tex: "\\pi", value: Math.PI } : symbolToken(node)];
    case "text":
    case "accent":
      return [symbolToken(node)];
    case "font":
      return [romanToken(node)];
    case "op":
      return [functionToken(String(node.name))];
    case "genfrac":
      return [{ kind: "fraction", top: readTokens(children(node.numer)), bottom: readTokens(children(node.denom)) }];
    case "sqrt":
      if (node.index) throw new Error("no reading for a root with an index");
      return [{ kind: "root", inside: readTokens(children(node.body)) }];
    case "leftright":
      return [leftRightToken(node)];
    case "array":
      return [{ kind: "rows", brace: false, rows: rowsOf(node) }];
    case "supsub":
      return [scriptToken(node)];
    default:
      throw new Error(`no reading for KaTeX node "${node.type}"`);
  }
}

function signToken(text: string): Token {
  const sign = spellings[text] ?? text;
  if (/^[0-9.]$/.test(sign)) return { kind: "number", text: sign };
  if (sign === ",") return { kind: "comma" };
  if (signs.includes(sign as Sign)) return { kind: "sign", sign: sign as Sign };
  if (relationSigns.includes(sign as RelationSign)) return { kind: "relation", sign: sign as RelationSign };
  if (["(", "[", "\\{", "\\lfloor"].includes(sign)) return { kind: "open", bracket: sign };
  if ([")", "]", "\\}", "\\rfloor"].includes(sign)) return { kind: "close", bracket: sign };
  throw new Error(`no reading for the sign ${text}`);
}

function symbolToken(node: KatexNode): Token {
  const symbol = spellNode(node);
  if (!symbol) throw new Error(`no reading for KaTeX node "${node.type}" as a symbol`);
  return { kind: "symbol", ...symbol };
}

/** Roman e is Euler's number; any other letter stays a symbol. */
function romanToken(node: KatexNode): Token {
  const inside = readTokens(children(node.body));
  const only = inside[0];
  if (inside.length !== 1 || only?.kind !== "symbol" || only.name !== "e")
    throw new Error("no reading for roman letters but e");
  return { kind: "constant", tex: String.raw`\mathrm{e}`, value: Math.E };
}

function functionToken(command: string): Token {
  const name = (spellings[command] ?? command).replace(/^\\/, "");
  if (!functionNames.includes(name as FunctionName)) throw new Error(`no reading for the function ${command}`);
  return { kind: "function", name: name as FunctionName };
}

function leftRightToken(node: KatexNode): Token {
  const inside = children(node.body);
  if (node.left === "\\{" && node.right === "." && inside[0]?.type === "array") {
    return { kind: "rows", brace: true, rows: rowsOf(inside[0]) };
  }
  return { kind: "bracketed", open: String(node.left), inside: readTokens(inside) };
}

function rowsOf(node: KatexNode): readonly (readonly (readonly Token[])[])[] {
  return (node.body as KatexNode[][]).map((row) => row.map((cell) => readTokens([cell])));
}

/** A base with a subscript, a superscript or both. */
function scriptToken(node: KatexNode): Token {
  const base = children(node.base)[0];
  if (base?.type === "op" && base.name === "\\sum") {
    return { kind: "series", below: readTokens(children(node.sub)), above: readTokens(children(node.sup)) };
  }
  if (base?.type === "atom") throw new Error("no reading for a power on a bare bracket: use \\left and \\right");
  const symbol = spellNode(node);
  const [raised, ...rest] = symbol ? [{ kind: "symbol", ...symbol } as Token] : readTokens(children(node.base));
  if (!raised || rest.length > 0 || (!symbol && node.sub)) throw new Error("no reading for this base of a script");
  if (raised.kind === "function")
    throw new Error("no reading for a script on a function: put the function in brackets");
  const power = node.sup && primeCount(node) === 0 ? readTokens(children(node.sup)) : undefined;
  return power ? { ...raised, power } : raised;
}

/** Pairs brackets typed without \left and \right. */
function paired(tokens: readonly Token[]): readonly Token[] {
  const stack: { bracket: string; inside: Token[] }[] = [{ bracket: "", inside: [] }];
  for (const token of tokens) {
    if (token.kind === "open") stack.push({ bracket: token.bracket, inside: [] });
    else if (token.kind !== "close") stack.at(-1)?.inside.push(token);
    else {
      const group = stack.pop();
      if (!group || stack.length === 0) throw new Error(`a closing ${token.bracket} too many`);
      stack.at(-1)?.inside.push({ kind: "bracketed", open: group.bracket, inside: group.inside });
    }
  }
  if (stack.length > 1) throw new Error(`${stack.at(-1)?.bracket} is never closed`);
  return stack[0]?.inside ?? [];
}
