import type { LimitRule } from "../documents/types/limit-set.gen.ts";
import { facadeLevel } from "../equations/levels/facade-level.ts";
import { periodLevel as periodLevelEquation } from "../equations/levels/period-level.ts";
import { shareLevel } from "../equations/levels/share-level.ts";
import { sumLevels } from "../equations/levels/sum-levels.ts";
import { worstShare } from "../equations/levels/worst-share.ts";
import type { Working } from "../equations/working.ts";
import { datesFrom, dayOf } from "../programme/dates.ts";
import { setsAtOnce } from "../programme/running-together.ts";
import type { Stretch } from "../programme/window-hours.ts";
import { hoursOf, stretchesInPeriod } from "../programme/window-hours.ts";
import type { Assessment, ItemLevel } from "./assess.ts";
import type { StatementInputs } from "./inputs.ts";
import type { RuleRef } from "./limit-rules.ts";
import type { SceneActivity } from "./scene.ts";

/** The level a limit is held against on the loudest day of a phase. */
export interface PeriodLevel {
  readonly levelDba: number;
  /** First date with that level. */
  readonly date: string;
  readonly periodH: number;
  /** Hours of each activity inside the period on that date; for the worst stretch, those that work at once. */
  readonly activities: readonly { readonly id: string; readonly windowH: number }[];
  /** Added for the facade, 0 where the limit is free field [dB]. */
  readonly facadeDb: number;
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
  const levels = distinctDays(inputs, assessment, ref.rule).map((day) =>
    dayLevel(here.at(`day:${day.date}`), assessment, ref.rule, day, pointId),
  );
  return levels.reduce<PeriodLevel | undefined>(
    (loudest, next) => (loudest && loudest.levelDba >= next.levelDba ? loudest : next),
    undefined,
  );
}

/** The first day of each kind: days on which the same activities work the same times are one kind. */
function distinctDays(inputs: StatementInputs, assessment: Assessment, rule: LimitRule): readonly DayWork[] {
  const kinds = new Map<string, DayWork>();
  for (const date of datesFrom(inputs.statement.from, inputs.statement.until)) {
    if (!rule.period.days.includes(dayOf(date))) continue;
    const work = assessment.scene.activities
      .map((activity) => ({ activity, stretches: stretchesInPeriod(activity.activity, rule.period, date) }))
      .filter(({ stretches }) => stretches.length > 0);
    const kind = JSON.stringify(work.map(({ activity, stretches }) => [activity.id, stretches]));
    if (work.length > 0 && !kinds.has(kind)) kinds.set(kind, { date, work });
  }
  return [...kinds.values()];
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
  const activities = day.work.map(({ activity, stretches }) => ({ id: activity.id, windowH: lengthH(stretches) }));
  const levelsDb = activities.flatMap(({ id, windowH }) =>
    assessment
      .itemLevels(id, pointId)
      .map(({ item, levelDba }) =>
        working
          .at(`activity:${id}`, `item:${item.id}`)
          .work(
            periodLevelEquation,
            { levelDb: levelDba, onTimePct: item.onTimePct, windowH, periodH },
            "period-share",
          ),
      ),
  );
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
    set.map((index) => day.work[index] as DayWork["work"][number]),
  );
  const levels = together.map((set) => ({
    levelDba: working.work(
      sumLevels,
      {
        levelsDb: set.map(({ activity }) =>
          activityWorst(working.at(`activity:${activity.id}`), assessment, activity, minutes, pointId),
        ),
      },
      "worst-stretch-level",
    ),
    activities: set.map(({ activity, stretches }) => ({ id: activity.id, windowH: lengthH(stretches) })),
  }));
  return levels.reduce((loudest, next) => (loudest.levelDba >= next.levelDba ? loudest : next));
}

function activityWorst(
  working: Working,
  assessment: Assessment,
  activity: SceneActivity,
  minutes: number,
  pointId: string,
): number {
  const levelsDb = assessment.itemLevels(activity.id, pointId).map((level) => itemWorst(working, level, minutes));
  // Items that the statement says cannot run together: the loudest alone.
  if (activity.activity.runTogether.kind === "cannot") return Math.max(...levelsDb);
  return working.work(sumLevels, { levelsDb }, "worst-stretch-activity");
}

function itemWorst(working: Working, { item, levelDba }: ItemLevel, averagingMin: number): number {
  const here = working.at(`item:${item.id}`);
  const share = item.run
    ? here.work(worstShare, { onTimePct: item.onTimePct, ...item.run, averagingMin }, "worst-share")
    : 1;
  return here.work(shareLevel, { levelDb: levelDba, share }, "worst-stretch-item");
}

function lengthH(stretches: readonly Stretch[]): number {
  return stretches.reduce((sum, stretch) => sum + (stretch.toMin - stretch.fromMin) / 60, 0);
}
