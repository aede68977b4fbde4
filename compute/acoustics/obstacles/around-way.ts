import type { Place } from "../../geometry/place.ts";
import { planDistanceM, side, TIE_M } from "../../geometry/place.ts";
import type { Point } from "../site.ts";
import { levelM } from "../site.ts";
import type { Obstacle } from "./obstacle.ts";
import type { Way } from "./way.ts";

/**
 * The way round one side of what stands between: a taut line in plan past the corners of all obstacles on that side; past more
 * than two corners, the pair with the longest way (ISO 9613-2:1996, 7.4, fig. 5, vertical edges).
 *
 * @param obstacles  obstacles that the line of sight crosses in plan
 * @param kind       which side, seen from the source
 * @returns          the way, or nothing where an obstacle has no end on that side
 */
export function aroundWay(
  obstacles: readonly Obstacle[],
  kind: "left" | "right",
  source: Point,
  receptor: Point,
): Way | undefined {
  const sign = kind === "left" ? 1 : -1;
  const lengthM = planDistanceM(source.at, receptor.at);
  // A corner on the line itself is rounded on either side.
  const outside = (corner: Place) => (sign * side(source.at, receptor.at, corner)) / lengthM >= -TIE_M;
  if (obstacles.length === 0 || obstacles.some(({ corners }) => !corners.some(outside))) return undefined;
  const named = obstacles.flatMap(({ id, corners }) => corners.filter(outside).map((corner) => ({ id, corner })));
  const touched = tautCorners(source.at, receptor.at, named, sign);
  // Where no corner stands out, one lies on the line itself and is rounded without a detour.
  const taut = touched.length > 0 ? touched : named.slice(0, 1);
  const [first, second] = taut;
  if (!first) return undefined;
  const pair = second ? longestPair(taut, source.at, receptor.at) : [first];
  const places = [source.at, ...pair.map(({ corner }) => corner), receptor.at];
  const legs = places.slice(1).map((to, index) => planDistanceM(places[index] as Place, to));
  return {
    kind,
    obstacles: [...new Set(pair.map(({ id }) => id))],
    edgeCount: pair.length === 2 ? 2 : 1,
    sightBlocked: true,
    sourceToEdgeM: legs[0] as number,
    betweenEdgesM: pair.length === 2 ? (legs[1] as number) : 0,
    edgeToReceptorM: legs.at(-1) as number,
    alongEdgeM: Math.abs(levelM(source) - levelM(receptor)),
  };
}

interface NamedCorner {
  readonly id: string;
  readonly corner: Place;
}

/** Corners that a line drawn taut round all of them touches: their hull on one side, wrapped from the source. */
function tautCorners(a: Place, b: Place, corners: readonly NamedCorner[], sign: 1 | -1): readonly NamedCorner[] {
  const end: NamedCorner = { id: "", corner: b };
  const open = [...corners, end];
  const touched: NamedCorner[] = [];
  for (let from = a; ; ) {
    const next = open.reduce((kept, each) => (isOutside(from, kept.corner, each.corner, sign) ? each : kept));
    if (next === end) return touched;
    open.splice(open.indexOf(next), 1);
    touched.push(next);
    from = next.corner;
  }
}

/** Whether `corner` lies outside the line from `from` to `kept`, or on it and farther away. */
function isOutside(from: Place, kept: Place, corner: Place, sign: 1 | -1): boolean {
  const turn = sign * side(from, kept, corner);
  if (Math.abs(turn) <= TIE_M) return planDistanceM(from, corner) > planDistanceM(from, kept);
  return turn > 0;
}

function longestPair(taut: readonly NamedCorner[], a: Place, b: Place): readonly NamedCorner[] {
  const pairs = taut.flatMap((near, index) => taut.slice(index + 1).map((far) => [near, far] as const));
  const lengthM = ([near, far]: readonly [NamedCorner, NamedCorner]) =>
    planDistanceM(a, near.corner) + planDistanceM(near.corner, far.corner) + planDistanceM(far.corner, b);
  return pairs.reduce((kept, next) => (lengthM(kept) >= lengthM(next) ? kept : next));
}
