import { type Dirent, readdirSync } from "node:fs";
import path from "node:path";
import { didYouMean } from "./did-you-mean.ts";
import type { Folder, Layout } from "./layout.ts";
import { listText } from "./list-text.ts";
import type { Mistake } from "./mistake.ts";
import { nearest } from "./nearest.ts";
import { receivedText } from "./received-text.ts";

/** A file that is to be read: what it holds, and the names of folder and file that tell which one it is. */
export interface ContentFile {
  readonly file: string;
  readonly layout: Layout;
  readonly name: string;
}
interface Found {
  readonly files: ContentFile[];
  readonly mistakes: Mistake[];
}

/** The files under a folder in the order of their names, and what does not belong there. Names starting with a dot are passed over. */
export function contentFiles(folder: string, layout: Folder, names: readonly string[] = []): Found {
  const found: Found = { files: [], mistakes: [] };
  const entries = readdirSync(folder, { withFileTypes: true }).filter((entry) => !entry.name.startsWith("."));
  entries.sort((a, b) => (a.name < b.name ? -1 : 1));
  for (const entry of entries) take(found, `${folder}/${entry.name}`, entry, layout, names);
  const required = layout.required;
  if (required !== undefined && !entries.some((entry) => standsFor(entry, layout, required))) {
    found.mistakes.push(
      mistake(
        `${folder}/${required}`,
        `the file ${required} in the folder ${path.posix.basename(folder)}`,
        "nothing",
        "Write it, or take the folder away.",
      ),
    );
  }
  return found;
}

function take(found: Found, file: string, entry: Dirent, layout: Folder, names: readonly string[]): void {
  const place = placeOf(entry, layout);
  if (!place) {
    found.mistakes.push(strayMistake(file, entry, layout));
  } else if (place.kind === "folder") {
    const below = contentFiles(file, place, Object.hasOwn(layout.named, entry.name) ? names : [...names, entry.name]);
    found.files.push(...below.files);
    found.mistakes.push(...below.mistakes);
  } else if (place.kind !== "unread") {
    const own = Object.hasOwn(layout.named, entry.name) ? [] : [path.posix.parse(entry.name).name];
    found.files.push({ file, layout: place, name: [...names, ...own].join("/") });
  }
}

/** What the layout has for this entry, if the entry is of the right sort: a plain file or a folder, never a link. */
function placeOf(entry: Dirent, layout: Folder): Layout | undefined {
  const named = Object.hasOwn(layout.named, entry.name) ? layout.named[entry.name] : undefined;
  if (named) return isRightSort(entry, named) ? named : undefined;
  if (entry.isDirectory()) return layout.folders;
  return entry.isFile() && layout.files && entry.name.endsWith(layout.files.ending) ? layout.files.layout : undefined;
}

function isRightSort(entry: Dirent, place: Layout): boolean {
  if (place.kind === "unread") return entry.isFile() || entry.isDirectory();
  return place.kind === "folder" ? entry.isDirectory() : entry.isFile();
}

/** Whether the entry is the required file or most likely meant to be it. */
function standsFor(entry: Dirent, layout: Folder, required: string): boolean {
  return (
    entry.name === required || (!placeOf(entry, layout) && nearest(entry.name, Object.keys(layout.named)) === required)
  );
}

function strayMistake(file: string, entry: Dirent, layout: Folder): Mistake {
  const known = Object.keys(layout.named).sort();
  const more = [
    ...(layout.files ? [`a file ending in ${layout.files.ending}`] : []),
    ...(layout.folders ? ["a folder of its own"] : []),
  ];
  const expected = [...(known.length > 0 ? [listText(known, "or")] : []), ...more].join(" or ");
  const sort = entry.isFile() ? "the file" : entry.isDirectory() ? "the folder" : "a link or device";
  const near = nearest(entry.name, known);
  const advice =
    near !== undefined && near !== entry.name ? didYouMean(entry.name, known, "name") : "Rename it, or take it away.";
  return mistake(file, expected, `${sort} ${receivedText(entry.name)}`, advice);
}

function mistake(file: string, expected: string, received: string, advice: string): Mistake {
  return { file, line: 1, column: 1, pointer: "", expected, received, advice };
}
