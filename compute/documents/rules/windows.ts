import { minuteText } from "../calendar/minute-text.ts";
import { minutesOfWeek } from "../calendar/minutes-of-week.ts";
import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { type PlacedStatement, statementsOf } from "../statements-of.ts";
import type { Hours } from "../types/project.gen.ts";
import type { Activity } from "../types/statement.gen.ts";

/** Working windows keep apart from each other and within the hours of the project, or the activity says why not. */
export const windows: Rule = (set) =>
  statementsOf(set).flatMap((placed) =>
    placed.statement.activities.flatMap((activity, index) => [
      ...overlaps(set, placed, activity, index),
      ...outside(set, placed, activity, index),
    ]),
  );

function overlaps(set: DocumentSet, { file }: PlacedStatement, activity: Activity, index: number): Mistake[] {
  const taken = new Map<number, string>();
  return activity.windows.flatMap((window, w) => {
    const minutes = [...minutesOfWeek(window)];
    const clash = minutes.find((minute) => taken.has(minute));
    const received = clash === undefined ? "" : `${minuteText(clash)} in the window "${taken.get(clash)}" too`;
    for (const minute of minutes) taken.set(minute, window.id);
    if (clash === undefined) return [];
    const advice = "Make one window of the two, or move one.";
    return [
      mistakeAt(
        set.texts,
        file,
        `/activities/${index}/windows/${w}`,
        "windows of one activity that do not overlap",
        received,
        advice,
      ),
    ];
  });
}

function outside(set: DocumentSet, { file, project }: PlacedStatement, activity: Activity, index: number): Mistake[] {
  if (!project || activity.outsideHours !== undefined) return [];
  const permitted = permittedMinutes(project.hours);
  return activity.windows.flatMap((window, w) => {
    const first = [...minutesOfWeek(window)].find((minute) => !permitted.has(minute));
    if (first === undefined) return [];
    const advice = "Move the window, or give the activity outsideHours with the reason.";
    return [
      mistakeAt(
        set.texts,
        file,
        `/activities/${index}/windows/${w}`,
        "a window within the hours of the project",
        `${minuteText(first)}, which is outside`,
        advice,
      ),
    ];
  });
}

function permittedMinutes(hours: readonly Hours[]): ReadonlySet<number> {
  return new Set(hours.flatMap((row) => [...minutesOfWeek(row)]));
}
