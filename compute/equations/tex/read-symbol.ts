import { children, type KatexNode, katexTree } from "./katex-tree.ts";

export interface SymbolSpelling {
  /** One spelling per symbol, without TeX: `L'_EX,8h`, `lambda`, `Delta L`. */
  readonly name: string;
  readonly tex: string;
}

/** The symbol of an input or a value, e.g. `h_{\text{s}}`, as the reader of equations names it. */
export function readSymbol(tex: string): SymbolSpelling {
  const nodes = katexTree(tex);
  const spelled = nodes.length === 2 && isDelta(nodes[0]) ? [nodes[1] as KatexNode] : nodes;
  const symbol = spelled.length === 1 ? spellNode(spelled[0] as KatexNode) : undefined;
  if (!symbol) throw new Error(`not a single symbol: ${tex}`);
  return spelled === nodes ? symbol : withDelta(symbol);
}

export function isDelta(node: KatexNode | undefined): boolean {
  return node?.type === "textord" && node.text === "\\Delta";
}

export function withDelta(symbol: SymbolSpelling): SymbolSpelling {
  return { name: `Delta ${symbol.name}`, tex: String.raw`\Delta ${symbol.tex}` };
}

/** Spelling of a node that stands for a symbol, or nothing if it stands for something else. Powers are not looked at. */
export function spellNode(node: KatexNode): SymbolSpelling | undefined {
  if (node.type === "mathord") return { name: plain(String(node.text)), tex: String(node.text) };
  if (node.type === "text") return { name: plainText(node), tex: String.raw`\text{${plainText(node)}}` };
  if (node.type === "accent" && node.label === "\\bar") {
    const under = spellAll(children(node.base));
    return { name: `bar ${under.name}`, tex: String.raw`\bar{${under.tex}}` };
  }
  if (node.type !== "supsub") return undefined;
  const base = children(node.base)[0];
  const symbol = base && spellNode(base);
  if (!symbol) return undefined;
  const primes = "'".repeat(primeCount(node));
  const below = spellAll(children(node.sub));
  if (below.name === "") return { name: symbol.name + primes, tex: symbol.tex + primes };
  return { name: `${symbol.name}${primes}_${below.name}`, tex: `${symbol.tex}${primes}_{${below.tex}}` };
}

/** Number of primes in the superscript of a node. */
export function primeCount(node: KatexNode): number {
  return flat(children(node.sup)).filter((inner) => inner.type === "textord" && inner.text === "\\prime").length;
}

function flat(nodes: readonly KatexNode[]): readonly KatexNode[] {
  return nodes.flatMap((node) => (node.type === "ordgroup" ? flat(children(node.body)) : [node]));
}

/** The pieces of a subscript side by side. */
function spellAll(nodes: readonly KatexNode[]): SymbolSpelling {
  const pieces = flat(nodes).map((node) => {
    if (node.type === "textord" || node.type === "atom")
      return { name: plain(String(node.text)), tex: String(node.text) };
    const symbol = spellNode(node);
    if (!symbol) throw new Error(`no reading for KaTeX node "${node.type}" in a subscript`);
    return symbol;
  });
  return {
    name: pieces.map((piece) => piece.name).join(""),
    tex: pieces
      .map((piece) => piece.tex)
      .join(" ")
      .trim(),
  };
}

function plainText(node: KatexNode): string {
  return children(node.body)
    .map((inner) => String(inner.text))
    .join("");
}

function plain(text: string): string {
  return text.replace(/^\\/, "");
}
