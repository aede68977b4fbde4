import { aWeightedSum } from "../equations/levels/a-weighted-sum.ts";
import { metCorrection } from "../equations/propagation/met-correction.ts";
import { metLevel } from "../equations/propagation/met-level.ts";
import type { Working } from "../equations/working.ts";
import { A_WEIGHTS_DB, inOrder } from "./bands.ts";
import type { PathTerms } from "./path-terms.ts";
import type { Point, Site } from "./site.ts";

/** A-weighted level of one source over all its paths, and what the meteorological correction takes off it. */
export interface SummedLevel {
  readonly levelDba: number;
  readonly metDb: number;
}

/**
 * A-weighted level of one source over all its paths and octave bands, less the meteorological correction
 * (ISO 9613-2:1996, eq. (5), (6), (21), (22)).
 *
 * @param working  what works the equations out
 * @param site     for C0; 0 gives the downwind level
 * @param paths    levels per path and band [dB]
 * @param source, receptor  the two ends, for their heights
 * @param planM    distance in plan [m]
 * @returns        level [dB(A)], unrounded
 */
export function sumOfPaths(
  working: Working,
  site: Site,
  paths: readonly PathTerms[],
  source: Point,
  receptor: Point,
  planM: number,
): SummedLevel {
  const downwindDba = working.work(
    aWeightedSum,
    {
      levelsDb: paths.flatMap((path) => inOrder(path.levelDb)),
      weightsDb: paths.flatMap(() => inOrder(A_WEIGHTS_DB)),
    },
    "item-level",
  );
  const { c0Db } = site.method;
  if (c0Db === 0) return { levelDba: downwindDba, metDb: 0 };
  const metDb = working.work(
    metCorrection,
    { planDistanceM: planM, sourceHeightM: source.heightM, receptorHeightM: receptor.heightM, c0Db },
    "met-correction",
  );
  return { levelDba: working.work(metLevel, { levelDb: downwindDba, metDb }, "met-level"), metDb };
}
