import type { Day } from "./dates.ts";
import { dayOf, daysAfter, minutesOf } from "./dates.ts";

/** Clock times on some days of the week; an end at or before the start lies on the next day. */
export interface ClockWindow {
  readonly days: readonly Day[];
  readonly from: string;
  readonly to: string;
}

/** A stretch of time in minutes from midnight of the day looked at; it may begin before 0 or end after 1440. */
export interface Stretch {
  readonly fromMin: number;
  readonly toMin: number;
}

/** The stretch of a window that begins on a day, measured from that day's midnight. */
export function stretchOf(window: ClockWindow): Stretch {
  const fromMin = minutesOf(window.from);
  const toMin = minutesOf(window.to);
  return { fromMin, toMin: toMin > fromMin ? toMin : toMin + 1440 };
}

/** Length of a window [h]. */
export function hoursOf(window: ClockWindow): number {
  const { fromMin, toMin } = stretchOf(window);
  return (toMin - fromMin) / 60;
}

/**
 * The stretches of an activity's windows that fall into a period which begins on `date`; work begun the evening before counts.
 *
 * @param activity  working windows and first and last date
 * @param period    period of the limit set
 * @param date      date on which the period begins
 * @returns         stretches in minutes from midnight of `date`, cut to the period, in order
 */
export function stretchesInPeriod(
  activity: { readonly from: string; readonly until: string; readonly windows: readonly ClockWindow[] },
  period: ClockWindow,
  date: string,
): readonly Stretch[] {
  const whole = stretchOf(period);
  const stretches = [-1, 0, 1]
    .map((offset) => ({ offset, on: daysAfter(date, offset) }))
    .filter(({ on }) => on >= activity.from && on <= activity.until)
    .flatMap(({ offset, on }) =>
      activity.windows
        .filter((window) => window.days.includes(dayOf(on)))
        .map((window) => shifted(stretchOf(window), offset * 1440)),
    )
    .map((stretch) => ({
      fromMin: Math.max(stretch.fromMin, whole.fromMin),
      toMin: Math.min(stretch.toMin, whole.toMin),
    }))
    .filter((stretch) => stretch.toMin > stretch.fromMin)
    .sort((a, b) => a.fromMin - b.fromMin);
  return merged(stretches);
}

/** Stretches in order with those that overlap or touch made one, so that no minute counts twice. */
function merged(stretches: readonly Stretch[]): readonly Stretch[] {
  const done: Stretch[] = [];
  for (const next of stretches) {
    const last = done.at(-1);
    if (!last || next.fromMin > last.toMin) done.push(next);
    else done.splice(-1, 1, { fromMin: last.fromMin, toMin: Math.max(last.toMin, next.toMin) });
  }
  return done;
}

function shifted(stretch: Stretch, byMin: number): Stretch {
  return { fromMin: stretch.fromMin + byMin, toMin: stretch.toMin + byMin };
}
