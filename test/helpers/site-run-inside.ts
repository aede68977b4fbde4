import type { Outcome } from "../../compute/command/command.ts";
import { commands } from "../../compute/command/commands.ts";

/** Runs a command inside the test, for what needs no process of its own: options, mistakes, text. */
export async function runInside(name: string, ...args: readonly string[]): Promise<Outcome> {
  const command = commands[name];
  if (!command) throw new Error(`there is no command "${name}"`);
  return command.run(args, { root: process.cwd(), bundle: "none" });
}
