import { shareLevel } from "../equations/levels/share-level.ts";
import { sumLevels } from "../equations/levels/sum-levels.ts";
import type { Working } from "../equations/working.ts";
import type { Assessment } from "./assess.ts";

/**
 * Level of one activity at a receptor point over its own working window: every item at its on-time, free field.
 *
 * @param working     what works the equations out
 * @param assessment  item levels for the controls in place
 * @returns           level [dB(A)], unrounded
 */
export function windowLevel(working: Working, assessment: Assessment, activityId: string, pointId: string): number {
  const shares = assessment
    .itemLevels(activityId, pointId)
    .map(({ item, levelDba }) =>
      working
        .at(`activity:${activityId}`, `item:${item.id}`, `point:${pointId}`)
        .work(shareLevel, { levelDb: levelDba, share: item.onTimePct / 100 }, "on-time-level"),
    );
  return working.at(`activity:${activityId}`, `point:${pointId}`).work(sumLevels, { levelsDb: shares }, "window-level");
}
