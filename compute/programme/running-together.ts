import type { Stretch } from "./window-hours.ts";

/**
 * The sets of activities that work at the same time on one day.
 *
 * @param stretches  per activity, its stretches within the period [min]
 * @returns          each distinct set of indexes that some moment of the period holds, the empty one left out
 */
export function setsAtOnce(stretches: readonly (readonly Stretch[])[]): readonly (readonly number[])[] {
  const starts = [...new Set(stretches.flat().map((stretch) => stretch.fromMin))];
  const sets = starts.map((moment) =>
    stretches.flatMap((own, index) => (own.some((s) => s.fromMin <= moment && moment < s.toMin) ? [index] : [])),
  );
  return [...new Map(sets.map((set) => [set.join(","), set])).values()];
}
