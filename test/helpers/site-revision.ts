import { readFileSync } from "node:fs";
import path from "node:path";
import type { Revision } from "../../compute/documents/types/revision.gen.ts";

/** The sealed revision that the pages in a folder of the site are made from; the demo's phases have one each. */
export function sealedRevision(site: string, folder: string): Revision {
  const own = folder.endsWith("/r1") ? folder : path.posix.join(folder, "r1");
  return JSON.parse(readFileSync(path.join(site, own, "revision.json"), "utf8")) as Revision;
}
