import { loadValid } from "../../compute/command/load-valid.ts";
import type { StatementInputs } from "../../compute/statement/inputs.ts";

/** All of a value, to be altered by a test. */
export type Writable<T> = { -readonly [K in keyof T]: Writable<T[K]> };

const checked = loadValid("test/reference/worked-scene/content");
if (checked.kind === "invalid") throw new Error(JSON.stringify(checked.mistakes));
const [draft] = checked.drafts;
if (!draft) throw new Error("the worked scene has no draft");
const { inputs } = draft;

/** Inputs of the scene worked out by hand, a copy of its own for each test, altered by it. */
export function sceneInputs(alter: (inputs: Writable<StatementInputs>) => void = () => undefined): StatementInputs {
  const copy = structuredClone(inputs) as Writable<StatementInputs>;
  alter(copy);
  return copy;
}
