import type { Rule } from "../document-set.ts";
import { mistakeAt } from "../mistake-at.ts";
import { nearest } from "../nearest.ts";
import { receivedText } from "../received-text.ts";

/** The time zone of a project is a name of the IANA list. */
export const timeZones: Rule = (set) =>
  [...set.project.valid.values()].flatMap(({ sheet: { timeZone }, file }) => {
    if (isTimeZone(timeZone)) return [];
    const near = nearest(timeZone, Intl.supportedValuesOf("timeZone"));
    const advice = near === undefined ? "Offsets will not do: they leave summer time out." : `Did you mean "${near}"?`;
    return [
      mistakeAt(
        set.texts,
        file,
        "/timeZone",
        'a time zone of the IANA list such as "Europe/London"',
        receivedText(timeZone),
        advice,
      ),
    ];
  });

function isTimeZone(name: string): boolean {
  if (!/^[A-Z]/.test(name)) return false;
  try {
    return new Intl.DateTimeFormat("en", { timeZone: name }).resolvedOptions().timeZone !== "";
  } catch (error) {
    if (error instanceof RangeError) return false;
    throw error;
  }
}
