import { Temporal } from "temporal-polyfill";

export type DateOption =
  | { readonly kind: "date"; readonly date: string }
  | { readonly kind: "wrong"; readonly problem: string };

/**
 * The date of `--as-of`, or today in a time zone: the only clock the program reads.
 *
 * @param given     text of the option
 * @param timeZone  zone in which "today" is meant
 */
export function dateOption(given: string | undefined, timeZone: string): DateOption {
  if (given === undefined) return { kind: "date", date: Temporal.Now.plainDateISO(timeZone).toString() };
  try {
    if (!/^\d{4}-\d{2}-\d{2}$/.test(given)) throw new RangeError();
    return { kind: "date", date: Temporal.PlainDate.from(given, { overflow: "reject" }).toString() };
  } catch {
    return { kind: "wrong", problem: `expected --as-of as a calendar date like 2027-03-08, received ${given}` };
  }
}
