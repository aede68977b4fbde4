import type { Rule } from "../document-set.ts";
import { mistakeAt } from "../mistake-at.ts";
import type { LimitPeriod } from "../types/limit-set.gen.ts";

/** A period named twice in a limit set is the same period both times. */
export const limitPeriods: Rule = (set) =>
  [...set["limit-set"].valid.values()].flatMap(({ sheet, file }) => {
    const first = new Map<string, string>();
    return sheet.rules.flatMap(({ period }, index) => {
      const before = first.get(period.id) ?? hoursText(period);
      first.set(period.id, before);
      if (hoursText(period) === before) return [];
      const expected = `${before}, as the period "${period.id}" has above`;
      return [
        mistakeAt(
          set.texts,
          file,
          `/rules/${index}/period`,
          expected,
          hoursText(period),
          "Give one of the two periods another id.",
        ),
      ];
    });
  });

function hoursText({ days, from, to }: LimitPeriod): string {
  return `${days.join(" ")} ${from}-${to}`;
}
