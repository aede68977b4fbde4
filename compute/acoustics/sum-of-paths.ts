import { aWeightedSum } from "../equations/levels/a-weighted-sum.ts";
import type { Working } from "../equations/working.ts";
import { A_WEIGHTS_DB, inOrder } from "./bands.ts";
import type { PathTerms } from "./propagate.ts";

/**
 * A-weighted level of one source over all its paths and octave bands (ISO 9613-2:1996, eq. (5)).
 *
 * @param working  what works the equation out
 * @param paths    levels per path and band [dB]
 * @returns        level [dB(A)], unrounded
 */
export function sumOfPaths(working: Working, paths: readonly PathTerms[]): number {
  return working.work(
    aWeightedSum,
    {
      levelsDb: paths.flatMap((path) => inOrder(path.levelDb)),
      weightsDb: paths.flatMap(() => inOrder(A_WEIGHTS_DB)),
    },
    "item-level",
  );
}
