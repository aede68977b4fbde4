import { exchangeFactor } from "../equations/hearing/exchange-factor.ts";
import { zoneEdgeLevel } from "../equations/hearing/zone-edge-level.ts";
import type { Working } from "../equations/working.ts";

/** Level from which the mandatory notice stands where the law has none, or a higher one [dB(A) as LEX,8h]. */
export const GOOD_PRACTICE_DBA = 85;

/** Exchange of level against time that a duty set names. */
export type Exchange = { readonly kind: "equal-energy" } | { readonly kind: "exchange-rate"; readonly rateDb: number };

/**
 * Level at which the zone ends: the lowest of the law's value and 85 dB(A), each for the length of the shift, less the
 * uncertainty.
 *
 * @param working        what works the equations out
 * @param mandatoryDba   value of the duty set [dB(A)], or nothing where the law has none
 * @param exchange       the duty set's exchange
 * @param shiftH         length of the shift [h], 0 to 24
 * @param uncertaintyDb  uncertainty of the estimate [dB], at least 3
 * @returns              edge level [dB(A)], unrounded
 */
export function edgeLevelDba(
  working: Working,
  mandatoryDba: number | undefined,
  exchange: Exchange,
  shiftH: number,
  uncertaintyDb: number,
): number {
  const values =
    mandatoryDba === undefined || mandatoryDba > GOOD_PRACTICE_DBA ? [mandatoryDba, GOOD_PRACTICE_DBA] : [mandatoryDba];
  const factor =
    exchange.kind === "equal-energy"
      ? 10
      : working.work(exchangeFactor, { exchangeRateDb: exchange.rateDb }, "exchange-factor");
  const edges = values
    .filter((value) => value !== undefined)
    .map((valueDba) => {
      const exchangeFactorDb = valueDba === mandatoryDba ? factor : 10;
      return working.work(zoneEdgeLevel, { valueDba, exchangeFactorDb, shiftH, uncertaintyDb }, "zone-edge-level");
    });
  return Math.min(...edges);
}
