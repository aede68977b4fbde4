import type { LimitRule } from "../documents/types/limit-set.gen.ts";
import { facadeLevel } from "../equations/levels/facade-level.ts";
import { periodLevel as periodLevelEquation } from "../equations/levels/period-level.ts";
import { shareLevel } from "../equations/levels/share-level.ts";
import { sumLevels } from "../equations/levels/sum-levels.ts";
import { worstShare } from "../equations/levels/worst-share.ts";
import type { Working } from "../equations/working.ts";
import { setsAtOnce } from "../programme/running-together.ts";
import type { Stretch } from "../programme/window-hours.ts";
import { hoursOf } from "../programme/window-hours.ts";
import type { Assessment, ItemLevel } from "./assess.ts";
import type { StatementInputs } from "./inputs.ts";
import type { RuleRef } from "./limit-rules.ts";
import { periodDays } from "./period-days.ts";
import type { SceneActivity } from "./scene.ts";

/** The level a limit is held against on the loudest day of a phase. */
export interface PeriodLevel {
  readonly levelDba: number;
  /** First date with that level. */
  readonly date: string;
  readonly periodH: number;
  /** Each activity inside the period on that date; for the worst stretch, those that work at once. */
  readonly activities: readonly PeriodActivity[];
  /** Added for the facade, 0 where the limit is free field [dB]. */
  readonly facadeDb: number;
}

/** What of an activity counts in a period. */
export interface PeriodActivity {
  readonly id: string;
  /** Hours inside the period. */
  readonly windowH: number;
  /** Items that count, each with the share of the period (or of its worst stretch) in which it runs, above 0 to 1. */
  readonly shares: readonly ItemShare[];
}

/** Part of one item in a period level. */
export interface ItemShare {
  readonly item: string;
  readonly share: number;
  /** Its level over the period, free field [dB(A)]. */
  readonly levelDba: number;
}

interface DayWork {
  readonly date: string;
  readonly work: readonly { readonly activity: SceneActivity; readonly stretches: readonly Stretch[] }[];
}

/**
 * Level at a receptor point in the form a limit rule asks for, on the loudest day of the phase.
 *
 * @param working     what works the equations out
 * @param inputs      documents, for the phase's dates
 * @param assessment  item levels for the controls in place
 * @param ref         the limit rule
 * @param pointId     `<receptor>.<point>`
 * @returns           the level [dB(A)], unrounded, with the day it belongs to; nothing if no work falls into the period
 */
export function periodLevel(
  working: Working,
  inputs: StatementInputs,
  assessment: Assessment,
  ref: RuleRef,
  pointId: string,
): PeriodLevel | undefined {
  const here = working.at(`rule:${ref.id}`, `point:${pointId}`);
  const levels = daysOf(inputs, assessment, ref).map((day) =>
    dayLevel(here.at(`day:${day.date}`), assessment, ref.rule, day, pointId),
  );
  return levels.reduce<PeriodLevel | undefined>(
    (loudest, next) => (loudest && loudest.levelDba >= next.levelDba ? loudest : next),
    undefined,
  );
}

/** The kinds of day of a rule with the activities of this scene. */
function daysOf(inputs: StatementInputs, assessment: Assessment, ref: RuleRef): readonly DayWork[] {
  const { activities } = assessment.scene;
  return periodDays(inputs, ref).map(({ date, work }) => ({
    date,
    work: work.flatMap(({ activity: id, stretches }) =>
      activities.filter((activity) => activity.id === id).map((activity) => ({ activity, stretches })),
    ),
  }));
}

function dayLevel(
  working: Working,
  assessment: Assessment,
  rule: LimitRule,
  day: DayWork,
  pointId: string,
): PeriodLevel {
  const { averaging } = rule;
  const free =
    averaging.kind === "worst"
      ? worstStretch(working, assessment, averaging.minutes, day, pointId)
      : wholePeriod(working, assessment, rule, day, pointId);
  const facadeDb = rule.position.kind === "facade" ? rule.position.termDb : 0;
  const levelDba =
    facadeDb === 0 ? free.levelDba : working.work(facadeLevel, { levelDb: free.levelDba, facadeDb }, "facade");
  return { ...free, levelDba, facadeDb, date: day.date, periodH: hoursOf(rule.period) };
}

