import { standsSpan } from "../calendar/stands-span.ts";
import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { statementsOf } from "../statements-of.ts";
import type { Stands } from "../types/common.gen.ts";

type Thing = { readonly standsFrom?: Stands; readonly standsUntil?: Stands };

/** Nothing is taken down before it is put up. */
export const standingOrder: Rule = (set) => {
  const ofProjects = [...set.project.valid].flatMap(([id, { sheet, file }]) => [
    ...sheet.buildings.flatMap((building, index) => inOrder(set, id, file, `/buildings/${index}`, building)),
    ...sheet.excavations.flatMap((pit, index) => inOrder(set, id, file, `/excavations/${index}`, pit)),
    ...sheet.ground.areas.flatMap((area, index) => inOrder(set, id, file, `/ground/areas/${index}`, area)),
  ]);
  const ofStatements = statementsOf(set).flatMap(({ projectId, file, statement }) =>
    statement.controls.flatMap((control, index) =>
      control.kind === "screen" || control.kind === "bund"
        ? inOrder(set, projectId, file, `/controls/${index}`, control)
        : [],
    ),
  );
  return [...ofProjects, ...ofStatements];
};

function inOrder(set: DocumentSet, projectId: string, file: string, pointer: string, thing: Thing): Mistake[] {
  const span = standsSpan(set, projectId, thing);
  if (!span || span.until >= span.from) return [];
  const advice = "Nothing can be taken down before it is put up.";
  return [mistakeAt(set.texts, file, `${pointer}/standsUntil`, `a day from ${span.from} on`, span.until, advice)];
}
