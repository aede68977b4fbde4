import { existsSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import type { BrowserServer } from "playwright-core";

/** A browser that runs and waits for connections, with the words that say which one it is. */
export interface RunningBrowser {
  readonly server: BrowserServer;
  readonly name: string;
}

/** No browser could be started: what was tried, and what to do. */
export class BrowserError extends Error {
  override readonly name = "BrowserError";
}

interface Candidate {
  readonly name: string;
  readonly place: () => Promise<Executable>;
}

interface Executable {
  readonly executablePath: string;
  readonly env?: NodeJS.ProcessEnv;
}

const FLAGS = [
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];
const SYSTEM = "/usr/bin/chromium";

/**
 * Starts the first browser there is: the one CHROMIUM_PATH names, the system's, the one of the npm package.
 *
 * @throws {BrowserError} if the named one, or none at all, can be started
 */
export async function startBrowser(): Promise<RunningBrowser> {
  const tried: string[] = [];
  for (const { name, place } of candidates()) {
    try {
      const { chromium } = await import("playwright-core");
      const server = await chromium.launchServer({ ...(await place()), args: FLAGS });
      return { server, name };
    } catch (error) {
      tried.push(`${name}: ${(error as Error).message.split("\n")[0] ?? "no reason given"}`);
    }
  }
  throw new BrowserError(
    `expected a browser, received none. Run npm ci, or install Chromium, or set CHROMIUM_PATH to one.\n${tried
      .map((line) => `  ${line}\n`)
      .join("")}`,
  );
}

/** A browser that is named has to be that one; there is no second choice. */
function candidates(): readonly Candidate[] {
  const named = process.env.CHROMIUM_PATH;
  if (named) return [{ name: `${named} (CHROMIUM_PATH)`, place: async () => ({ executablePath: named }) }];
  const system = { name: SYSTEM, place: async () => ({ executablePath: SYSTEM }) };
  const packaged = { name: `@sparticuz/chromium, unpacked to ${path.join(tmpdir(), "chromium")}`, place: unpacked };
  return existsSync(SYSTEM) ? [system, packaged] : [packaged];
}

/** The package sets library paths for its browser; this process keeps its own. */
async function unpacked(): Promise<Executable> {
  const own = { ...process.env };
  try {
    // Read by the package when it is imported: it then unpacks the system libraries it needs along with the browser.
    process.env.AWS_EXECUTION_ENV = "AWS_Lambda_nodejs20.x";
    const { default: chromium } = await import("@sparticuz/chromium");
    return { executablePath: await chromium.executablePath(), env: { ...process.env } };
  } finally {
    for (const name of Object.keys(process.env)) if (!(name in own)) delete process.env[name];
    Object.assign(process.env, own);
  }
}
