import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";

type Row = { readonly from: string; readonly to: string };

/** No hours, window or period ends at the time it starts. */
export const emptyTimes: Rule = (set) => [
  ...[...set.project.valid.values()].flatMap(({ sheet, file }) =>
    sheet.hours.flatMap((row, h) => sameTime(set, file, `/hours/${h}`, row)),
  ),
  ...[...set.statement.valid.values()].flatMap(({ sheet, file }) =>
    sheet.activities.flatMap((activity, a) =>
      activity.windows.flatMap((row, w) => sameTime(set, file, `/activities/${a}/windows/${w}`, row)),
    ),
  ),
  ...[...set["limit-set"].valid.values()].flatMap(({ sheet, file }) =>
    sheet.rules.flatMap((rule, r) => sameTime(set, file, `/rules/${r}/period`, rule.period)),
  ),
];

function sameTime(set: DocumentSet, file: string, pointer: string, { from, to }: Row): Mistake[] {
  if (from !== to) return [];
  const advice = "For a whole day write 00:00 and 24:00.";
  return [mistakeAt(set.texts, file, `${pointer}/to`, `an end other than the start ${from}`, `"${to}"`, advice)];
}
