import type { Words } from "./words.ts";

/** A page as it is handed to a template. */
export interface Page {
  /** Path of the file in the site, e.g. `saltpan-quay/index.html`. */
  readonly file: string;
  /** Template in templates/pages/ without its ending. */
  readonly template: string;
  readonly model: PageModel;
}

/** What every page has. */
export interface PageModel {
  readonly head: Head;
  readonly [part: string]: unknown;
}

export interface Head {
  readonly language: string;
  readonly title: string;
  readonly description: string;
  /** Way back to the site's first folder: `../../`, or `./`. */
  readonly root: string;
  readonly crumbs: readonly Link[];
  /** Invented examples say so on every page and sheet. */
  readonly invented: { readonly kind: "invented"; readonly text: string } | { readonly kind: "real" };
  readonly common: Readonly<Record<string, string>>;
  readonly foot: string;
}

export interface Link {
  readonly text: string;
  readonly href: string;
}

/** Way from a file back to the site's first folder. */
export function rootOf(file: string): string {
  const depth = file.split("/").length - 1;
  return depth === 0 ? "./" : "../".repeat(depth);
}

/** A link from one file of the site to another; it always names the file. */
export function hrefTo(from: string, to: string): string {
  return `${rootOf(from)}${to}`;
}

/** What a page's head is made from. */
export interface HeadParts {
  readonly file: string;
  readonly words: Words;
  readonly title: string;
  readonly description: string;
  /** Pages above this one, from the top, without home: text and file. */
  readonly above: readonly { readonly text: string; readonly file: string }[];
  readonly invented: boolean;
}

/** The head of a page. */
export function headOf({ file, words, title, description, above, invented }: HeadParts): Head {
  const home = { text: words.say("common.home"), file: "index.html" };
  const crumbs = file === "index.html" ? [] : [home, ...above];
  return {
    language: words.language,
    title,
    description,
    root: rootOf(file),
    crumbs: crumbs.map((crumb) => ({ text: crumb.text, href: hrefTo(file, crumb.file) })),
    invented: invented ? { kind: "invented", text: words.say("common.invented") } : { kind: "real" },
    common: words.section("layout"),
    foot: words.say("common.foot"),
  };
}
