import type { DutySet } from "./types/duty-set.gen.ts";
import type { LimitSet } from "./types/limit-set.gen.ts";
import type { Lining } from "./types/lining.gen.ts";
import type { Panel } from "./types/panel.gen.ts";
import type { Plant } from "./types/plant.gen.ts";
import type { Project } from "./types/project.gen.ts";
import type { Silencer } from "./types/silencer.gen.ts";
import type { Statement } from "./types/statement.gen.ts";
import type { Wording } from "./types/wording.gen.ts";

/** A valid document and the file it stands in. */
export interface Entry<T> {
  readonly sheet: T;
  readonly file: string;
}

/** A valid project with the statements of its phases. */
export interface ProjectEntry {
  readonly project: Project;
  readonly file: string;
  readonly statements: ReadonlyMap<string, { readonly statement: Statement; readonly file: string }>;
}

/** Everything authors wrote, valid; every map in the order of its ids. */
export interface Content {
  readonly projects: ReadonlyMap<string, ProjectEntry>;
  readonly plant: ReadonlyMap<string, Entry<Plant>>;
  readonly panels: ReadonlyMap<string, Entry<Panel>>;
  readonly linings: ReadonlyMap<string, Entry<Lining>>;
  readonly silencers: ReadonlyMap<string, Entry<Silencer>>;
  readonly limits: ReadonlyMap<string, Entry<LimitSet>>;
  readonly duties: ReadonlyMap<string, Entry<DutySet>>;
  readonly wording: ReadonlyMap<string, Wording>;
  /** Prose around the equations: Markdown by file name without its ending. */
  readonly method: ReadonlyMap<string, string>;
  /** Texts of all JSON documents by file, for the places of mistakes found later. */
  readonly texts: ReadonlyMap<string, string>;
}
