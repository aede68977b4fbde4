import type { SealedPeriod } from "../../compute/documents/types/revision.gen.ts";
import { levelBesideLimit, standing, tenthDb, wholeDb } from "../../compute/figures/display.ts";
import { dayOf } from "../../compute/programme/dates.ts";
import { dateText, daysText, windowText } from "./dates.ts";
import type { RevisionView } from "./revision-view.ts";
import { figureOf, ruleOf } from "./revision-view.ts";

/** One judged level in the words and numbers a page prints. */
export interface JudgedLevel {
  /** Figure key: the anchor. */
  readonly key: string;
  readonly period: string;
  readonly hours: string;
  readonly averaging: string;
  /** With one decimal, `just over` before it where it must. */
  readonly level: string;
  /** In whole decibels. */
  readonly about: string;
  readonly limit: string;
  readonly standing: string;
  readonly over: "over" | "within";
  readonly without: string;
  readonly reduction: string;
  readonly day: string;
}

/** A judged period level of a revision. */
export function judgedLevel(view: RevisionView, period: SealedPeriod): JudgedLevel {
  const { words } = view;
  const { rule } = ruleOf(view, period.rule);
  const value = (quantity: string, controls: string) =>
    figureOf(view, [quantity, ...period.key.split("/").slice(1, 5), controls].join("/")).value;
  const limitDb = value("limit", "all");
  const stands = standing(period.levelDba, limitDb, rule.comparator);
  const shown = (places: 0 | 1) => {
    const { text, justOver } = levelBesideLimit(period.levelDba, limitDb, rule.comparator, places);
    return justOver ? words.say("levels.just-over-value", { value: text }) : text;
  };
  return {
    key: period.key,
    period: view.text(rule.period.name),
    hours: windowText(words, rule.period),
    averaging:
      rule.averaging.kind === "worst"
        ? words.say("levels.averaging-worst", { minutes: rule.averaging.minutes })
        : words.say("levels.averaging-whole", { hours: period.periodH }),
    level: shown(1),
    about: shown(0),
    limit: wholeOrTenth(limitDb),
    standing: words.say(`levels.${stands.kind}`, { by: "by" in stands ? stands.by : "" }),
    over: stands.kind === "over" || stands.kind === "just-over" ? "over" : "within",
    without: tenthDb(value("level", "none")),
    reduction: tenthDb(value("total-reduction", "all")),
    day: words.say("levels.day", { day: daysText(words, [dayOf(period.date)]), date: dateText(words, period.date) }),
  };
}

/** A limit as its document prints it: whole decibels unless it has a decimal. */
export function wholeOrTenth(value: number): string {
  return Number.isInteger(value) ? wholeDb(value) : tenthDb(value);
}
