import type { Command, Outcome, Place } from "./command.ts";

const COMMANDS: Readonly<Record<string, () => Promise<Command>>> = {
  types: async () => (await import("./types.ts")).command,
};

/** Runs one command and prints what it leaves; the exit status comes back. */
export async function run(args: readonly string[], place: Place): Promise<number> {
  const [name = "", ...rest] = args;
  const load = COMMANDS[name];
  if (!load) return print(await unknown(name));
  const command = await load();
  if (rest.includes("--help")) return print({ code: 0, out: command.help, err: "" });
  return print(await command.run(rest, place));
}

function print({ code, out, err }: Outcome): number {
  process.stdout.write(out);
  process.stderr.write(err);
  return code;
}

async function unknown(name: string): Promise<Outcome> {
  const lines = await Promise.all(
    Object.entries(COMMANDS).map(async ([each, load]) => `  npm run ${each.padEnd(9)} ${(await load()).summary}\n`),
  );
  const list = `Commands:\n${lines.join("")}`;
  return name === ""
    ? { code: 0, out: list, err: "" }
    : { code: 1, out: "", err: `there is no command "${name}"\n${list}` };
}
