import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { plantItems } from "../plant-items.ts";
import { type PlacedStatement, statementsOf } from "../statements-of.ts";
import type { Control } from "../types/statement.gen.ts";
import { knownPhase } from "./known-phase.ts";
import { unknownId } from "./unknown-id.ts";

/** Controls and zone answers name plant of the statement, public ways and receptors of the project, phases of the project. */
export const knownInStatement: Rule = (set) =>
  statementsOf(set).flatMap((placed) => [
    ...placed.statement.controls.flatMap((control, index) => ofControl(set, placed, control, `/controls/${index}`)),
    ...answers(set, placed),
  ]);

function ofControl(set: DocumentSet, placed: PlacedStatement, control: Control, here: string): readonly Mistake[] {
  const { file, projectId } = placed;
  if (control.kind === "screen" || control.kind === "bund") {
    return [
      ...knownPhase(set, projectId, file, `${here}/standsFrom`, control.standsFrom),
      ...knownPhase(set, projectId, file, `${here}/standsUntil`, control.standsUntil),
    ];
  }
  if (control.kind === "practice") return [];
  const items = plantItems(placed.statement).map(({ item }) => item.id);
  return control.appliesTo.flatMap((id, index) =>
    unknownId(set.texts, file, `${here}/appliesTo/${index}`, id, items, "plant item of this statement"),
  );
}

function answers(set: DocumentSet, { file, statement, project }: PlacedStatement): readonly Mistake[] {
  const items = plantItems(statement).map(({ item }) => item.id);
  return statement.zoneAnswers.flatMap(({ plant, crosses }, index) => {
    const here = `/zoneAnswers/${index}`;
    const found = [...unknownId(set.texts, file, `${here}/plant`, plant, items, "plant item of this statement")];
    if (!project || crosses.kind === "boundary") return found;
    const known = crosses.kind === "public-way" ? project.publicWays : project.receptors;
    const what = crosses.kind === "public-way" ? "public way of this project" : "receptor of this project";
    return [
      ...found,
      ...unknownId(
        set.texts,
        file,
        `${here}/crosses/id`,
        crosses.id,
        known.map((thing) => thing.id),
        what,
      ),
    ];
  });
}
