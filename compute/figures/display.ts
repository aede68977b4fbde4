/** A number with a fixed count of decimals, halves away from zero, a true minus sign, never "−0". */
export function decimals(value: number, places: number): string {
  if (!Number.isFinite(value)) throw new Error(`a page cannot print ${value}`);
  const factor = 10 ** places;
  // 64.45 is stored as 64.4500…03 or 64.4499…97: a relative nudge far below any printed digit settles halves.
  const rounded = Math.round(Math.abs(value) * factor * (1 + 4 * Number.EPSILON)) / factor;
  const text = rounded.toFixed(places);
  return value < 0 && Number(text) !== 0 ? `−${text}` : text;
}

/** A level in plain words: whole decibels. */
export function wholeDb(value: number): string {
  return decimals(value, 0);
}

/** A level in workings and tables: one decimal. */
export function tenthDb(value: number): string {
  return decimals(value, 1);
}

/** Distance of a zone: up to the next whole metre; a millimetre of computing noise is not a metre. */
export function zoneMetres(distanceM: number): number {
  return Math.max(1, Math.ceil(distanceM - 1e-6));
}

/** How a level stands to its limit, in the form words are made from. */
export type Standing =
  | { readonly kind: "over"; readonly by: string }
  | { readonly kind: "just-over"; readonly by: string }
  | { readonly kind: "at" }
  | { readonly kind: "below"; readonly by: string }
  | { readonly kind: "just-below"; readonly by: string };

/**
 * How a level stands to a limit, judged on unrounded values by the limit set's comparator.
 *
 * @param levelDb, limitDb  unrounded [dB]
 * @param comparator  whether the limit itself is already too much
 * @returns           `just-over` and `just-below` where the difference would round to 0.0 dB
 */
export function standing(levelDb: number, limitDb: number, comparator: "above" | "at-or-above"): Standing {
  const difference = levelDb - limitDb;
  const isOver = comparator === "above" ? difference > 0 : difference >= 0;
  // Subtraction leaves 75.05 − 75 at 0.0499…97: the same nudge as in `decimals`, by the size of what was subtracted.
  const noise = 4 * Number.EPSILON * Math.max(Math.abs(levelDb), Math.abs(limitDb));
  const by = tenthDb(Math.abs(difference) + noise);
  if (isOver) return by === "0.0" ? { kind: "just-over", by: "0.1" } : { kind: "over", by };
  if (difference === 0) return { kind: "at" };
  return by === "0.0" ? { kind: "just-below", by: "0.1" } : { kind: "below", by };
}

/**
 * A level beside its limit with so many decimals: never printed as the limit or less when it is over.
 *
 * @returns the printed number and whether "just over" must stand before it
 */
export function levelBesideLimit(
  levelDb: number,
  limitDb: number,
  comparator: "above" | "at-or-above",
  places: 0 | 1,
): { readonly text: string; readonly justOver: boolean } {
  const text = decimals(levelDb, places);
  const isOver = comparator === "above" ? levelDb > limitDb : levelDb >= limitDb;
  const looksOver = Number(text.replace("−", "-")) > limitDb;
  return isOver && !looksOver ? { text: decimals(limitDb, places), justOver: true } : { text, justOver: false };
}
