import { Temporal } from "temporal-polyfill";

export const DAYS = ["mon", "tue", "wed", "thu", "fri", "sat", "sun"] as const;
export type Day = (typeof DAYS)[number];

/** Day of the week of a calendar date. */
export function dayOf(date: string): Day {
  return DAYS[Temporal.PlainDate.from(date).dayOfWeek - 1] as Day;
}

/** A calendar date some days later, or earlier for a count below 0. */
export function daysAfter(date: string, days: number): string {
  return Temporal.PlainDate.from(date).add({ days }).toString();
}

/** All calendar dates from the first to the last, both included. */
export function datesFrom(from: string, until: string): readonly string[] {
  const count = Temporal.PlainDate.from(from).until(Temporal.PlainDate.from(until), { largestUnit: "days" }).days;
  return Array.from({ length: Math.max(0, count + 1) }, (_, index) => daysAfter(from, index));
}

/** Minutes of a clock time since midnight, `24:00` being 1440. */
export function minutesOf(clock: string): number {
  return Number(clock.slice(0, 2)) * 60 + Number(clock.slice(3, 5));
}
