import type { Stands } from "../documents/types/common.gen.ts";
import type { StatementInputs } from "./inputs.ts";
import { entry } from "./inputs.ts";

interface Standing {
  readonly standsFrom?: Stands | undefined;
  readonly standsUntil?: Stands | undefined;
}

/**
 * Whether something stands on every day from `from` to `until`; an activity sees nothing less.
 *
 * @param inputs  for the dates of phases
 * @param thing   with its first and last day, a date or a phase; without them it stands always
 * @param from, until  first and last date of an activity
 */
export function standsThroughout(inputs: StatementInputs, thing: Standing, from: string, until: string): boolean {
  const first = thing.standsFrom && firstDay(inputs, thing.standsFrom);
  const last = thing.standsUntil && lastDay(inputs, thing.standsUntil);
  return (first === undefined || first <= from) && (last === undefined || last >= until);
}

function firstDay(inputs: StatementInputs, stands: Stands): string {
  return stands.kind === "date" ? stands.date : entry(inputs.phases, stands.phase, "phase").from;
}

function lastDay(inputs: StatementInputs, stands: Stands): string {
  return stands.kind === "date" ? stands.date : entry(inputs.phases, stands.phase, "phase").until;
}
