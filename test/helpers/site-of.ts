import { perBand } from "../../compute/acoustics/bands.ts";
import type { Obstacle } from "../../compute/acoustics/obstacles/obstacle.ts";
import type { PointSource, Receptor } from "../../compute/acoustics/propagate.ts";
import type { Facet } from "../../compute/acoustics/reflections/facet.ts";
import type { Ground, Method, Site } from "../../compute/acoustics/site.ts";
import { sides } from "../../compute/geometry/outline.ts";

type Pair = readonly [xM: number, yM: number];

/** A thin wall along a line, its top level, that lets nothing through. */
export function wall(topM: number, ...line: readonly Pair[]): Obstacle {
  const places = line.map(([xM, yM]) => ({ xM, yM }));
  const ends = places.map((place) => ({ ...place, levelM: topM }));
  const edges = ends.slice(1).map((to, index) => [ends[index] as (typeof ends)[number], to] as const);
  return { id: "wall", kind: "screen", edges, corners: places, throughDb: undefined };
}

/** A building with a flat roof over an outline. */
export function block(topM: number, ...outline: readonly Pair[]): Obstacle {
  const corners = outline.map(([xM, yM]) => ({ xM, yM }));
  const edges = sides(corners).map(
    ([from, to]) =>
      [
        { ...from, levelM: topM },
        { ...to, levelM: topM },
      ] as const,
  );
  return { id: "block", kind: "building", edges, corners, throughDb: undefined };
}

/** A hard upright surface from the ground at 0 m up to a level. */
export function surface(topM: number, from: Pair, to: Pair, reflection = 1): Facet {
  const [a, b] = [from, to].map(([xM, yM]) => ({ xM, yM }));
  return {
    owner: "surface",
    reflects: "both-sides",
    from: a as Facet["from"],
    to: b as Facet["to"],
    bottomM: 0,
    topM,
    reflection: perBand(() => reflection),
  };
}

/** Flat ground at 10 °C, 70 %, 101.325 kPa, with what is given. */
export function siteOf(
  groundFactor: number,
  obstacles: readonly Obstacle[] = [],
  method: Partial<Method> = {},
  facets: readonly Facet[] = [],
  areas: Ground["areas"] = [],
): Site {
  return {
    air: { temperatureC: 10, humidityPct: 70, pressureKpa: 101.325 },
    ground: { elsewhere: groundFactor, areas },
    obstacles,
    facets,
    method: { ground: "general", screenOverHardGround: "conservative", c0Db: 0, ...method },
  };
}

/** A source of one level in every band, nothing taken off. */
export function sourceAt(xM: number, yM: number, heightM: number, levelDb = 100, groundM = 0): PointSource {
  return { at: { xM, yM }, groundM, heightM, powerDb: perBand(() => levelDb), controlLossDb: perBand(() => 0) };
}

/** A receptor point at no facade. */
export function receptorAt(xM: number, yM: number, heightM: number, groundM = 0): Receptor {
  return { at: { xM, yM }, groundM, heightM, facadeOf: undefined };
}
