import { describe, expect, test } from "vitest";
import { importsOf, type SourceFile, sourceFiles } from "../helpers/source-files.ts";

// design.md 4: templates → compute/{statement, record, figures} → compute/{acoustics, hearing, limits, programme} → compute/equations;
// compute/documents stands beside compute/equations, compute/geometry is a leaf, compute/command is above all.
const GROUND = ["compute/equations", "compute/geometry"];
const SUBJECTS = ["compute/acoustics", "compute/hearing", "compute/limits", "compute/programme"];
const BELOW_FIGURES = [...SUBJECTS, ...GROUND, "compute/documents"];
const MAY_IMPORT: Readonly<Record<string, readonly string[]>> = {
  "compute/geometry": [],
  "compute/equations": [],
  "compute/documents": ["compute/geometry"],
  ...Object.fromEntries(SUBJECTS.map((subject) => [subject, GROUND])),
  "compute/figures": BELOW_FIGURES,
  "compute/statement": ["compute/figures", ...BELOW_FIGURES],
  "compute/record": ["compute/statement", "compute/figures", ...BELOW_FIGURES],
  templates: ["compute/record", "compute/statement", "compute/figures", ...BELOW_FIGURES],
  "compute/command": ["templates", "compute/record", "compute/statement", "compute/figures", ...BELOW_FIGURES],
};

const compute = sourceFiles("compute");
const files = [...compute, ...sourceFiles("templates")];

/** The part of the program a file belongs to. */
function partOf(file: string): string {
  const [top = "", second = ""] = file.split("/");
  return top === "compute" ? `${top}/${second}` : top;
}

describe("imports", () => {
  test("run one way", () => {
    const wrong = files.flatMap((source) =>
      importsOf(source)
        .filter(({ to }) => {
          const [from, into] = [partOf(source.file), partOf(to)];
          return into !== from && into !== "schema" && !MAY_IMPORT[from]?.includes(into);
        })
        .map(({ to }) => `${source.file} imports ${to}`),
    );
    expect(wrong).toEqual([]);
  });
  test("every part of the program is known here", () => {
    const parts = new Set(files.map(({ file }) => partOf(file)));
    expect([...parts].filter((part) => !(part in MAY_IMPORT))).toEqual([]);
  });
  test("never go round in a circle", () => {
    const next = new Map(
      files.map((source) => [
        source.file,
        importsOf(source)
          .filter(({ typesOnly }) => !typesOnly)
          .map(({ to }) => to),
      ]),
    );
    const done = new Set<string>();
    const circles: string[] = [];
    const visit = (file: string, way: readonly string[]): void => {
      if (way.includes(file)) circles.push([...way.slice(way.indexOf(file)), file].join(" → "));
      else if (!done.has(file)) {
        for (const to of next.get(file) ?? []) visit(to, [...way, file]);
        done.add(file);
      }
    };
    for (const { file } of files) visit(file, []);
    expect(circles).toEqual([]);
  });
  test("only commands read templates, and no template reads a command", () => {
    const into = (part: string) =>
      new Set(
        files
          .filter((source) => importsOf(source).some(({ to }) => partOf(to) === part))
          .map(({ file }) => partOf(file)),
      );
    expect([...into("templates")].filter((part) => !["templates", "compute/command"].includes(part))).toEqual([]);
    expect([...into("compute/command")].filter((part) => part !== "compute/command")).toEqual([]);
  });
});

test("nothing is called utils", () => {
  const names = [...files, ...sourceFiles("test")].flatMap(({ file }) => file.split("/"));
  expect(names.filter((name) => /^utils?\b/i.test(name))).toEqual([]);
});

test("no file of the program has more than 250 lines", () => {
  expect(compute.filter(({ text }) => text.split("\n").length > 251).map(({ file }) => file)).toEqual([]);
});

describe("doc comments", () => {
  /** Exported functions without a comment right before them. */
  function bare({ file, text }: SourceFile): readonly string[] {
    const lines = text.split("\n");
    const exported = /^export (?:async )?function (\w+)|^export const (\w+)(?:: [^=]+)? = (?:async )?(?:\(|\w+ =>|<\w)/;
    return lines.flatMap((line, index) => {
      const [, named, constant] = exported.exec(line) ?? [];
      const name = named ?? constant;
      return name === undefined || lines[index - 1]?.trimEnd().endsWith("*/") ? [] : [`${file} ${name}`];
    });
  }
  // Their names say what they do; comments are still to be written.
  const TO_BE_WRITTEN = [
    "compute/equations/tex/read-symbol.ts isDelta",
    "compute/equations/tex/read-symbol.ts withDelta",
  ];
  test("stand before every exported function of compute", () => {
    expect(compute.flatMap(bare).filter((each) => !TO_BE_WRITTEN.includes(each))).toEqual([]);
  });
  test("are missed when they are not there", () => {
    const text =
      "export function a() {}\n/** b */\nexport function b() {}\nexport const c = (x: number) => x;\nexport const d = 1;\n";
    expect(bare({ file: "x.ts", text })).toEqual(["x.ts a", "x.ts c"]);
  });
});
