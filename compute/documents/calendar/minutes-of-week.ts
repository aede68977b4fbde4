import type { Day } from "../types/common.gen.ts";

const DAYS: readonly Day[] = ["mon", "tue", "wed", "thu", "fri", "sat", "sun"];
const DAY_MIN = 24 * 60;

/** The minutes of the week, counted from Monday 00:00, that a row of days and times covers; an end at or before the start lies on the next day. */
export function minutesOfWeek(row: {
  readonly days: readonly Day[];
  readonly from: string;
  readonly to: string;
}): ReadonlySet<number> {
  const start = minuteOfDay(row.from);
  const end = minuteOfDay(row.to) + (minuteOfDay(row.to) <= start ? DAY_MIN : 0);
  const minutes = new Set<number>();
  for (const day of row.days) {
    for (let minute = start; minute < end; minute += 1)
      minutes.add((DAYS.indexOf(day) * DAY_MIN + minute) % (7 * DAY_MIN));
  }
  return minutes;
}

function minuteOfDay(clock: string): number {
  const [hours, minutes] = clock.split(":");
  return Number(hours) * 60 + Number(minutes);
}
