import { katexTree } from "./katex-tree.ts";
import { plainSymbol } from "./plain-symbol.ts";
import { spellNode } from "./read-symbol.ts";

/** The left side of an equation for a terminal: a symbol, or one with its argument as in A(f). */
export function readLeft(tex: string): string {
  return katexTree(tex)
    .map((node) => plainSymbol(spellNode(node)?.name ?? String(node.text).replace("\\", "")))
    .join("");
}
