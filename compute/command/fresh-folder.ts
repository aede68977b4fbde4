import { existsSync, mkdirSync, readdirSync, renameSync, rmSync, statSync } from "node:fs";
import path from "node:path";

/** A folder beside the published one, in which a site is made before it takes the other's place. */
export interface FreshFolder {
  readonly folder: string;
  /** Puts the fresh folder in the published one's place: old aside, new in, old away. */
  readonly swapIn: () => void;
  /** Removes the fresh folder; the published one stays. */
  readonly drop: () => void;
}

/**
 * Puts right what an interrupted swap left behind: an old site whose place is empty goes back, half-made folders go away.
 * Comes before anything else, so that the last site stands whatever becomes of this build.
 */
export function mendSwap(out: string): void {
  if (existsSync(`${out}.old`) && !existsSync(out)) renameSync(`${out}.old`, out);
  rmSync(`${out}.old`, { recursive: true, force: true });
  rmSync(`${out}.new`, { recursive: true, force: true });
}

/** Makes a fresh folder beside `out`. */
export function freshFolder(out: string): FreshFolder {
  const old = `${out}.old`;
  const folder = `${out}.new`;
  refuseForeign(out);
  mkdirSync(folder, { recursive: true });
  return {
    folder,
    swapIn: () => {
      if (existsSync(out)) renameSync(out, old);
      renameSync(folder, out);
      rmSync(old, { recursive: true, force: true });
    },
    drop: () => rmSync(folder, { recursive: true, force: true }),
  };
}

/** A folder that holds something else than a site is never swapped away. */
function refuseForeign(out: string): void {
  if (!existsSync(out)) return;
  if (!statSync(out).isDirectory()) {
    throw new OutputError(
      `${path.resolve(out)}: expected a new folder or a site made before, received a file. Name another one with --out.`,
    );
  }
  const names = readdirSync(out);
  if (names.length > 0 && !names.includes("index.html")) {
    throw new OutputError(
      `${path.resolve(out)}: expected a new folder or a site made before, received a folder with other files. Name another one with --out.`,
    );
  }
}

/** Something about the output that the user can mend. */
export class OutputError extends Error {
  override readonly name = "OutputError";
}