type FreeFieldLevel = Pick<PeriodLevel, "levelDba" | "activities">;

function wholePeriod(
  working: Working,
  assessment: Assessment,
  rule: LimitRule,
  day: DayWork,
  pointId: string,
): FreeFieldLevel {
  const periodH = hoursOf(rule.period);
  const activities = day.work.map(({ activity, stretches }) => {
    const windowH = lengthH(stretches);
    const shares = assessment.itemLevels(activity.id, pointId).map(({ item, levelDba }) => {
      const { onTimePct } = item;
      const here = working.at(`activity:${activity.id}`, `item:${item.id}`);
      const level = here.work(periodLevelEquation, { levelDb: levelDba, onTimePct, windowH, periodH }, "period-share");
      return { item: item.id, share: (onTimePct / 100) * (windowH / periodH), levelDba: level };
    });
    return { id: activity.id, windowH, shares };
  });
  const levelsDb = activities.flatMap(({ shares }) => shares.map(({ levelDba }) => levelDba));
  return { levelDba: working.work(sumLevels, { levelsDb }, "period-level"), activities };
}

/** The loudest of the sets of activities that work at once, each item at its share of the worst stretch. */
function worstStretch(
  working: Working,
  assessment: Assessment,
  minutes: number,
  day: DayWork,
  pointId: string,
): FreeFieldLevel {
  const together = setsAtOnce(day.work.map(({ stretches }) => stretches)).map((set) =>
    set.flatMap((index) => day.work[index] ?? []),
  );
  const levels = together.map((set) => {
    const worst = set.map(({ activity }) =>
      activityWorst(working.at(`activity:${activity.id}`), assessment, activity, minutes, pointId),
    );
    return {
      levelDba: working.work(sumLevels, { levelsDb: worst.map(({ levelDba }) => levelDba) }, "worst-stretch-level"),
      activities: set.map(({ activity, stretches }, index) => ({
        id: activity.id,
        windowH: lengthH(stretches),
        shares: worst[index]?.shares ?? [],
      })),
    };
  });
  return levels.reduce((loudest, next) => (loudest.levelDba >= next.levelDba ? loudest : next));
}

interface ActivityWorst {
  readonly levelDba: number;
  readonly shares: PeriodActivity["shares"];
}

function activityWorst(
  working: Working,
  assessment: Assessment,
  activity: SceneActivity,
  minutes: number,
  pointId: string,
): ActivityWorst {
  const items = assessment.itemLevels(activity.id, pointId).map((level) => itemWorst(working, level, minutes));
  // Of items that the statement says cannot run together only the loudest counts.
  const counted =
    activity.activity.runTogether.kind === "cannot"
      ? items.filter((item) => isLoudest(item, items)).slice(0, 1)
      : items;
  const levelDba = working.work(
    sumLevels,
    { levelsDb: counted.map((item) => item.levelDba) },
    "worst-stretch-activity",
  );
  return { levelDba, shares: counted };
}

function isLoudest(item: { readonly levelDba: number }, items: readonly { readonly levelDba: number }[]): boolean {
  return items.every((other) => other.levelDba <= item.levelDba);
}

function itemWorst(working: Working, { item, levelDba }: ItemLevel, averagingMin: number): ItemShare {
  const here = working.at(`item:${item.id}`);
  const share = item.run
    ? here.work(worstShare, { onTimePct: item.onTimePct, ...item.run, averagingMin }, "worst-share")
    : 1;
  return { item: item.id, share, levelDba: here.work(shareLevel, { levelDb: levelDba, share }, "worst-stretch-item") };
}

function lengthH(stretches: readonly Stretch[]): number {
  return stretches.reduce((sum, stretch) => sum + (stretch.toMin - stretch.fromMin) / 60, 0);
}
