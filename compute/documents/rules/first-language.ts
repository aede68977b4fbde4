import type { DocumentSet, Rule } from "../document-set.ts";
import { isText } from "../is-text.ts";
import { listText } from "../list-text.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { statementsOf } from "../statements-of.ts";
import { usedSheets } from "../used-sheets.ts";
import { walkValues } from "../walk-values.ts";

/** Every text of a project, of its statements and of the sheets it uses is there in the project's first language. */
export const firstLanguage: Rule = (set) => {
  const first = (projectId: string) => set.project.valid.get(projectId)?.sheet.languages[0];
  return [
    ...[...set.project.valid].flatMap(([id, { sheet, file }]) => missingWords(set, file, sheet, id, first(id))),
    ...statementsOf(set).flatMap((placed) =>
      missingWords(set, placed.file, placed.statement, placed.projectId, first(placed.projectId)),
    ),
    ...usedSheets(set).flatMap(({ reference: { projectId }, entry }) =>
      missingWords(set, entry.file, entry.sheet, projectId, first(projectId)),
    ),
  ];
};

function missingWords(
  set: DocumentSet,
  file: string,
  document: unknown,
  projectId: string,
  language: string | undefined,
): Mistake[] {
  if (language === undefined) return [];
  return [...walkValues(document)].flatMap(({ pointer, value }) => {
    if (!isText(value) || Object.hasOwn(value, language)) return [];
    const expected = `words in "${language}", the first language of the project ${projectId}`;
    return [
      mistakeAt(
        set.texts,
        file,
        pointer,
        expected,
        `${listText(Object.keys(value), "and")} only`,
        "Add them; the first language is complete.",
      ),
    ];
  });
}
