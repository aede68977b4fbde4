import type { DutySet } from "../documents/types/duty-set.gen.ts";
import type { LimitSet } from "../documents/types/limit-set.gen.ts";
import type { Lining } from "../documents/types/lining.gen.ts";
import type { Panel } from "../documents/types/panel.gen.ts";
import type { Plant } from "../documents/types/plant.gen.ts";
import type { Project } from "../documents/types/project.gen.ts";
import type { Silencer } from "../documents/types/silencer.gen.ts";
import type { Statement } from "../documents/types/statement.gen.ts";

type ById<T> = Readonly<Record<string, T>>;

/** Everything a statement's figures are worked out from; a revision seals exactly this. */
export interface StatementInputs {
  readonly project: Project;
  readonly statement: Statement;
  /** First and last date of each phase of the project, for what stands from or until a phase. */
  readonly phases: ById<{ readonly from: string; readonly until: string }>;
  readonly plant: ById<Plant>;
  readonly panels: ById<Panel>;
  readonly linings: ById<Lining>;
  readonly silencers: ById<Silencer>;
  readonly limits: ById<LimitSet>;
  readonly duties: ById<DutySet>;
}

/** The entry of an id; documents were validated before, so a missing one is our own fault. */
export function entry<T>(map: ById<T>, id: string, what: string): T {
  const found = map[id];
  if (found === undefined) throw new Error(`${what} "${id}" is not among the inputs of the statement`);
  return found;
}
