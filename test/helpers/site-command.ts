import { execFile } from "node:child_process";
import { fileURLToPath } from "node:url";

/** What a command printed and how it ended. */
export interface Ended {
  readonly code: number;
  readonly out: string;
  readonly err: string;
}

const root = fileURLToPath(new URL("../..", import.meta.url));

/** Runs a command as a user does, in a process of its own and in the program's folder. */
export function runCommand(args: readonly string[], env: Readonly<Record<string, string>> = {}): Promise<Ended> {
  return new Promise((resolve) => {
    const options = { cwd: root, env: { ...process.env, ...env }, maxBuffer: 64 * 1024 * 1024 };
    execFile(process.execPath, ["compute/command/launch.js", ...args], options, (error, out, err) =>
      resolve({ code: typeof error?.code === "number" ? error.code : error ? 1 : 0, out, err }),
    );
  });
}
