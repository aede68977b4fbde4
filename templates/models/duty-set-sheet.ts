import type { DutySet } from "../../compute/documents/types/duty-set.gen.ts";
import { decimals } from "../../compute/figures/display.ts";
import { dateText } from "./dates.ts";
import { wholeOrTenth } from "./levels.ts";
import type { Page } from "./page.ts";
import { sheetPage, sourceRow } from "./sheet.ts";
import type { Words } from "./words.ts";
import { textIn } from "./words.ts";

/** Page of a duty set: the values from which its duties hold. */
export function dutySetPage(words: Words, set: DutySet): Page {
  const own = (text: Readonly<Record<string, unknown>>) => textIn(text, words.language, "en");
  const valueRow = (name: string, from: DutySet["mandatoryFrom"]) => ({
    label: words.say(`sheets.duty-${name}`),
    cells: [
      from.levelDba === undefined
        ? words.say("sheets.none-in-law")
        : words.say("sheets.duty-level", {
            comparator: words.say(`sheets.comparator-${from.comparator ?? "at-or-above"}`),
            value: wholeOrTenth(from.levelDba),
          }),
      from.peakDbc === undefined
        ? words.say("sheets.none-in-law")
        : words.say("sheets.duty-peak", {
            comparator: words.say(`sheets.comparator-${from.peakComparator ?? "at-or-above"}`),
            value: wholeOrTenth(from.peakDbc),
          }),
    ],
  });
  return sheetPage(words, {
    file: `duties/${set.id}/index.html`,
    title: own(set.title),
    invented: set.invented,
    facts: [
      [words.say("sheets.edition"), set.edition],
      [words.say("sheets.checked-on"), dateText(words, set.checkedOn)],
      [words.say("sheets.zone-term"), own(set.zoneTerm)],
      [
        words.say("sheets.exchange"),
        set.exchange.kind === "equal-energy"
          ? words.say("sheets.equal-energy")
          : words.say("sheets.exchange-rate", { rate: decimals(set.exchange.rateDb, 0) }),
      ],
      [words.say("sheets.force"), words.say("sheets.force-value")],
    ],
    tables: [
      {
        caption: words.say("sheets.duty-caption"),
        head: ["what", "level", "peak"].map((key) => words.say(`sheets.duty-head-${key}`)),
        rows: [valueRow("mandatory", set.mandatoryFrom), valueRow("information", set.informationFrom)],
      },
    ],
    sources: [
      sourceRow(words, words.say("sheets.duty-mandatory"), set.mandatoryFrom.source),
      sourceRow(words, words.say("sheets.duty-information"), set.informationFrom.source),
      sourceRow(words, words.say("sheets.whole-set"), set.source),
    ],
  });
}
