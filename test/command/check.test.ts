import { describe, expect, test } from "vitest";
import { contentCopy } from "../helpers/site-content.ts";
import { runInside } from "../helpers/site-run-inside.ts";

const STATEMENT = "projects/saltpan-quay/breaking-out/statement.json";

describe("check", () => {
  test("says in one line that there is no mistake", async () => {
    const { content } = contentCopy();
    const { code, out, err } = await runInside("check", "--content", content);
    expect([code, err]).toEqual([0, ""]);
    expect(out).toMatch(/^\d+ documents and 2 issued revisions, no mistakes\n$/);
  });

  test("names every mistake of every document in a line each, and counts them", async () => {
    const { content, change } = contentCopy();
    change(STATEMENT, '"shiftH": 9.5', '"shiftH": 95');
    change("projects/saltpan-quay/project.json", '"timeZone": "Europe/London"', '"timeZone": "Europe/Lundon"');
    const { code, out, err } = await runInside("check", "--content", content);
    expect([code, out]).toEqual([1, ""]);
    const lines = err.trimEnd().split("\n");
    expect(lines).toHaveLength(3);
    expect(lines[0]).toMatch(/statement\.json:\d+:\d+ \/shiftH: expected .*, received 95\./);
    expect(lines[1]).toMatch(/project\.json:\d+:\d+ \/timeZone: expected .*, received "Europe\/Lundon"\./);
    expect(lines[2]).toBe("2 mistakes in 2 files");
  });

  test("names a zone that passes the boundary without an answer", async () => {
    const { content, change } = contentCopy();
    change("projects/saltpan-quay/sheet-piling/statement.json", '"plant": "piler",', '"plant": "crane",');
    const { code, out, err } = await runInside("check", "--content", content);
    expect([code, out]).toEqual([1, ""]);
    expect(err).toMatch(/sheet-piling\/statement\.json:\d+:\d+ .*boundary/);
  });

  test("names a language that has no words", async () => {
    const { content, change } = contentCopy();
    change("projects/saltpan-quay/project.json", '"languages": ["en"],', '"languages": ["en", "cy"],');
    const { code, out, err } = await runInside("check", "--content", content);
    expect([code, out]).toEqual([1, ""]);
    expect(err).toMatch(
      /project\.json:\d+:\d+ \/languages\/1: expected a language whose words are in content\/wording: "en", received "cy"\. Write content\/wording\/cy\.json, or take the language out\.\n/,
    );
  });

  test("names a folder that is not there", async () => {
    const { code, out, err } = await runInside("check", "--content", "no/such/folder");
    expect([code, out]).toEqual([1, ""]);
    expect(err).toMatch(
      /^no\/such\/folder:1:1 \/: expected a content folder, received nothing\. .*\n1 mistake in 1 file\n$/,
    );
  });
});
