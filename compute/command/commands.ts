import { build } from "./build.ts";
import { calc, calcHelp, calcSummary } from "./calc.ts";
import { checkCommand } from "./check-command.ts";
import type { Command } from "./command.ts";
import { explain } from "./explain.ts";
import { issue } from "./issue.ts";
import { types } from "./types.ts";

/** Every command by name. */
export const commands: Readonly<Record<string, Command>> = {
  check: checkCommand,
  build,
  issue,
  explain,
  calc: { summary: calcSummary, help: calcHelp, run: (args) => calc(args) },
  types: {
    summary: "writes the TypeScript types of the schemas",
    help: "npm run types\n\nWrites compute/documents/types/<name>.gen.ts for every schema/<name>.schema.json.\n",
    run: (_args, { root }) => types(root),
  },
};
