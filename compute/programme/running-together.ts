import type { Stretch } from "./window-hours.ts";

/**
 * The sets of activities that work at the same time on one day, the largest ones: what is left when one ends is part of the
 * set before, and never louder.
 *
 * @param stretches  per activity, its stretches within the period [min]
 * @returns          each distinct set of indexes at a moment at which one of them begins
 */
export function setsAtOnce(stretches: readonly (readonly Stretch[])[]): readonly (readonly number[])[] {
  const starts = [...new Set(stretches.flat().map((stretch) => stretch.fromMin))];
  const sets = starts.map((moment) =>
    stretches.flatMap((own, index) => (own.some((s) => s.fromMin <= moment && moment < s.toMin) ? [index] : [])),
  );
  return [...new Map(sets.map((set) => [set.join(","), set])).values()];
}
