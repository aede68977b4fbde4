import { bench } from "./bench.ts";
import { build } from "./build.ts";
import { calc, calcHelp, calcSummary } from "./calc.ts";
import { check } from "./check.ts";
import type { Command } from "./command.ts";
import { explain } from "./explain.ts";
import { issue } from "./issue.ts";
import { pictures } from "./pictures.ts";
import { command as types } from "./types.ts";

/** Every command by name. */
export const commands: Readonly<Record<string, Command>> = {
  check,
  build,
  issue,
  explain,
  calc: { summary: calcSummary, help: calcHelp, run: (args) => calc(args) },
  bench,
  pictures,
  types,
};
