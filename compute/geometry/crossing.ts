import type { Place } from "./place.ts";
import { planDistanceM, TIE_M } from "./place.ts";

/** Where two segments cross: the share along each, 0 to 1. */
export interface Crossing {
  readonly onFirst: number;
  readonly onSecond: number;
}

/**
 * Where the segments a–b and c–d cross; touching within `TIE_M` counts, parallel segments do not cross.
 *
 * @param a, b  ends of the first segment [m]
 * @param c, d  ends of the second segment [m]
 */
export function crossing(a: Place, b: Place, c: Place, d: Place): Crossing | undefined {
  const abX = b.xM - a.xM;
  const abY = b.yM - a.yM;
  const cdX = d.xM - c.xM;
  const cdY = d.yM - c.yM;
  const lengths = planDistanceM(a, b) * planDistanceM(c, d);
  const determinant = abX * cdY - abY * cdX;
  if (lengths === 0 || Math.abs(determinant) <= 1e-12 * lengths) return undefined;
  const onFirst = ((c.xM - a.xM) * cdY - (c.yM - a.yM) * cdX) / determinant;
  const onSecond = ((c.xM - a.xM) * abY - (c.yM - a.yM) * abX) / determinant;
  const tieFirst = TIE_M / planDistanceM(a, b);
  const tieSecond = TIE_M / planDistanceM(c, d);
  const within = onFirst >= -tieFirst && onFirst <= 1 + tieFirst && onSecond >= -tieSecond && onSecond <= 1 + tieSecond;
  return within ? { onFirst, onSecond } : undefined;
}

/** Whether a crossing lies on the second segment between its ends, the ends themselves left out. */
export function isBetweenEnds({ onSecond }: Crossing): boolean {
  return onSecond > 0 && onSecond < 1;
}
