/** A position on the local plane: metres east and north of the project's origin. */
export interface Place {
  readonly xM: number;
  readonly yM: number;
}

/** Two positions closer than this count as one: a tie is decided by this tolerance and by nothing else [m]. */
export const TIE_M = 1e-6;

/** Distance between two positions on the plane [m]. */
export function planDistanceM(a: Place, b: Place): number {
  return Math.sqrt((a.xM - b.xM) ** 2 + (a.yM - b.yM) ** 2);
}

/** The position at share `t` of the way from `a` to `b`, 0 at `a` and 1 at `b`. */
export function along(a: Place, b: Place, t: number): Place {
  return { xM: a.xM + t * (b.xM - a.xM), yM: a.yM + t * (b.yM - a.yM) };
}

/** Twice the signed area of the triangle a, b, c: above 0 when c lies left of the line from a to b [m²]. */
export function side(a: Place, b: Place, c: Place): number {
  return (b.xM - a.xM) * (c.yM - a.yM) - (b.yM - a.yM) * (c.xM - a.xM);
}

/** Length of a line through its points [m]. */
export function lineLengthM(line: readonly Place[]): number {
  return line.slice(1).reduce((sum, to, index) => sum + planDistanceM(line[index] as Place, to), 0);
}
