import { readFileSync } from "node:fs";
import path from "node:path";
import { describe, expect, test } from "vitest";
import type { Revision } from "../../compute/documents/types/revision.gen.ts";
import { runCommand } from "../helpers/site-command.ts";
import { contentCopy, contentsOf } from "../helpers/site-content.ts";
import { runInside } from "../helpers/site-run-inside.ts";

const PHASE = "saltpan-quay/breaking-out";
const ISSUED = `projects/${PHASE}/issued`;
const STATEMENT = `projects/${PHASE}/statement.json`;

describe("issue", () => {
  test("writes the next revision, once, with a date that does not run back, and leaves the others as they are", async () => {
    const { content, change } = contentCopy("without-revisions");
    const issue = (asOf: string) => runInside("issue", PHASE, "--as-of", asOf, "--content", content);
    const first = await issue("2026-12-01");
    expect(first).toMatchObject({ code: 0, err: "" });
    const file = path.join(content, ISSUED, "1.json");
    const revision = JSON.parse(readFileSync(file, "utf8")) as Revision;
    expect(first.out).toBe(
      `${PHASE}: revision 1 issued on 2026-12-01, digest ${revision.digest.slice(0, 12)}, ${file}\n`,
    );
    const kept = readFileSync(file);

    expect(await issue("2026-12-02")).toEqual({
      code: 1,
      out: "",
      err: `${PHASE}: expected a draft that differs from revision 1, received the same documents. Nothing was issued.\n`,
    });

    change(STATEMENT, '"en": "Casting the wall"', '"en": "Casting the new wall"');
    expect(await issue("2026-11-30")).toEqual({
      code: 1,
      out: "",
      err: `${PHASE}: expected a date of issue from 2026-12-01 on, the date of revision 1, received 2026-11-30. Check the clock or --as-of.\n`,
    });
    expect(Object.keys(contentsOf(path.join(content, ISSUED)))).toEqual(["1.json"]);

    expect(await issue("2026-12-01")).toMatchObject({ code: 0, out: expect.stringContaining("revision 2 issued") });
    expect(Object.keys(contentsOf(path.join(content, ISSUED)))).toEqual(["1.json", "2.json"]);
    expect(readFileSync(file).equals(kept)).toBe(true);
  });

  test("refuses a phase that is not there, with the nearest", async () => {
    expect(await runInside("issue", "saltpan-quay/breaking-ot")).toEqual({
      code: 1,
      out: "",
      err: "issue: there is no statement saltpan-quay/breaking-ot; did you mean saltpan-quay/breaking-out? See npm run issue -- --help\n",
    });
  });

  test("refuses a day that is none", async () => {
    const { content } = contentCopy("without-revisions");
    expect(await runInside("issue", PHASE, "--as-of", "2027-02-30", "--content", content)).toEqual({
      code: 1,
      out: "",
      err: "issue: expected --as-of as a calendar date like 2027-03-08, received 2027-02-30. See npm run issue -- --help\n",
    });
  });

  test("issues nothing from content with a mistake", async () => {
    const { content, change } = contentCopy("without-revisions");
    change(STATEMENT, '"shiftH": 9.5', '"shiftH": 95');
    const { code, out, err } = await runInside("issue", PHASE, "--content", content);
    expect([code, out]).toEqual([1, ""]);
    expect(err).toMatch(/statement\.json:\d+:\d+ \/shiftH: expected .*, received 95\./);
    expect(contentsOf(path.join(content, `projects/${PHASE}`))).not.toHaveProperty("issued/1.json");
  });

  test("writes the same bytes on machines of other zones and languages", async () => {
    const machines = [
      { TZ: "Pacific/Auckland", LANG: "de_DE.UTF-8", LC_ALL: "de_DE.UTF-8" },
      { TZ: "America/Los_Angeles", LANG: "C", LC_ALL: "C" },
    ];
    const files: Buffer[] = [];
    for (const machine of machines) {
      const { content } = contentCopy("without-revisions");
      const { code, err } = await runCommand(["issue", PHASE, "--as-of", "2026-12-01", "--content", content], machine);
      expect(code, err).toBe(0);
      files.push(readFileSync(path.join(content, ISSUED, "1.json")));
    }
    expect(files[0]?.equals(files[1] as Buffer)).toBe(true);
  });
});
