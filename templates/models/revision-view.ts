import type { Project } from "../../compute/documents/types/project.gen.ts";
import type { Revision, SealedFigure } from "../../compute/documents/types/revision.gen.ts";
import type { Control, PlantItem, Statement } from "../../compute/documents/types/statement.gen.ts";
import { revisionFile } from "../../compute/record/issued-revisions.ts";
import type { Words } from "./words.ts";
import { textIn, wordsOf } from "./words.ts";

/** A revision with its words, and where its pages stand. */
export interface RevisionView {
  readonly revision: Revision;
  readonly project: Project;
  readonly statement: Statement;
  readonly words: Words;
  /** An author's text in the language of the pages. */
  readonly text: (text: Readonly<Record<string, unknown>>) => string;
  /** Folder of its pages, e.g. `saltpan-quay/breaking-out/` or `saltpan-quay/breaking-out/r1/`. */
  readonly folder: string;
  readonly standing: Standing;
}

/** Whether a revision is the one that counts on the date of the build. */
export type Standing =
  | { readonly kind: "in-force" }
  | { readonly kind: "superseded"; readonly by: number; readonly from: string };

/** A revision with the words it was sealed with. */
export function revisionView(revision: Revision, folder: string, standing: Standing): RevisionView {
  const { project, statement } = revision.inputs;
  const [first = "en"] = project.languages;
  const wording = revision.wording[first];
  if (!wording) throw new Error(`${revision.project}/${revision.phase} ${revision.number}: no words in ${first}`);
  const words = wordsOf(
    wording,
    `${revisionFile("content", revision.project, revision.phase, revision.number)} (${first})`,
  );
  return { revision, project, statement, words, text: (text) => textIn(text, words.language, first), folder, standing };
}

/** A figure by its key. */
export function figureOf(view: RevisionView, key: string): SealedFigure {
  const found = view.revision.figures.find((figure) => figure.key === key);
  if (!found) throw new Error(`the revision has no figure ${key}`);
  return found;
}

/** A plant item of the statement. */
export function itemOf(view: RevisionView, id: string): PlantItem {
  const found = view.statement.activities.flatMap((activity) => activity.plant).find((item) => item.id === id);
  if (!found) throw new Error(`the statement has no plant "${id}"`);
  return found;
}

/** A control of the statement. */
export function controlOf(view: RevisionView, id: string): Control {
  const found = view.statement.controls.find((control) => control.id === id);
  if (!found) throw new Error(`the statement has no control "${id}"`);
  return found;
}

/** Name of a receptor point: `Chandler's Row, first floor, quay side`. */
export function pointName(view: RevisionView, pointId: string): string {
  const [receptorId, id] = pointId.split(".");
  const receptor = view.project.receptors.find((each) => each.id === receptorId);
  const point = receptor?.points.find((each) => each.id === id);
  if (!receptor || !point) throw new Error(`the project has no receptor point "${pointId}"`);
  return `${view.text(receptor.name)}, ${view.text(point.name)}`;
}

/** The limit rule behind `<limit set>.<rule>`, with its set. */
export function ruleOf(view: RevisionView, ruleId: string) {
  const [setId = "", id] = ruleId.split(".");
  const set = view.revision.inputs.limits[setId];
  const rule = set?.rules.find((each) => each.id === id);
  if (!set || !rule) throw new Error(`the revision has no limit rule "${ruleId}"`);
  return { set, rule };
}
