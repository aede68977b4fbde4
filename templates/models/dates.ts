import { DAYS } from "../../compute/programme/dates.ts";
import type { Words } from "./words.ts";

/** A calendar date in words, e.g. `8 March 2027`; names of months come from the wording, not from the machine. */
export function dateText(words: Words, date: string): string {
  const [year = "", month = "", day = ""] = date.split("-");
  return words.say("dates.date", { day: Number(day), month: words.say(`dates.month-${Number(month)}`), year });
}

/** Days of the week in words: a run of three or more as `Monday to Friday`. */
export function daysText(words: Words, days: readonly string[]): string {
  const ordered = DAYS.filter((day) => days.includes(day));
  const name = (day: string) => words.say(`dates.${day}`);
  const from = DAYS.indexOf(ordered[0] as (typeof DAYS)[number]);
  const isRun = ordered.length > 2 && ordered.every((day, index) => DAYS.indexOf(day) === from + index);
  if (isRun) return words.say("dates.run", { from: name(ordered[0] as string), to: name(ordered.at(-1) as string) });
  return listText(words, ordered.map(name));
}

/** A list in a sentence: `a, b and c`. */
export function listText(words: Words, items: readonly string[]): string {
  if (items.length < 2) return items[0] ?? "";
  return words.say("dates.list", { most: items.slice(0, -1).join(", "), last: items.at(-1) as string });
}

/** Clock times on days: `Monday to Friday, 08:00 to 17:30`. */
export function windowText(
  words: Words,
  window: { readonly days: readonly string[]; readonly from: string; readonly to: string },
): string {
  return words.say("dates.window", { days: daysText(words, window.days), from: window.from, to: window.to });
}
