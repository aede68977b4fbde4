import { distanceToLevel } from "../equations/hearing/distance-to-level.ts";
import type { Working } from "../equations/working.ts";

/** Whether a value counts as reached at the value itself or only above it. */
export type Comparator = "above" | "at-or-above";

/** C-weighted peak level at the distance it holds for. */
export interface Peak {
  readonly levelDbc: number;
  readonly distanceM: number;
}

/**
 * Distance at which peak data come down to a level, hemispherical.
 *
 * @param working    what works the equations out
 * @param peak       peak level [dB(C)] at a distance [m]
 * @param targetDbc  level to come down to [dB(C)]
 * @returns          distance from outline and swing [m], unrounded
 */
export function peakDistanceM(working: Working, peak: Peak, targetDbc: number): number {
  const { levelDbc: levelDb, distanceM: atDistanceM } = peak;
  return working.work(distanceToLevel, { levelDb, atDistanceM, targetDb: targetDbc }, "peak-distance");
}

/**
 * Whether peak data meet a value: at the distance they hold for, or 1 m outside the machine if that is nearer.
 *
 * @param valueDbc    value of the duty set [dB(C)]
 * @param comparator  whether the value itself counts
 */
export function peakMeets(working: Working, peak: Peak, valueDbc: number, comparator: Comparator): boolean {
  return meets(peak.levelDbc, valueDbc, comparator) || meets(peakDistanceM(working, peak, valueDbc), 1, comparator);
}

/** Whether a number meets a value by its comparator. */
export function meets(value: number, from: number, comparator: Comparator): boolean {
  return comparator === "above" ? value > from : value >= from;
}
