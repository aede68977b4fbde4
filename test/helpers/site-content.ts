import { cpSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { onTestFinished } from "vitest";
import { siteFiles } from "./site-files.ts";

/** A copy of the demo's content that a test may spoil. */
export interface ContentCopy {
  /** Temporary folder that holds everything; gone after the test. */
  readonly folder: string;
  readonly content: string;
  /** Puts one piece of text in the place of another that stands once in a file of the content. */
  readonly change: (file: string, from: string, to: string) => void;
}

/** Copies the demo's content for one test, with the issued revisions or without them. */
export function contentCopy(issued: "with-revisions" | "without-revisions" = "with-revisions"): ContentCopy {
  const folder = mkdtempSync(path.join(tmpdir(), "content-"));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  const content = path.join(folder, "content");
  const isKept = (from: string) => issued === "with-revisions" || path.basename(from) !== "issued";
  cpSync("content", content, { recursive: true, filter: isKept });
  return {
    folder,
    content,
    change: (file, from, to) => {
      const text = readFileSync(path.join(content, file), "utf8");
      if (text.split(from).length !== 2)
        throw new Error(`${file}: "${from}" stands ${text.split(from).length - 1} times`);
      writeFileSync(path.join(content, file), text.replace(from, to));
    },
  };
}

/** What stands in a folder, file by file; nothing if there is no such folder. */
export function contentsOf(folder: string): Readonly<Record<string, string>> {
  return Object.fromEntries(siteFiles(folder).map((file) => [file, readFileSync(path.join(folder, file), "latin1")]));
}

/** Names beside each other in a folder. */
export function namesIn(folder: string): readonly string[] {
  return readdirSync(folder).sort();
}
