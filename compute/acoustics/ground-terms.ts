import { groundEffect } from "../equations/propagation/ground-effect.ts";
import { groundEffectAlternative } from "../equations/propagation/ground-effect-alternative.ts";
import { solidAngleIndex } from "../equations/propagation/solid-angle-index.ts";
import type { Working } from "../equations/working.ts";
import type { Bands } from "./bands.ts";
import { perBand } from "./bands.ts";
import type { GroundFactors } from "./ground-regions.ts";
import { groundFactors } from "./ground-regions.ts";
import type { Route } from "./route.ts";
import type { Point, Site } from "./site.ts";

/** Ground term per band, and what goes with the method it was worked out by. */
export interface GroundTerms {
  readonly groundDb: Bands;
  /** DΩ of the alternative method, which always goes with it; 0 by the general method [dB]. */
  readonly solidAngleDb: number;
  /** G of the three regions, by the general method. */
  readonly factors: GroundFactors | undefined;
}

/**
 * Ground attenuation of a route by the method that the project names (ISO 9613-2:1996, 7.3.1 or 7.3.2 with eq. (11)).
 *
 * @param working    what works the equations out
 * @param site       ground and method
 * @param route      the line in plan
 * @param source, receptor  the two ends, the source mirrored where the route is reflected
 * @param distanceM  straight distance [m]
 */
export function groundTerms(
  working: Working,
  site: Site,
  route: Route,
  source: Point,
  receptor: Point,
  distanceM: number,
): GroundTerms {
  const heights = { sourceHeightM: source.heightM, receptorHeightM: receptor.heightM };
  if (site.method.ground === "alternative") {
    // Over flat ground the area between path and ground, divided by its length, is the mean of the two heights.
    const meanPathHeightM = (source.heightM + receptor.heightM) / 2;
    const groundDb = working.work(groundEffectAlternative, { distanceM, meanPathHeightM }, "ground");
    const solidAngleDb = working.work(solidAngleIndex, { planDistanceM: route.lengthM, ...heights }, "solid-angle");
    return { groundDb: perBand(() => groundDb), solidAngleDb, factors: undefined };
  }
  const factors = groundFactors(working, site.ground, route, source.heightM, receptor.heightM);
  const groundDb = perBand((bandHz) =>
    working.at(`band:${bandHz}`).work(
      groundEffect,
      {
        bandHz,
        ...heights,
        planDistanceM: route.lengthM,
        groundSource: factors.source,
        groundMiddle: factors.middle,
        groundReceptor: factors.receptor,
      },
      "ground",
    ),
  );
  return { groundDb, solidAngleDb: 0, factors };
}
