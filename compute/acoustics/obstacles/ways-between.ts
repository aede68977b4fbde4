import type { Place } from "../../geometry/place.ts";
import { planDistanceM, side, TIE_M } from "../../geometry/place.ts";
import type { BandHz } from "../bands.ts";
import { BANDS_HZ } from "../bands.ts";
import type { Point } from "../site.ts";
import { levelM } from "../site.ts";
import { aroundWay } from "./around-way.ts";
import type { CrossedEdge, Obstacle } from "./obstacle.ts";
import { overWay } from "./over-way.ts";
import type { Way } from "./way.ts";

/** Speed of sound in λ = 340/f [m/s] (ISO 9613-2:1996, 7.4). */
export const SCREEN_SOUND_SPEED_MS = 340;

/** The ways past what stands between two points, for the obstacles that count together. */
export interface Ways {
  readonly over: Way | undefined;
  readonly left: Way | undefined;
  readonly right: Way | undefined;
  /** Over the rims of excavations, which a way round the rest has to pass too. */
  readonly rims: Way | undefined;
  /** Where several stand in the line of sight: round each alone, then over all the others. */
  readonly mixed: readonly MixedWay[];
  /** Screens in the line of sight that let some sound through, each with the way over all the others. */
  readonly through: readonly { readonly obstacle: Obstacle; readonly others: Way | undefined }[];
}

/** Round one obstacle, then over whatever else stands in the line. */
export interface MixedWay {
  readonly obstacle: Obstacle;
  readonly round: Way;
  readonly others: Way | undefined;
}

/**
 * The ways past obstacles in each octave band: an obstacle counts in a band only if it is wider, square to the line of sight,
 * than the wavelength (ISO 9613-2:1996, 7.4, l_l + l_r > λ).
 *
 * @param crossed  edges that the line crosses in plan, from the source on
 * @param source, receptor  the two ends
 */
export function waysBetween(
  crossed: readonly CrossedEdge[],
  source: Point,
  receptor: Point,
): ReadonlyMap<BandHz, Ways> {
  const widths = new Map(crossed.map(({ obstacle }) => [obstacle, widthM(obstacle, source.at, receptor.at)]));
  const standing = crossed.filter((edge) => !isHole(edge, crossed, source, receptor));
  const known = new Map<string, Ways>();
  return new Map(
    BANDS_HZ.map((bandHz) => {
      const counting = standing.filter(({ obstacle }) => (widths.get(obstacle) ?? 0) > SCREEN_SOUND_SPEED_MS / bandHz);
      const key = counting.map(({ obstacle, share }) => `${obstacle.id} ${share}`).join("|");
      const ways = known.get(key) ?? waysPast(counting, source, receptor);
      known.set(key, ways);
      return [bandHz, ways] as const;
    }),
  );
}

function waysPast(crossed: readonly CrossedEdge[], source: Point, receptor: Point): Ways {
  const over = overWay(crossed, source, receptor);
  const inSight = [
    ...new Set(crossed.filter((edge) => meetsSight(edge, source, receptor)).map(({ obstacle }) => obstacle)),
  ];
  const passed =
    inSight.length > 0
      ? inSight
      : crossed.filter(({ obstacle }) => over?.obstacles.includes(obstacle.id)).map(({ obstacle }) => obstacle);
  const beside = passed.filter(({ kind }) => kind !== "excavation");
  const overAllBut = (obstacle: Obstacle) =>
    overWay(
      crossed.filter((edge) => edge.obstacle !== obstacle),
      source,
      receptor,
    );
  const mixed = (obstacle: Obstacle) =>
    (["left", "right"] as const).flatMap((kind): readonly MixedWay[] => {
      const round = aroundWay([obstacle], kind, source, receptor);
      return round ? [{ obstacle, round, others: overAllBut(obstacle) }] : [];
    });
  return {
    over,
    left: aroundWay(beside, "left", source, receptor),
    right: aroundWay(beside, "right", source, receptor),
    rims: overWay(
      crossed.filter(({ obstacle }) => obstacle.kind === "excavation"),
      source,
      receptor,
    ),
    mixed: beside.length > 1 ? beside.flatMap(mixed) : [],
    through: inSight
      .filter(({ throughDb }) => throughDb !== undefined)
      .map((obstacle) => ({ obstacle, others: overAllBut(obstacle) })),
  };
}

/** A pit whose rim sight passes above, with both ends outside it or both inside: nothing stands there. */
function isHole({ obstacle }: CrossedEdge, crossed: readonly CrossedEdge[], source: Point, receptor: Point): boolean {
  if (obstacle.kind !== "excavation") return false;
  const rim = crossed.filter((edge) => edge.obstacle === obstacle);
  const places = new Set(rim.map(({ share }) => share.toFixed(6)));
  return places.size % 2 === 0 && !rim.some((edge) => meetsSight(edge, source, receptor));
}

function meetsSight({ share, levelM: edgeM }: CrossedEdge, source: Point, receptor: Point): boolean {
  return edgeM >= levelM(source) + share * (levelM(receptor) - levelM(source)) - TIE_M;
}

/** Width of an obstacle square to the line of sight [m]; the rim of an excavation has no ends. */
function widthM(obstacle: Obstacle, from: Place, to: Place): number {
  if (obstacle.kind === "excavation") return Number.POSITIVE_INFINITY;
  const offsets = obstacle.corners.map((corner) => side(from, to, corner) / planDistanceM(from, to));
  return Math.max(...offsets) - Math.min(...offsets);
}
