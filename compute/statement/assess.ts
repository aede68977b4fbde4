import type { Propagation } from "../acoustics/propagate.ts";
import { propagate } from "../acoustics/propagate.ts";
import { sumOfPaths } from "../acoustics/sum-of-paths.ts";
import type { Working } from "../equations/working.ts";
import type { StatementInputs } from "./inputs.ts";
import type { Scene, SceneActivity, SceneItem, ScenePoint } from "./scene.ts";
import { scene } from "./scene.ts";

/** Level of one item at one receptor point while it runs, free field, with all its terms. */
export interface ItemLevel {
  readonly item: SceneItem;
  readonly propagation: Propagation;
  readonly levelDba: number;
  /** Meteorological correction taken off [dB]. */
  readonly metDb: number;
}

/** Levels while running for one subset of the controls. */
export interface Assessment {
  readonly scene: Scene;
  /** Items of an activity at a receptor point. */
  readonly itemLevels: (activityId: string, pointId: string) => readonly ItemLevel[];
}

/** Item levels already worked out, by all that they depend on; shared between subsets of the controls. */
export type ItemLevelCache = Map<string, ItemLevel>;

/**
 * Levels of every item at every receptor point for a subset of the controls, each worked out when first asked for.
 *
 * @param working     what works the equations out
 * @param inputs      documents of the statement
 * @param controlIds  controls in place
 * @param cache       item levels of other subsets, used only by a working that keeps no record
 */
export function assess(
  working: Working,
  inputs: StatementInputs,
  controlIds: ReadonlySet<string>,
  cache: ItemLevelCache = new Map(),
): Assessment {
  const built = scene(working.at("part:scene"), inputs, controlIds);
  return {
    scene: built,
    itemLevels: (activityId, pointId) => {
      const activity = found(built.activities, activityId);
      const point = found(built.points, pointId);
      return activity.items.map((item) => {
        const key = cacheKey(activity, item, point);
        const known = cache.get(key);
        // On-time and stops are not part of the level while running, so a cached level takes this scene's item.
        if (known) return { ...known, item };
        const level = itemLevel(
          working.at(`activity:${activity.id}`, `item:${item.id}`, `point:${point.id}`),
          activity,
          item,
          point,
        );
        cache.set(key, level);
        return level;
      });
    },
  };
}

function itemLevel(working: Working, activity: SceneActivity, item: SceneItem, { point }: ScenePoint): ItemLevel {
  const propagation = propagate(working, activity.site, item.source, point);
  const { paths, planM } = propagation;
  return { item, propagation, ...sumOfPaths(working, activity.site, paths, item.source, point, planM) };
}

function cacheKey(activity: SceneActivity, item: SceneItem, point: ScenePoint): string {
  const obstacles = activity.site.obstacles.map(({ id }) => id);
  return JSON.stringify([activity.id, item.id, point.id, item.sheet, obstacles, item.controls]);
}

function found<T extends { readonly id: string }>(list: readonly T[], id: string): T {
  const one = list.find((each) => each.id === id);
  if (!one) throw new Error(`"${id}" is not part of the scene`);
  return one;
}
