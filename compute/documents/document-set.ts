import type { Entry } from "./content.ts";
import type { Mistake } from "./mistake.ts";
import type { DutySet } from "./types/duty-set.gen.ts";
import type { LimitSet } from "./types/limit-set.gen.ts";
import type { Lining } from "./types/lining.gen.ts";
import type { Panel } from "./types/panel.gen.ts";
import type { Plant } from "./types/plant.gen.ts";
import type { Project } from "./types/project.gen.ts";
import type { Silencer } from "./types/silencer.gen.ts";
import type { Statement } from "./types/statement.gen.ts";
import type { Wording } from "./types/wording.gen.ts";

/** The documents of one kind: those whose shape is right, and the names of all, so that a broken one is not called unknown. */
export interface Shelf<T> {
  readonly valid: ReadonlyMap<string, Entry<T>>;
  readonly names: ReadonlySet<string>;
}

/** What the rules look at: every document whose shape is right, by its file name; statements by `project/phase`. */
export interface DocumentSet {
  readonly texts: ReadonlyMap<string, string>;
  readonly project: Shelf<Project>;
  readonly statement: Shelf<Statement>;
  readonly plant: Shelf<Plant>;
  readonly panel: Shelf<Panel>;
  readonly lining: Shelf<Lining>;
  readonly silencer: Shelf<Silencer>;
  readonly "limit-set": Shelf<LimitSet>;
  readonly "duty-set": Shelf<DutySet>;
  readonly wording: Shelf<Wording>;
}

/** A rule that no schema can hold. */
export type Rule = (set: DocumentSet) => readonly Mistake[];
