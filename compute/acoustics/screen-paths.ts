import { crossing } from "../geometry/crossing.ts";
import type { Place } from "../geometry/place.ts";
import { planDistanceM, side, TIE_M } from "../geometry/place.ts";
import type { Point, Screen } from "./site.ts";
import { levelM, slantDistanceM } from "./site.ts";

/** A way from source to receptor point past the edges of one screen, as ISO 9613-2:1996, 7.4 measures it. */
export interface ScreenPath {
  readonly kind: "over" | "left" | "right";
  readonly screen: string;
  /** Lengths in the plane square to the edge [m]. */
  readonly sourceToEdgeM: number;
  readonly betweenEdgesM: number;
  readonly edgeToReceptorM: number;
  /** Component of the straight line along the edge [m]. */
  readonly alongEdgeM: number;
  /** Whether the straight line meets the screen (z above 0). */
  readonly sightBlocked: boolean;
}

/** Paths past one screen, and its extent square to the line of sight [m], which decides the bands it counts in. */
export interface ScreenPaths {
  readonly screen: string;
  readonly over: ScreenPath;
  readonly around: readonly ScreenPath[];
  readonly extentM: number;
}

/**
 * The paths past a screen that the plan line from source to receptor point crosses: over its top edge and round both
 * ends; nothing if the line passes beside it (ISO 9613-2:1996, 7.4, fig. 5 and 6).
 *
 * @param screen  the screen, its top above the site's datum [m]
 * @param source, receptor  the two ends
 */
export function screenPaths(screen: Screen, source: Point, receptor: Point): ScreenPaths | undefined {
  const runs = screen.line.slice(1).map((to, index) => ({ from: screen.line[index] as Place, to, index }));
  const crossed = runs.flatMap((run) => {
    const met = crossing(source.at, receptor.at, run.from, run.to);
    return met ? [{ run, over: overPath(screen, run.from, run.to, met.onFirst, source, receptor) }] : [];
  });
  const best = crossed.reduce<(typeof crossed)[number] | undefined>(
    (kept, next) =>
      kept && detourM(kept.over, source, receptor) >= detourM(next.over, source, receptor) ? kept : next,
    undefined,
  );
  if (!best) return undefined;
  const first = screen.line.slice(0, best.run.index + 1).reverse();
  const last = screen.line.slice(best.run.index + 1);
  const firstIsLeft =
    side(source.at, receptor.at, first.at(-1) as Place) >= side(source.at, receptor.at, last.at(-1) as Place);
  return {
    screen: screen.id,
    over: best.over,
    around: [
      aroundPath(screen, firstIsLeft ? first : last, "left", source, receptor),
      aroundPath(screen, firstIsLeft ? last : first, "right", source, receptor),
    ],
    extentM: extentM(screen, source, receptor),
  };
}

function overPath(screen: Screen, from: Place, to: Place, share: number, source: Point, receptor: Point): ScreenPath {
  const lengthM = planDistanceM(from, to);
  const squareM = (point: Point) => Math.abs(side(from, to, point.at)) / lengthM;
  const toEdgeM = (point: Point) => Math.sqrt(squareM(point) ** 2 + (screen.topM - levelM(point)) ** 2);
  const direction = { x: (to.xM - from.xM) / lengthM, y: (to.yM - from.yM) / lengthM };
  const alongEdgeM = Math.abs(
    (receptor.at.xM - source.at.xM) * direction.x + (receptor.at.yM - source.at.yM) * direction.y,
  );
  const sightM = levelM(source) + share * (levelM(receptor) - levelM(source));
  return {
    kind: "over",
    screen: screen.id,
    sourceToEdgeM: toEdgeM(source),
    betweenEdgesM: 0,
    edgeToReceptorM: toEdgeM(receptor),
    alongEdgeM,
    sightBlocked: screen.topM >= sightM - TIE_M,
  };
}

/** The way round one end: a taut line in plan past the corners between the crossing and that end. */
function aroundPath(
  screen: Screen,
  corners: readonly Place[],
  kind: "left" | "right",
  source: Point,
  receptor: Point,
): ScreenPath {
  const sign = kind === "left" ? 1 : -1;
  const taut = tautLine(source.at, receptor.at, corners, sign);
  const legs = taut.slice(1).map((corner, index) => planDistanceM(taut[index] as Place, corner));
  const between = legs.slice(1, -1).reduce((sum, leg) => sum + leg, 0);
  return {
    kind,
    screen: screen.id,
    sourceToEdgeM: legs[0] as number,
    betweenEdgesM: between,
    edgeToReceptorM: legs.at(-1) as number,
    alongEdgeM: Math.abs(levelM(source) - levelM(receptor)),
    sightBlocked: true,
  };
}

/** Shortest line in plan from `a` to `b` that leaves all `corners` of one side inside: their hull, wrapped from `a`. */
function tautLine(a: Place, b: Place, corners: readonly Place[], sign: 1 | -1): readonly Place[] {
  const outer = corners.filter((corner) => sign * side(a, b, corner) > 0);
  const end = corners.at(-1) as Place;
  if (outer.length === 0) return [a, end, b];
  const open = [...outer, b];
  const line = [a];
  while (line.at(-1) !== b) {
    const from = line.at(-1) as Place;
    const next = open.reduce((kept, corner) => (isOutside(from, kept, corner, sign) ? corner : kept));
    open.splice(open.indexOf(next), 1);
    line.push(next);
  }
  return line;
}

/** Whether `corner` lies outside the line from `from` to `kept`, or on it and farther away. */
function isOutside(from: Place, kept: Place, corner: Place, sign: 1 | -1): boolean {
  const turn = sign * side(from, kept, corner);
  if (Math.abs(turn) <= TIE_M) return planDistanceM(from, corner) > planDistanceM(from, kept);
  return turn > 0;
}

function extentM(screen: Screen, source: Point, receptor: Point): number {
  const offsets = screen.line.map(
    (corner) => side(source.at, receptor.at, corner) / planDistanceM(source.at, receptor.at),
  );
  return Math.max(...offsets) - Math.min(...offsets);
}

/** Signed detour of a path over the straight line [m]; decides which crossing of a bent screen counts. */
function detourM(path: ScreenPath, source: Point, receptor: Point): number {
  const lengthM = path.sourceToEdgeM + path.betweenEdgesM + path.edgeToReceptorM;
  const detour = Math.sqrt(lengthM ** 2 + path.alongEdgeM ** 2) - slantDistanceM(source, receptor);
  return path.sightBlocked ? detour : -detour;
}
