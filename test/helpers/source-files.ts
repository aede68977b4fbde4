import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";

export interface SourceFile {
  /** Path from the project's folder, with slashes. */
  readonly file: string;
  readonly text: string;
}

/** TypeScript files of a folder of the project, without those made from schemas. */
export function sourceFiles(folder: string): readonly SourceFile[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile() && entry.name.endsWith(".ts") && !entry.name.endsWith(".gen.ts"))
    .map((entry) => path.join(entry.parentPath, entry.name).split(path.sep).join("/"))
    .sort()
    .map((file) => ({ file, text: readFileSync(file, "utf8") }));
}

/** Files of the project that a file imports, with whether only types are taken. */
export function importsOf({ file, text }: SourceFile): readonly { readonly to: string; readonly typesOnly: boolean }[] {
  return [...text.matchAll(/^(?:import|export)\b(?: (type)\b)?[^;]*?from "(\.[^"]+)"/gm)].map(([, type, to = ""]) => ({
    to: path.posix.join(path.posix.dirname(file), to),
    typesOnly: type === "type",
  }));
}
