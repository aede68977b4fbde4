import type { Activity } from "../documents/types/statement.gen.ts";
import { datesFrom, daysAfter } from "../programme/dates.ts";
import type { ClockWindow } from "../programme/window-hours.ts";
import { stretchesInPeriod } from "../programme/window-hours.ts";

/** A whole day, for looking at the stretches of an activity without a limit set's period. */
const WHOLE_DAY: ClockWindow = { days: [], from: "00:00", to: "24:00" };

/** Whether two activities are ever at work at the same moment of the same day. */
export function everCoincide(a: Activity, b: Activity): boolean {
  const [, from = a.from] = [a.from, b.from].sort();
  const [until = a.until] = [a.until, b.until].sort();
  // A window begun on the last evening runs on into the morning after.
  return datesFrom(from, daysAfter(until, 1)).some((date) => {
    const others = stretchesInPeriod(b, WHOLE_DAY, date);
    return stretchesInPeriod(a, WHOLE_DAY, date).some((own) =>
      others.some((other) => own.fromMin < other.toMin && other.fromMin < own.toMin),
    );
  });
}
