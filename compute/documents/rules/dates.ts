import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { type PlacedStatement, statementsOf } from "../statements-of.ts";

/** Dates of a statement come in order, and its activities lie within the phase. */
export const dates: Rule = (set) => statementsOf(set).flatMap((placed) => ofStatement(set, placed));

function ofStatement(set: DocumentSet, { file, statement }: PlacedStatement): Mistake[] {
  const found: Mistake[] = [];
  const notBefore = (pointer: string, date: string, first: string, what: string) => {
    if (date < first) found.push(mistakeAt(set.texts, file, pointer, `${first} or later`, date, what));
  };
  const notAfter = (pointer: string, date: string, last: string, what: string) => {
    if (date > last) found.push(mistakeAt(set.texts, file, pointer, `${last} or earlier`, date, what));
  };
  notBefore("/until", statement.until, statement.from, "The phase cannot end before it begins.");
  for (const [index, activity] of statement.activities.entries()) {
    const here = `/activities/${index}`;
    notBefore(
      `${here}/from`,
      activity.from,
      statement.from,
      "Keep the activity within the dates of the phase, or move those.",
    );
    if (activity.until < activity.from)
      notBefore(`${here}/until`, activity.until, activity.from, "The activity cannot end before it begins.");
    else if (statement.until >= statement.from)
      notAfter(
        `${here}/until`,
        activity.until,
        statement.until,
        "Keep the activity within the dates of the phase, or move those.",
      );
  }
  const { prepared, checked, approved } = statement.approval;
  notBefore("/approval/checked/date", checked.date, prepared.date, "A statement is checked after it was prepared.");
  notBefore("/approval/approved/date", approved.date, checked.date, "A statement is approved after it was checked.");
  return found;
}
