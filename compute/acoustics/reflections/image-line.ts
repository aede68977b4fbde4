import { leastReflector } from "../../equations/reflections/least-reflector.ts";
import { reflectedPower } from "../../equations/reflections/reflected-power.ts";
import type { Working } from "../../equations/working.ts";
import type { Place } from "../../geometry/place.ts";
import { planDistanceM } from "../../geometry/place.ts";
import type { BandHz, Bands } from "../bands.ts";
import { BANDS_HZ, perBand } from "../bands.ts";
import type { Line } from "../line.ts";
import { crossedEdges } from "../obstacles/crossed-edges.ts";
import type { CrossedEdge, EdgePoint, Obstacle, TopEdge } from "../obstacles/obstacle.ts";
import { NOT_COUNTED_DB } from "../path-terms.ts";
import type { PointSource } from "../propagate.ts";
import type { Point, Site } from "../site.ts";
import type { Facet } from "./facet.ts";
import type { Image } from "./image.ts";
import { imageIn, mirror } from "./image.ts";

/** A reflection with a coefficient up to this does not count (ISO 9613-2:1996, 7.5, condition 2). */
const LEAST_REFLECTION = 0.2;

/**
 * The line from a source's image in a surface to a receptor point, if the reflection can be constructed and the surface is large
 * enough and reflects enough in any band (ISO 9613-2:1996, 7.5).
 *
 * @param working  what works the equations out
 * @param site     obstacles, some of which the reflected sound may have to pass
 * @param facet    the surface
 * @param name     what its line is called
 */
export function imageLine(
  working: Working,
  site: Site,
  facet: Facet,
  name: string,
  source: PointSource,
  receptor: Point,
): Line | undefined {
  const image = imageIn(facet, source, receptor);
  if (!image) return undefined;
  const counts = new Set(BANDS_HZ.filter((bandHz) => countsIn(working, image, bandHz)));
  if (counts.size === 0) return undefined;
  const powerDb = perBand((bandHz) =>
    counts.has(bandHz)
      ? working
          .at(`band:${bandHz}`)
          .work(
            reflectedPower,
            { powerDb: source.powerDb[bandHz], reflection: facet.reflection[bandHz] },
            "reflected-power",
          )
      : source.powerDb[bandHz],
  );
  return {
    name,
    source: image.source,
    receptor,
    route: {
      lengthM: planDistanceM(image.source.at, receptor.at),
      legs: [
        { fromShare: 0, toShare: image.share, from: source.at, to: image.at },
        { fromShare: image.share, toShare: 1, from: image.at, to: receptor.at },
      ],
    },
    crossed: imageEdges(site.obstacles, image, receptor.at),
    powerDb,
    controlLossDb: source.controlLossDb,
    reflectedBy: facet.owner,
    reflectionDb: lossOf(source.powerDb, powerDb, counts),
  };
}

function lossOf(powerDb: Bands, imageDb: Bands, counts: ReadonlySet<BandHz>): Bands {
  return perBand((bandHz) => (counts.has(bandHz) ? powerDb[bandHz] - imageDb[bandHz] : NOT_COUNTED_DB));
}

function countsIn(working: Working, image: Image, bandHz: BandHz): boolean {
  if (image.facet.reflection[bandHz] <= LEAST_REFLECTION) return false;
  const { toSurfaceM, fromSurfaceM, incidenceRad } = image;
  const leastM = working
    .at(`band:${bandHz}`)
    .work(leastReflector, { bandHz, toSurfaceM, fromSurfaceM, incidenceRad }, "least-reflector");
  return image.smallestM > leastM;
}

/** Edges along the reflected sound, those before the surface mirrored with the source; the surface's own edge is left out. */
function imageEdges(obstacles: readonly Obstacle[], image: Image, to: Place): readonly CrossedEdge[] {
  const { facet, share, at } = image;
  const others = obstacles.map((obstacle) =>
    obstacle.id === facet.owner
      ? { ...obstacle, edges: obstacle.edges.filter((edge) => !isTopOf(facet, edge)) }
      : obstacle,
  );
  const before = crossedEdges(
    others.map((obstacle) => mirrored(facet, obstacle)),
    image.source.at,
    at,
  ).map((edge) => ({
    ...edge,
    share: edge.share * share,
  }));
  const after = crossedEdges(others, at, to).map((edge) => ({ ...edge, share: share + edge.share * (1 - share) }));
  return [...before, ...after];
}

function isTopOf({ from, to }: Facet, [a, b]: TopEdge): boolean {
  const same = (one: Place, other: Place) => one.xM === other.xM && one.yM === other.yM;
  return (same(a, from) && same(b, to)) || (same(a, to) && same(b, from));
}

function mirrored(facet: Facet, obstacle: Obstacle): Obstacle {
  const point = (end: EdgePoint): EdgePoint => ({ ...mirror(facet, end), levelM: end.levelM });
  return {
    ...obstacle,
    edges: obstacle.edges.map(([from, to]) => [point(from), point(to)] as const),
    corners: obstacle.corners.map((corner) => mirror(facet, corner)),
  };
}
