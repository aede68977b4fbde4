import { readdirSync } from "node:fs";
import path from "node:path";

/** One page that stands for all of its type. */
export interface TypicalPage {
  readonly type: string;
  /** Path of its file in the site. */
  readonly file: string;
}

const OWN = "(?!data-sheets/|limits/|duties/|calculation/|assets/)[^/]+";
/** Addresses of each page type; a revision in force stands for all revisions. */
const ADDRESSES: readonly (readonly [type: string, file: RegExp])[] = [
  ["home", /^index\.html$/],
  ["project", new RegExp(`^${OWN}/index\\.html$`)],
  ["statement", new RegExp(`^${OWN}/[^/]+/index\\.html$`)],
  ["workings", new RegExp(`^${OWN}/[^/]+/workings/index\\.html$`)],
  ["ear-protection", new RegExp(`^${OWN}/[^/]+/ear-protection/index\\.html$`)],
  ["plant-sheet", /^data-sheets\/plant\/.*\.html$/],
  ["panel-sheet", /^data-sheets\/panels\/.*\.html$/],
  ["limit-set", /^limits\/.*\.html$/],
  ["duty-set", /^duties\/.*\.html$/],
  ["calculation", /^calculation\/index\.html$/],
];

/**
 * The first page of each type in a site; types the site has no page of are left out.
 *
 * @param folder  a site
 */
export function typicalPages(folder: string): readonly TypicalPage[] {
  const files = readdirSync(folder, { recursive: true, encoding: "utf8" })
    .map((file) => file.split(path.sep).join("/"))
    .sort();
  return ADDRESSES.flatMap(([type, address]) => {
    const file = files.find((each) => address.test(each));
    return file ? [{ type, file }] : [];
  });
}
