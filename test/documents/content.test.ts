import { describe, expect, test } from "vitest";
import { loadContent } from "../../compute/documents/load-content.ts";
import { mistakeAt } from "../../compute/documents/mistake-at.ts";
import { mistakeText } from "../../compute/documents/mistake-text.ts";
import { editedTexts, withFolder } from "./content-folder.ts";
import { PROJECT } from "./expect-mistake.ts";

describe("valid content", () => {
  test("is handed on by id, in the order of the ids", () => {
    const texts: Record<string, string> = {
      ...editedTexts([]),
      "method/limits.md": "# Limits\n",
      "method/accuracy.md": "# Accuracy\n",
    };
    withFolder(texts, (folder) => {
      const loaded = loadContent(folder);
      if (loaded.kind !== "valid") throw new Error(loaded.mistakes.map(mistakeText).join("\n"));
      const { content } = loaded;
      expect([...content.plant.keys()]).toEqual(["big-rig", "pump", "rig"]);
      expect([...content.method]).toEqual([
        ["accuracy", "# Accuracy\n"],
        ["limits", "# Limits\n"],
      ]);
      const project = content.projects.get("north-quay");
      expect(project?.project.title).toEqual({ en: "North Quay" });
      expect(project?.statements.get("piling")?.statement.activities[0]?.plant[0]?.onTimePct).toBe(40);
      expect(content.wording.get("en")?.sections.home?.title).toBe("Quiet hours");
      expect(content.texts.size).toBe(11);
      expect(content.texts.get(project?.file ?? "")).toBe(texts[PROJECT]);
    });
  });
});

describe("mistakeAt, for parts that find mistakes later", () => {
  const texts = new Map([["a.json", '{\n  "list": [\n    { "a/b": 1 },\n    { "c": 2 }\n  ]\n}\n']]);
  test("points at a value", () => {
    expect(mistakeText(mistakeAt(texts, "a.json", "/list/1/c", "1 m", "2 m", "Move it."))).toBe(
      "a.json:4:12 /list/1/c: expected 1 m, received 2 m. Move it.",
    );
  });
  test("points at a name, with a slash in it", () => {
    expect(mistakeText(mistakeAt(texts, "a.json", "/list/0/a~1b", "another name", '"a/b"', "", "name"))).toBe(
      'a.json:3:7 /list/0/a~1b: expected another name, received "a/b".',
    );
  });
  test("points at what is above something missing", () => {
    expect(mistakeText(mistakeAt(texts, "a.json", "/list/1/d", "a number", "nothing"))).toBe(
      "a.json:4:5 /list/1/d: expected a number, received nothing.",
    );
  });
  test("points at the start of a file that it does not know", () => {
    expect(mistakeText(mistakeAt(texts, "b.json", "", "a file", "nothing"))).toBe(
      "b.json:1:1 /: expected a file, received nothing.",
    );
  });
});
