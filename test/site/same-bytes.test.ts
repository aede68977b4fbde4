import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { expect, test } from "vitest";
import { runCommand } from "../helpers/site-command.ts";
import { siteFiles } from "../helpers/site-files.ts";
import { siteMade } from "../helpers/site-made.ts";

/** Half a day apart, with other words for months and another decimal sign. */
const MACHINES = [
  { TZ: "Pacific/Auckland", LANG: "de_DE.UTF-8", LC_ALL: "de_DE.UTF-8" },
  { TZ: "America/Los_Angeles", LANG: "C", LC_ALL: "C" },
];

test("the same content and date give the same bytes on machines of other zones and languages", async () => {
  const site = siteMade("site");
  const folder = mkdtempSync(path.join(tmpdir(), "same-bytes-"));
  try {
    for (const [index, machine] of MACHINES.entries()) {
      const out = path.join(folder, String(index));
      const { code, err } = await runCommand(["build", "--as-of", "2027-03-15", "--out", out], machine);
      expect(code, err).toBe(0);
      expect(siteFiles(out)).toEqual(siteFiles(site));
      const differing = siteFiles(site).filter(
        (file) => !readFileSync(path.join(out, file)).equals(readFileSync(path.join(site, file))),
      );
      expect(differing).toEqual([]);
    }
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
});
