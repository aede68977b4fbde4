import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import type { TestProject } from "vitest/node";
import { startBrowser } from "../../compute/command/browser.ts";
import { runCommand } from "./site-command.ts";

/** Something made once for all tests of the site, or the reason why it is not there: each test that asks for it then fails. */
type Made = { readonly kind: "made"; readonly at: string } | { readonly kind: "not-made"; readonly why: string };

declare module "vitest" {
  export interface ProvidedContext {
    /** Folder of the demo's site. */
    readonly site: Made;
    /** Address at which a browser waits. */
    readonly browser: Made;
  }
}

/** Date on which the demo's breaking out is in force and at work. */
const AS_OF = "2027-03-15";

/** Makes the demo's site and starts a browser. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const folder = mkdtempSync(path.join(tmpdir(), "site-"));
  const at = path.join(folder, "site");
  const { code, err } = await runCommand(["build", "--as-of", AS_OF, "--out", at]);
  project.provide("site", code === 0 ? { kind: "made", at } : { kind: "not-made", why: err });
  const browser = await startBrowser().catch((error: Error) => error);
  const isRunning = !(browser instanceof Error);
  console.log(isRunning ? `browser: ${browser.name}` : browser.message);
  project.provide(
    "browser",
    isRunning ? { kind: "made", at: browser.server.wsEndpoint() } : { kind: "not-made", why: browser.message },
  );
  return async () => {
    if (isRunning) await browser.server.close();
    rmSync(folder, { recursive: true, force: true });
  };
}
