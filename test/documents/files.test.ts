import { symlinkSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import { loadContent } from "../../compute/documents/load-content.ts";
import { editedTexts, mistakeLines, withFolder } from "./content-folder.ts";
import { PROJECT, STATEMENT } from "./expect-mistake.ts";

/** Lines of the base with some more files, or without some. */
function linesWith(more: Readonly<Record<string, string | Uint8Array | undefined>>): readonly string[] {
  const texts = Object.entries({ ...editedTexts([]), ...more }).filter(([, text]) => text !== undefined);
  return mistakeLines(Object.fromEntries(texts) as Record<string, string | Uint8Array>);
}

describe("files that do not belong", () => {
  test("a statement under a mistyped name is one mistake", () => {
    const text = editedTexts([])[STATEMENT] ?? "";
    expect(
      linesWith({
        [STATEMENT]: undefined,
        "projects/north-quay/piling/statment.json": text,
        [PROJECT]: quietProject(),
      }),
    ).toEqual([
      'projects/north-quay/piling/statment.json:1:1 /: expected "issued", "standing.json" or "statement.json", received the file "statment.json". Did you mean "statement.json"?',
    ]);
  });

  test("a folder of sheets under a mistyped name", () => {
    expect(linesWith({ "data-sheets/panel/mesh.json": "{}" })).toEqual([
      'data-sheets/panel:1:1 /: expected "linings", "panels", "plant" or "silencers", received the folder "panel". Did you mean "panels"?',
    ]);
  });

  test("a file of another sort", () => {
    expect(linesWith({ "data-sheets/panels/mesh.txt": "mesh" })).toEqual([
      'data-sheets/panels/mesh.txt:1:1 /: expected a file ending in .json, received the file "mesh.txt". Rename it, or take it away.',
    ]);
  });

  test("a phase without its statement", () => {
    expect(linesWith({ "projects/north-quay/digging/issued/1.json": "{}" })).toEqual([
      "projects/north-quay/digging/statement.json:1:1 /: expected the file statement.json in the folder digging, received nothing. Write it, or take the folder away.",
    ]);
  });

  test("a project without its document", () => {
    expect(linesWith({ [PROJECT]: undefined })).toEqual([
      "projects/north-quay/project.json:1:1 /: expected the file project.json in the folder north-quay, received nothing. Write it, or take the folder away.",
    ]);
  });

  test("what other parts read, and hidden files, are passed over", () => {
    const more = {
      "projects/north-quay/piling/issued/1.json": "not JSON",
      "projects/north-quay/piling/standing.json": "not JSON",
      "projects/north-quay/measured/gate/2027.json": "not JSON",
      "data-sheets/.keep": "",
    };
    expect(linesWith(more)).toEqual([]);
  });

  test("a link, which could lead out of the folder", () => {
    const lines = withFolder(editedTexts([]), (folder) => {
      symlinkSync("/etc/hostname", path.join(folder, "duties/other.json"));
      const loaded = loadContent(folder);
      return loaded.kind === "valid" ? [] : loaded.mistakes.map((mistake) => [mistake.expected, mistake.received]);
    });
    expect(lines).toEqual([["a file ending in .json", 'a link or device "other.json"']]);
  });

  test("no folder at all", () => {
    expect(loadContent("no-such-folder")).toEqual({
      kind: "invalid",
      mistakes: [
        {
          file: "no-such-folder",
          line: 1,
          column: 1,
          pointer: "",
          expected: "a content folder",
          received: "nothing",
          advice: "Name the folder that holds projects, data-sheets, limits, duties and wording.",
        },
      ],
    });
  });
});

/** The project without a reference to its phase. */
function quietProject(): string {
  return (
    editedTexts([
      [PROJECT, "/buildings/1/standsUntil"],
      [PROJECT, "/excavations/0/standsFrom"],
    ])[PROJECT] ?? ""
  );
}

describe("files that cannot be read", () => {
  const SHEET = "data-sheets/silencers/louvre.json";
  test.each([
    [
      "no comma",
      '{\n  "id": "louvre"\n  "invented": true\n}',
      '3:3 /: expected a comma, received "\\"invented\\"". Put a comma between two fields or entries.',
    ],
    [
      "a comma too many",
      '{\n  "id": "louvre",\n}',
      '3:1 /: expected the name of a field in double quotes, received "}". Take the comma before a closing brace away, or add the field.',
    ],
    [
      "a comma too many in a list",
      "[1,\n]",
      '2:1 /: expected a value, received "]". Take the comma before a closing bracket away, or add the value.',
    ],
    [
      "a comment",
      "{\n  // note\n}",
      '2:3 /: expected JSON without comments, received "// note". Take the comment away; a source may have a note.',
    ],
    [
      "single quotes",
      "{ 'id': 1 }",
      "1:3 /: expected a JSON value, received \"'id'\". Write text in double quotes; true, false and numbers without.",
    ],
    ["text without its end", '{\n  "id": "louvre\n}', '2:9 /: expected a closing double quote, received "\\"louvre".'],
    ["a brace missing", '{\n  "id": "louvre"\n', "3:1 /: expected a closing brace, received the end of the file."],
    ["two documents", "{}\n{}", '2:1 /: expected the end of the file, received "{". One file holds one document.'],
    [
      "nothing",
      "",
      "1:1 /: expected a value, received the end of the file. Take the comma before a closing bracket away, or add the value.",
    ],
    [
      "no number",
      '{ "a": NaN }',
      '1:8 /: expected a JSON value, received "NaN". Write text in double quotes; true, false and numbers without.',
    ],
  ])("%s", (_title, text, line) => {
    expect(linesWith({ [SHEET]: text })).toEqual([`${SHEET}:${line}`]);
  });

  test("a field twice, which JSON itself would take in silence", () => {
    const text = '{\n  "id": "louvre",\n  "name": { "en": "a", "en": "b" },\n  "id": "louver"\n}';
    expect(linesWith({ [SHEET]: text })).toEqual([
      `${SHEET}:3:24 /name/en: expected each field once, received "en" again (first on line 3). Take one of the two away.`,
      `${SHEET}:4:3 /id: expected each field once, received "id" again (first on line 2). Take one of the two away.`,
    ]);
  });

  test("other bytes than UTF-8, and a byte order mark", () => {
    expect(linesWith({ [SHEET]: new Uint8Array([0x7b, 0xff, 0x7d]) })).toEqual([
      `${SHEET}:1:1 /: expected UTF-8 text, received other bytes. Save the file as UTF-8 without a byte order mark.`,
    ]);
    expect(linesWith({ [SHEET]: `\uFEFF${editedTexts([])[SHEET]}` })).toEqual([
      `${SHEET}:1:1 /: expected UTF-8 text, received a byte order mark. Save the file as UTF-8 without a byte order mark.`,
    ]);
  });
});
