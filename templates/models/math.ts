import { createHash } from "node:crypto";
import katex from "katex";

/** Typesets equations without inline styles: each style becomes a class of one sheet, made beforehand. */
export interface Typesetter {
  /** HTML and MathML of an equation. */
  readonly display: (tex: string) => string;
  /** The same inside a line of text, for symbols. */
  readonly inline: (tex: string) => string;
}

const STYLE = / style="([^"]*)"/g;

function typeset(tex: string, displayMode: boolean): string {
  const html = katex.renderToString(tex, {
    output: "htmlAndMathml",
    displayMode,
    throwOnError: true,
    strict: "error",
    trust: false,
  });
  if (html.includes("#cc0000")) throw new Error(`the equation does not typeset: ${tex}`);
  return html;
}

function className(style: string): string {
  return `k${createHash("sha256").update(style).digest("hex").slice(0, 7)}`;
}

/** An equation that a site prints: on a line of its own, or a symbol inside a line of text. */
export interface Printed {
  readonly tex: string;
  readonly isDisplay: boolean;
}

/**
 * The style sheet of all equations that a site prints, and the typesetter that goes with it.
 *
 * @param printed  every equation the site may print, in symbols and with numbers in
 */
export function typesetterFor(printed: Iterable<Printed>): { readonly css: string; readonly typesetter: Typesetter } {
  const typesets = new Map<string, string>();
  const htmlOf = (tex: string, isDisplay: boolean) => {
    const key = `${isDisplay} ${tex}`;
    const html = typesets.get(key) ?? typeset(tex, isDisplay);
    typesets.set(key, html);
    return html;
  };
  const classes = new Map<string, string>();
  for (const { tex, isDisplay } of printed) {
    for (const [, style = ""] of htmlOf(tex, isDisplay).matchAll(STYLE)) classes.set(style, className(style));
  }
  const sorted = [...classes].sort(([a], [b]) => (a < b ? -1 : 1));
  const css = sorted.map(([style, name]) => `.katex .${name}.${name}.${name}{${style}}\n`).join("");
  const render = (tex: string, isDisplay: boolean) => withClasses(htmlOf(tex, isDisplay), classes, tex);
  return { css, typesetter: { display: (tex) => render(tex, true), inline: (tex) => render(tex, false) } };
}

/** Puts classes in place of styles; a tag that has a class already keeps it. */
function withClasses(html: string, classes: ReadonlyMap<string, string>, tex: string): string {
  return html.replace(/<[a-z][^>]*>/g, (tag) => {
    const style = tag.match(/ style="([^"]*)"/)?.[1];
    if (style === undefined) return tag;
    const name = classes.get(style);
    if (!name) throw new Error(`the equation needs a style that no equation of the registry has (${style}): ${tex}`);
    const bare = tag.replace(/ style="[^"]*"/, "");
    return / class="/.test(bare)
      ? bare.replace(/ class="/, ` class="${name} `)
      : bare.replace(/^<[a-z]+/, (start) => `${start} class="${name}"`);
  });
}
