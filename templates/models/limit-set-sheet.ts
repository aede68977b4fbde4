import type { LimitSet } from "../../compute/documents/types/limit-set.gen.ts";
import { decimals } from "../../compute/figures/display.ts";
import { dateText, windowText } from "./dates.ts";
import { wholeOrTenth } from "./levels.ts";
import type { Page } from "./page.ts";
import { sheetPage, sourceRow } from "./sheet.ts";
import type { Words } from "./words.ts";
import { textIn } from "./words.ts";

/** Page of a limit set: every rule with its period, value, position and source. */
export function limitSetPage(words: Words, set: LimitSet): Page {
  const own = (text: Readonly<Record<string, unknown>>) => textIn(text, words.language, "en");
  return sheetPage(words, {
    file: `limits/${set.id}/index.html`,
    title: own(set.title),
    invented: set.invented,
    facts: [
      [words.say("sheets.edition"), set.edition],
      [words.say("sheets.issuer"), own(set.issuer)],
      [words.say("sheets.checked-on"), dateText(words, set.checkedOn)],
      [words.say("sheets.method"), words.say(`sheets.method-${set.prescribesMethod}`)],
      [words.say("sheets.force"), words.say("sheets.force-value")],
    ],
    tables: [
      {
        caption: words.say("sheets.rules-caption"),
        head: ["period", "hours", "uses", "value", "position"].map((key) => words.say(`sheets.rule-${key}`)),
        rows: set.rules.map((rule) => ({
          label: own(rule.period.name),
          cells: [
            windowText(words, rule.period),
            rule.uses.map((use) => words.say(`uses.${use}`)).join(", "),
            words.say(rule.averaging.kind === "worst" ? "sheets.value-worst" : "sheets.value-whole", {
              comparator: words.say(`sheets.comparator-${rule.comparator}`),
              value: wholeOrTenth(rule.valueDb),
              minutes: rule.averaging.kind === "worst" ? rule.averaging.minutes : "",
            }),
            rule.position.kind === "facade"
              ? words.say("sheets.position-facade", {
                  distance: decimals(rule.position.distanceM, 1),
                  term: decimals(rule.position.termDb, 1),
                })
              : words.say("sheets.position-free-field"),
          ],
        })),
      },
    ],
    sources: set.rules.map((rule) => sourceRow(words, own(rule.period.name), rule.source)),
  });
}
