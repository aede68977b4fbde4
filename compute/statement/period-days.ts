import { datesFrom, dayOf, daysAfter } from "../programme/dates.ts";
import type { Stretch } from "../programme/window-hours.ts";
import { stretchesInPeriod } from "../programme/window-hours.ts";
import type { StatementInputs } from "./inputs.ts";
import type { RuleRef } from "./limit-rules.ts";

/** A day of a limit rule's period with what works in it. */
export interface PeriodDay {
  readonly date: string;
  readonly work: readonly { readonly activity: string; readonly stretches: readonly Stretch[] }[];
}

/** Days already found, by the documents they come from; they do not depend on controls or receptor points. */
const known = new WeakMap<StatementInputs, Map<string, readonly PeriodDay[]>>();

/**
 * The first day of each kind on which work falls into a limit rule's period: days on which the same activities work the same
 * times are one kind.
 */
export function periodDays(inputs: StatementInputs, ref: RuleRef): readonly PeriodDay[] {
  const byRule = known.get(inputs) ?? new Map<string, readonly PeriodDay[]>();
  known.set(inputs, byRule);
  const found = byRule.get(ref.id) ?? distinctDays(inputs, ref);
  byRule.set(ref.id, found);
  return found;
}

function distinctDays({ statement }: StatementInputs, { rule }: RuleRef): readonly PeriodDay[] {
  const kinds = new Map<string, PeriodDay>();
  // A night period may begin the evening before the first day, and work begun on the last evening ends the morning after.
  for (const date of datesFrom(daysAfter(statement.from, -1), daysAfter(statement.until, 1))) {
    if (!rule.period.days.includes(dayOf(date))) continue;
    const work = statement.activities
      .map((activity) => ({ activity: activity.id, stretches: stretchesInPeriod(activity, rule.period, date) }))
      .filter(({ stretches }) => stretches.length > 0);
    const kind = JSON.stringify(work);
    if (work.length > 0 && !kinds.has(kind)) kinds.set(kind, { date, work });
  }
  return [...kinds.values()];
}
