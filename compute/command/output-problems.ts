import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { Parser } from "htmlparser2";

interface Parsed {
  readonly file: string;
  readonly ids: ReadonlySet<string>;
  readonly links: readonly string[];
  readonly text: string;
}

/** Words that show that something went missing on its way to a page. */
const GAPS = [/\bundefined\b/, /\bNaN\b/, /\[object Object\]/, /\{[a-zA-Z]+\}/];
/** The colour in which KaTeX prints what it cannot typeset. */
const RED = "#cc0000";

/**
 * What is wrong with a written site: links and anchors that lead nowhere, gaps in the text, equations in red, ids twice.
 *
 * @param folder  the site
 * @returns       one line each, in the order of the files
 */
export function outputProblems(folder: string): readonly string[] {
  const files = readdirSync(folder, { recursive: true, encoding: "utf8" }).map((file) =>
    file.split(path.sep).join("/"),
  );
  const all = new Set(files);
  const pages = new Map(
    files
      .filter((file) => file.endsWith(".html"))
      .map((file) => [file, parse(file, readFileSync(path.join(folder, file), "utf8"))]),
  );
  return [...pages.values()]
    .sort((a, b) => (a.file < b.file ? -1 : 1))
    .flatMap((page) => [...gaps(page), ...broken(page, pages, all)]);
}

function parse(file: string, html: string): Parsed {
  const ids = new Set<string>();
  const links: string[] = [];
  let text = "";
  let annotation = 0;
  const parser = new Parser({
    onopentag: (name, attributes) => {
      // Words of two elements are two words.
      text += " ";
      if (name === "annotation") annotation++;
      if (attributes.id !== undefined) {
        if (ids.has(attributes.id)) links.push(`#id-twice:${attributes.id}`);
        ids.add(attributes.id);
      }
      for (const link of [attributes.href, attributes.src]) if (link !== undefined) links.push(link);
      if (Object.values(attributes).some((value) => value.includes(RED))) text += ` ${RED} `;
    },
    onclosetag: (name) => {
      if (name === "annotation") annotation--;
    },
    // The TeX source inside MathML is braces all over; it is not read by anyone.
    ontext: (part) => {
      if (annotation === 0) text += part;
    },
  });
  parser.end(html);
  return { file, ids, links, text };
}

function gaps({ file, text }: Parsed): readonly string[] {
  const found = GAPS.flatMap((gap) => text.match(gap)?.[0] ?? []).map(
    (word) => `${file}: expected text, received "${word}"`,
  );
  return text.includes(RED) ? [...found, `${file}: expected a typeset equation, received one in red`] : found;
}

function broken(page: Parsed, pages: ReadonlyMap<string, Parsed>, all: ReadonlySet<string>): readonly string[] {
  return page.links.flatMap((link) => {
    if (link.startsWith("#id-twice:"))
      return [`${page.file}: expected every id once, received "${link.slice("#id-twice:".length)}" twice`];
    if (/^(?:mailto|tel|https?):/.test(link)) return [];
    const [target = "", anchor] = link.split("#");
    const file = target === "" ? page.file : path.posix.join(path.posix.dirname(page.file), decodeURIComponent(target));
    if (!all.has(file)) return [`${page.file}: expected a link to a file of the site, received "${link}"`];
    const missing = anchor !== undefined && !pages.get(file)?.ids.has(decodeURIComponent(anchor));
    return missing ? [`${page.file}: expected a link to a place on ${file}, received "${link}"`] : [];
  });
}
