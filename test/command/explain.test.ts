import { describe, expect, test } from "vitest";
import { revisionsOf } from "../../compute/record/issued-revisions.ts";
import { runInside } from "../helpers/site-run-inside.ts";

const PHASE = "saltpan-quay/sheet-piling";
const [revision] = revisionsOf("content", "saltpan-quay", "sheet-piling");
const key = revision?.periods[0]?.key ?? "";

describe("explain", () => {
  test("without a key lists the keys", async () => {
    const { code, out, err } = await runInside("explain", PHASE);
    expect([code, err]).toEqual([0, ""]);
    expect(out.trimEnd().split("\n")).toEqual(revision?.figures.map((figure) => figure.key));
  });

  test("with a key prints the issued value and where it comes from", async () => {
    const value = revision?.figures.find((figure) => figure.key === key)?.value;
    const { code, out, err } = await runInside("explain", PHASE, key);
    expect([code, err]).toEqual([0, ""]);
    expect(out).toContain(`${key}\n  issued ${value} dB(A), worked out again ${value} dB(A)`);
    expect(out).toMatch(/\[divergence, /);
    expect(out).toContain("\nproject /method");
  });

  test("with --json prints one object", async () => {
    const { code, out } = await runInside("explain", PHASE, key, "--json");
    expect(code).toBe(0);
    expect(JSON.parse(out)).toMatchObject({ figure: { key } });
    expect(out.endsWith("}\n")).toBe(true);
  });

  test("refuses a key that is not there, with the nearest", async () => {
    const mistyped = key.replace("level/", "levle/");
    expect(await runInside("explain", PHASE, mistyped)).toEqual({
      code: 1,
      out: "",
      err: `explain: there is no figure ${mistyped}; did you mean ${key}? See npm run explain -- --help\n`,
    });
    expect(await runInside("explain", PHASE, "nothing")).toEqual({
      code: 1,
      out: "",
      err: "explain: there is no figure nothing. See npm run explain -- --help\n",
    });
  });

  test("refuses a revision or a phase that is not there", async () => {
    expect(await runInside("explain", PHASE, key, "--revision", "7")).toEqual({
      code: 1,
      out: "",
      err: `explain: there is no revision 7 of ${PHASE}; issued: 1. See npm run explain -- --help\n`,
    });
    expect(await runInside("explain", "saltpan-quay/nothing")).toEqual({
      code: 1,
      out: "",
      err: "explain: there is no revision of saltpan-quay/nothing; issued: none. See npm run explain -- --help\n",
    });
  });
});
