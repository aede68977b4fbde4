import { DomUtils, parseDocument } from "htmlparser2";

type Document = ReturnType<typeof parseDocument>;
export type PageElement = NonNullable<ReturnType<typeof DomUtils.findOne>>;
type Within = Document | PageElement;

/** A page to be asked for its elements. */
export interface ParsedPage {
  readonly document: Document;
  /** All elements of a name (`*` for any), in the order of the page. */
  readonly all: (name: string, within?: Within) => readonly PageElement[];
  /** The one element with an id. */
  readonly withId: (id: string) => PageElement;
  readonly withClass: (name: string, within?: Within) => readonly PageElement[];
}

/** Elements that part the words before them from those after them. */
const PARTING = new Set(["br", "p", "div", "li", "tr", "td", "th", "dt", "dd", "h1", "h2", "h3", "caption", "section"]);

/** Reads a page's HTML. */
export function parsePage(html: string): ParsedPage {
  const document = parseDocument(html);
  const pick = (test: (element: PageElement) => boolean, within: Within = document) =>
    DomUtils.findAll(test, within.children);
  return {
    document,
    all: (name, within) => pick((element) => name === "*" || element.name === name, within),
    withId: (id) => {
      const found = pick((element) => element.attribs.id === id);
      if (!found[0] || found.length > 1) throw new Error(`the page has ${found.length} elements "${id}"`);
      return found[0];
    },
    withClass: (name, within) => pick((element) => (element.attribs.class ?? "").split(/\s+/).includes(name), within),
  };
}

/** Text of an element as it reads, white space drawn together. */
export function textOf(element: Within): string {
  return rawText(element).replace(/\s+/g, " ").trim();
}

function rawText(element: Within): string {
  return element.children
    .map((child) => {
      if (child.type === "text") return child.data;
      if (!("children" in child)) return "";
      const parting = "name" in child && PARTING.has(child.name) ? " " : "";
      return `${parting}${rawText(child as PageElement)}${parting}`;
    })
    .join("");
}
