import { readdirSync } from "node:fs";
import path from "node:path";

/** Files of a folder by their path from it, with forward slashes, in order. */
export function siteFiles(folder: string): readonly string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((each) => each.isFile())
    .map((each) => path.relative(folder, path.join(each.parentPath, each.name)).split(path.sep).join("/"))
    .sort();
}
