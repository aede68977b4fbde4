import { WordError } from "../../templates/models/words.ts";
import { nearest } from "../documents/nearest.ts";
import { RecordError } from "../record/issued-revisions.ts";
import { BrowserError } from "./browser.ts";
import type { Command, Outcome, Place } from "./command.ts";
import { commands } from "./commands.ts";
import { OutputError } from "./fresh-folder.ts";
import { RenderError } from "./render-error.ts";

export { strict } from "../../templates/models/strict.ts";

/** Runs one command and prints what it leaves; the exit status comes back. */
export async function run(args: readonly string[], place: Place): Promise<number> {
  const [name = "", ...rest] = args;
  const command = Object.hasOwn(commands, name) ? commands[name] : undefined;
  if (!command) return print(name === "" || name === "--help" ? listed() : unknown(name));
  if (rest.includes("--help")) return print({ code: 0, out: command.help, err: "" });
  return print(await outcome(command, rest, place));
}

/** What the user can mend: sealed files, words, output folders, browsers. Anything else is our own fault and keeps its trace. */
const MENDABLE = [RecordError, OutputError, WordError, RenderError, BrowserError];

async function outcome(command: Command, args: readonly string[], place: Place): Promise<Outcome> {
  try {
    return await command.run(args, place);
  } catch (error) {
    if (error instanceof Error && MENDABLE.some((kind) => error instanceof kind))
      return { code: 1, out: "", err: `${error.message}\n` };
    throw error;
  }
}

function print({ code, out, err }: Outcome): number {
  // A reader such as `head` may close the pipe before all is written; that is no fault.
  process.stdout.on("error", (error: NodeJS.ErrnoException) => {
    if (error.code !== "EPIPE") throw error;
  });
  process.stdout.write(out);
  process.stderr.write(err);
  return code;
}

function listed(): Outcome {
  const lines = Object.entries(commands).map(([each, { summary }]) => `  npm run ${each.padEnd(9)} ${summary}\n`);
  return { code: 0, out: `Commands:\n${lines.join("")}`, err: "" };
}

function unknown(name: string): Outcome {
  const near = nearest(name, Object.keys(commands));
  return {
    code: 1,
    out: "",
    err: `there is no command "${name}"${near ? `; did you mean "${near}"?` : ""}\n${listed().out}`,
  };
}
