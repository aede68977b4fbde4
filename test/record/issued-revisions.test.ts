import { mkdirSync, mkdtempSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import type { Revision } from "../../compute/documents/types/revision.gen.ts";
import { issuedRevisions, RecordError, revisionFile, revisionsOf } from "../../compute/record/issued-revisions.ts";
import { makeRevision } from "../../compute/record/make-revision.ts";
import { shapeProblem } from "../../compute/record/shape-problem.ts";
import { writeRevision } from "../../compute/record/write-revision.ts";
import { ISSUE } from "../helpers/demo-revisions.ts";
import { changedLeaf, kindOf, leavesOf, setLeaf } from "../helpers/leaves.ts";
import { sceneInputs } from "../helpers/scene-inputs.ts";

const wording = { en: { language: "en", sections: { common: { invented: "Invented example" } } } };
const first = makeRevision(sceneInputs(), wording, ISSUE);
const second = makeRevision(
  sceneInputs(({ statement }) => {
    statement.shiftH = 9;
  }),
  wording,
  { ...ISSUE, number: 2 },
);

let content = "";
beforeEach(() => {
  content = mkdtempSync(path.join(tmpdir(), "record-"));
});
afterEach(() => rmSync(content, { recursive: true, force: true }));

const file = (number: number) => revisionFile(content, "tide-mill", "sluice", number);
const put = (number: number, text: string) => {
  mkdirSync(path.dirname(file(number)), { recursive: true });
  writeFileSync(file(number), text);
};
/** The whole message with which the content folder is refused. */
function refusal(): string {
  try {
    issuedRevisions(content);
  } catch (error) {
    if (!(error instanceof RecordError)) throw error;
    return error.message;
  }
  throw new Error("the record was taken");
}

describe("a record as it was issued", () => {
  test("is read back by phase, in the order of the numbers", () => {
    expect(writeRevision(content, first)).toBe(file(1));
    writeRevision(content, second);
    expect(issuedRevisions(content)).toEqual([{ project: "tide-mill", phase: "sluice", revisions: [first, second] }]);
    expect(revisionsOf(content, "tide-mill", "sluice")).toEqual([first, second]);
  });
  test("may be written with other white space and another order of keys", () => {
    const turned = Object.fromEntries(Object.entries(first).reverse());
    put(1, JSON.stringify(turned, null, 4));
    expect(issuedRevisions(content)[0]?.revisions[0]?.digest).toBe(first.digest);
  });
  test("is empty without a folder", () => {
    expect(issuedRevisions(content)).toEqual([]);
    expect(revisionsOf(content, "tide-mill", "sluice")).toEqual([]);
  });
  test("is not hurt by what a broken write left behind", () => {
    writeRevision(content, first);
    writeFileSync(path.join(path.dirname(file(1)), ".2.4711.part"), "{");
    expect(revisionsOf(content, "tide-mill", "sluice")).toHaveLength(1);
  });
});

describe("a file that was changed after issue", () => {
  test("is refused by name with both digests", () => {
    put(1, JSON.stringify({ ...first, toolVersion: "0.0.1" }));
    expect(refusal()).toMatch(
      new RegExp(
        `^${file(1)}: expected the digest ${first.digest.slice(0, 12)}… that it was issued with, received [0-9a-f]{12}…\\. The file was changed after issue: restore it, or issue a new revision\\.$`,
      ),
    );
  });
  test("is refused after one changed character in any kind of leaf, by digest or by shape, never taken", () => {
    const copy = structuredClone(first) as Revision;
    const kinds = new Map(leavesOf(copy).map((leaf) => [kindOf(leaf), leaf]));
    expect(kinds.size).toBeGreaterThan(300);
    for (const [kind, leaf] of kinds) {
      setLeaf(copy, leaf.path, changedLeaf(leaf));
      put(1, JSON.stringify(copy));
      setLeaf(copy, leaf.path, leaf.value);
      expect(refusal().startsWith(`${file(1)}: expected `), kind).toBe(true);
    }
  }, 60_000);
  test("is refused when a member is taken away or added", () => {
    const { governing: _governing, ...less } = first;
    put(1, JSON.stringify(less));
    expect(refusal()).toBe(
      `${file(1)}: expected a revision as the tool writes it, received one whose / must have required property 'governing'. Restore the file as it was issued.`,
    );
    put(1, JSON.stringify({ ...first, remark: "fine" }));
    expect(refusal()).toBe(
      `${file(1)}: expected a revision as the tool writes it, received one whose / must NOT have additional properties. Restore the file as it was issued.`,
    );
  });
});

describe("a file that is not what its name says", () => {
  test("a missing number", () => {
    writeRevision(content, first);
    writeRevision(content, second);
    renameSync(file(1), file(3));
    expect(refusal()).toBe(
      `${file(1)}: expected revision 1 of 2 files, received nothing. Restore the file; revisions are never removed or renamed.`,
    );
  });
  test("a name that is no number", () => {
    writeRevision(content, first);
    writeFileSync(path.join(path.dirname(file(1)), "one.json"), "{}");
    expect(refusal()).toBe(
      `${file(2)}: expected revision 2 of 2 files, received nothing. Restore the file; revisions are never removed or renamed.`,
    );
  });
  test("another number", () => {
    put(1, JSON.stringify(second));
    expect(refusal()).toBe(
      `${file(1)}: expected revision 1 of tide-mill/sluice, received tide-mill/sluice 2. Restore the file to its own place.`,
    );
  });
  test("another phase", () => {
    const other = revisionFile(content, "tide-mill", "weir", 1);
    mkdirSync(path.dirname(other), { recursive: true });
    writeFileSync(other, JSON.stringify(first));
    expect(refusal()).toBe(
      `${other}: expected revision 1 of tide-mill/weir, received tide-mill/sluice 1. Restore the file to its own place.`,
    );
  });
  test("no JSON", () => {
    put(1, "{ half");
    expect(refusal()).toMatch(
      new RegExp(
        `^${file(1)}: expected JSON, received text that cannot be read \\(.+\\)\\. Restore the file as it was issued\\.$`,
      ),
    );
  });
  test("JSON of another shape", () => {
    put(1, "[]");
    expect(refusal()).toBe(
      `${file(1)}: expected a revision as the tool writes it, received one whose / must be object. Restore the file as it was issued.`,
    );
  });
});

describe("writing", () => {
  test("never goes over a number that is taken, and leaves nothing behind", () => {
    writeRevision(content, first);
    const before = readFileSync(file(1), "utf8");
    expect(() => writeRevision(content, { ...second, number: 1 } as Revision)).toThrowError(/EEXIST/);
    expect(readFileSync(file(1), "utf8")).toBe(before);
    expect(readdirSync(path.dirname(file(1)))).toEqual(["1.json"]);
  });
  test("refuses a revision of the wrong shape before it touches the disk", () => {
    const wrong = { ...first, figures: "none" } as unknown as Revision;
    expect(shapeProblem("revision", wrong)).toBe("/figures must be array");
    expect(() => writeRevision(content, wrong)).toThrowError("revision 1 of tide-mill/sluice: /figures must be array");
    expect(readdirSync(content)).toEqual([]);
  });
});
