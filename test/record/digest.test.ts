import { describe, expect, test } from "vitest";
import type { Revision } from "../../compute/documents/types/revision.gen.ts";
import { digestOf, revisionDigest } from "../../compute/record/digest.ts";
import { makeRevision } from "../../compute/record/make-revision.ts";
import { shapeProblem } from "../../compute/record/shape-problem.ts";
import { demo, demoRevisions, ISSUE } from "../helpers/demo-revisions.ts";
import { changedLeaf, kindOf, type Leaf, leavesOf, setLeaf } from "../helpers/leaves.ts";
import { sceneInputs } from "../helpers/scene-inputs.ts";

describe("a digest", () => {
  test("is SHA-256 over the canonical form", () => {
    // [read] FIPS 180-2, example "abc", and RFC 8785, 3.2.3, whose canonical form of the string "abc" is "abc" in quotes.
    // [derived] sha256sum of the five bytes "abc" with its quotes, and of {"a":1,"b":[true,null]}.
    expect(digestOf("abc")).toBe("6cc43f858fbb763301637b5af970e2a46b46f461f27e5a0f41e009c59b827b25");
    expect(digestOf({ b: [true, null], a: 1 })).toBe(
      "1cc69c7fa23616ca2ec3ee70d24390a6225c8832db8a4c814c7e0e7f942f8668",
    );
  });
  test("does not heed white space or the order of keys", () => {
    const one = JSON.parse('{ "a": 1.50, "b": { "c": [1, 2], "d": "ä" } }') as unknown;
    const other = JSON.parse('{"b":{"d":"\\u00e4","c":[1,2]},"a":1.5}') as unknown;
    expect(digestOf(one)).toBe(digestOf(other));
    expect(digestOf({ a: [1, 2] })).not.toBe(digestOf({ a: [2, 1] }));
  });
  test("refuses what has no JSON form", () => {
    expect(() => digestOf(undefined)).toThrowError("a value without a JSON form has no digest");
  });
});

describe.each(demoRevisions().map((revision, index) => [revision.phase, revision, index] as const))(
  "revision of %s",
  (_, revision, index) => {
    test("is as its schema says", () => {
      expect(shapeProblem("revision", revision)).toBeUndefined();
    });
    test("is the same when it is made again from the same documents", () => {
      const { drafts, content } = demo();
      const inputs = drafts[index]?.inputs;
      if (!inputs) throw new Error("no such draft");
      const again = makeRevision(structuredClone(inputs), Object.fromEntries(content.wording), ISSUE);
      expect(again).toEqual(revision);
    });
    test("keeps its digest through its file, whatever the order of its keys", () => {
      const turned = (value: unknown): unknown =>
        Array.isArray(value)
          ? value.map(turned)
          : typeof value === "object" && value !== null
            ? Object.fromEntries(
                Object.entries(value)
                  .reverse()
                  .map(([key, each]) => [key, turned(each)]),
              )
            : value;
      const read = JSON.parse(JSON.stringify(turned(revision), null, 2)) as typeof revision;
      expect(Object.keys(read)[0]).not.toBe(Object.keys(revision)[0]);
      expect(revisionDigest(read)).toBe(revision.digest);
      expect(revisionDigest({ ...read, $schema: "../../revision.schema.json" } as never)).toBe(revision.digest);
    });
  },
);

const wording = { en: { language: "en", sections: { common: { invented: "Invented example" } } } };
const scene = makeRevision(sceneInputs(), wording, ISSUE);
const sealed = (leaf: Leaf) => leaf.path[0] !== "digest";

/** Kinds of leaf whose change leaves the digest as it is. */
function unheeded(revision: Revision, leaves: readonly Leaf[]): readonly string[] {
  const copy = structuredClone(revision);
  return leaves.flatMap((leaf) => {
    setLeaf(copy, leaf.path, changedLeaf(leaf));
    const same = revisionDigest(copy) === revision.digest;
    setLeaf(copy, leaf.path, leaf.value);
    return same ? [kindOf(leaf)] : [];
  });
}

describe("one changed character changes the digest", () => {
  test("in every single leaf of the revision of the scene worked out by hand", () => {
    const leaves = leavesOf(scene).filter(sealed);
    expect(leaves.length).toBeGreaterThan(3000);
    expect(unheeded(scene, leaves)).toEqual([]);
  }, 60_000);
  test.each(demoRevisions().map((revision) => [revision.phase, revision] as const))(
    "in one leaf of each kind that %s has besides",
    (_, revision) => {
      const known = new Set(leavesOf(scene).map(kindOf));
      const others = leavesOf(revision).filter((leaf) => sealed(leaf) && !known.has(kindOf(leaf)));
      const kinds = new Map(others.map((leaf) => [kindOf(leaf), leaf]));
      expect(kinds.size).toBeGreaterThan(0);
      expect(unheeded(revision, [...kinds.values()])).toEqual([]);
    },
    60_000,
  );
});
