import type { Working } from "../equations/working.ts";
import { planDistanceM } from "../geometry/place.ts";
import type { Bands } from "./bands.ts";
import { perBand } from "./bands.ts";
import type { GroundFactors } from "./ground-regions.ts";
import { linePaths } from "./line-paths.ts";
import { crossedEdges } from "./obstacles/crossed-edges.ts";
import type { PathTerms } from "./path-terms.ts";
import { imageLine } from "./reflections/image-line.ts";
import type { Point, Site } from "./site.ts";

/** A point source: sound power per band [dB re 1 pW] and what a control at the machine takes off it [dB]. */
export interface PointSource extends Point {
  readonly powerDb: Bands;
  readonly controlLossDb: Bands;
}

/** A receptor point; at a facade, the building whose own reflection the limit's facade term stands for. */
export interface Receptor extends Point {
  readonly facadeOf: string | undefined;
}

export interface Propagation {
  readonly distanceM: number;
  readonly planM: number;
  /** G of the three regions along the straight line; absent by the alternative ground method. */
  readonly groundFactors: GroundFactors | undefined;
  /** The straight line's paths first, then those of reflections. */
  readonly paths: readonly PathTerms[];
}

/**
 * Levels of one source at one receptor point while it runs, per path and octave band, with the terms they are made of
 * (ISO 9613-2:1996, eq. (3), (4); over, round and through what stands between; first-order reflections).
 *
 * @param working   what works the equations out
 * @param site      air, ground, obstacles, surfaces and method
 * @param source    position, sound power per band [dB re 1 pW]
 * @param receptor  receptor point; at a distance above 0 from the source
 * @returns         levels [dB re 20 µPa], free field, unrounded
 * @throws {InputError} if a length or a value of the air lies outside the standard's range
 */
export function propagate(working: Working, site: Site, source: PointSource, receptor: Receptor): Propagation {
  const planM = planDistanceM(source.at, receptor.at);
  const straight = linePaths(working.at("line:straight"), site, {
    name: "straight",
    source,
    receptor,
    route: { lengthM: planM, legs: [{ fromShare: 0, toShare: 1, from: source.at, to: receptor.at }] },
    crossed: crossedEdges(site.obstacles, source.at, receptor.at),
    powerDb: source.powerDb,
    controlLossDb: source.controlLossDb,
    reflectedBy: undefined,
    reflectionDb: perBand(() => 0),
  });
  const reflected = site.facets
    .filter(({ owner }) => owner !== receptor.facadeOf)
    .flatMap((facet, index) => {
      const name = `facet-${index}`;
      const here = working.at(`line:${name}`);
      const line = imageLine(here, site, facet, name, source, receptor);
      return line ? linePaths(here, site, line).paths : [];
    });
  return {
    distanceM: straight.distanceM,
    planM,
    groundFactors: straight.groundFactors,
    paths: [...straight.paths, ...reflected],
  };
}
