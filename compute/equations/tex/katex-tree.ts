import katex from "katex";

/** A node of KaTeX's own parse tree. Its shape is internal to KaTeX: the version is pinned and a test names every type we read. */
export interface KatexNode {
  readonly type: string;
  readonly [key: string]: unknown;
}

/** @throws {Error} of KaTeX, if the TeX does not typeset */
export function katexTree(tex: string): readonly KatexNode[] {
  const parser = katex as unknown as { __parse(tex: string, options: object): KatexNode[] };
  return parser.__parse(tex, { displayMode: true, strict: "error", throwOnError: true, trust: false });
}

/** Child nodes, whether KaTeX keeps one or several there. */
export function children(value: unknown): readonly KatexNode[] {
  if (Array.isArray(value)) return value as KatexNode[];
  return value === null || value === undefined ? [] : [value as KatexNode];
}
