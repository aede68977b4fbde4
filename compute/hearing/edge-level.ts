import { exchangeFactor } from "../equations/hearing/exchange-factor.ts";
import { zoneEdgeLevel } from "../equations/hearing/zone-edge-level.ts";
import type { Working } from "../equations/working.ts";

/** Level from which the mandatory notice stands where the law has none, or a higher one [dB(A) as LEX,8h]. */
export const GOOD_PRACTICE_DBA = 85;

/** Exchange of level against time that a duty set names. */
export type Exchange = { readonly kind: "equal-energy" } | { readonly kind: "exchange-rate"; readonly rateDb: number };

/** Length of the shift and uncertainty of the estimate, which every edge is lowered by. */
export interface Shift {
  /** 0 to 24 [h]; less than 8 counts as 8. */
  readonly shiftH: number;
  /** U, at least 3 [dB]. */
  readonly uncertaintyDb: number;
}

/**
 * Level over the whole shift at which an 8-hour value is met with the uncertainty counted in.
 *
 * @param working   what works the equations out
 * @param valueDba  value of the duty set [dB(A) as LEX,8h]
 * @param exchange  the duty set's exchange
 * @returns         edge level [dB(A)], unrounded
 */
export function valueEdgeDba(working: Working, valueDba: number, exchange: Exchange, shift: Shift): number {
  const exchangeFactorDb =
    exchange.kind === "equal-energy"
      ? 10
      : working.work(exchangeFactor, { exchangeRateDb: exchange.rateDb }, "exchange-factor");
  return working.work(zoneEdgeLevel, { valueDba, exchangeFactorDb, ...shift }, "zone-edge-level");
}

/** Whether 85 dB(A) stands as good practice beside the law's value. */
export function goodPracticeCounts(mandatoryDba: number | undefined): boolean {
  return mandatoryDba === undefined || mandatoryDba > GOOD_PRACTICE_DBA;
}

/**
 * Level at which the zone ends: the lower of the law's edge and, where the law has none or a higher one, that of 85 dB(A).
 *
 * @param mandatoryDba  value of the duty set [dB(A)], or nothing where the law has none
 * @returns             edge level [dB(A)], unrounded
 */
export function zoneEdgeDba(
  working: Working,
  mandatoryDba: number | undefined,
  exchange: Exchange,
  shift: Shift,
): number {
  const law = mandatoryDba === undefined ? [] : [valueEdgeDba(working, mandatoryDba, exchange, shift)];
  const practice = goodPracticeCounts(mandatoryDba)
    ? [valueEdgeDba(working, GOOD_PRACTICE_DBA, { kind: "equal-energy" }, shift)]
    : [];
  return Math.min(...law, ...practice);
}
