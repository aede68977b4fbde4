import { airAbsorption } from "../equations/propagation/air-absorption.ts";
import { airAttenuation } from "../equations/propagation/air-attenuation.ts";
import { divergence } from "../equations/propagation/divergence.ts";
import { octaveLevel } from "../equations/propagation/octave-level.ts";
import { unscreenedLimit } from "../equations/screens/unscreened-limit.ts";
import type { Working } from "../equations/working.ts";
import type { BandHz, Bands } from "./bands.ts";
import { exactMidbandHz, perBand } from "./bands.ts";
import { type Bending, bendings } from "./bendings.ts";
import type { GroundFactors } from "./ground-regions.ts";
import { groundTerms } from "./ground-terms.ts";
import type { Line } from "./line.ts";
import { detourM } from "./obstacles/way.ts";
import type { PathKind, PathTerms } from "./path-terms.ts";
import { NOT_COUNTED_DB } from "./path-terms.ts";
import type { Site } from "./site.ts";
import { slantDistanceM } from "./site.ts";

/** The paths of one line with their terms. */
export interface LinePaths {
  readonly distanceM: number;
  readonly groundFactors: GroundFactors | undefined;
  readonly paths: readonly PathTerms[];
}

interface Shared {
  readonly distanceM: number;
  readonly directivityDb: number;
  readonly divergenceDb: number;
  readonly airDb: Bands;
  readonly groundDb: Bands;
}

/**
 * All paths of a line, straight or past what it crosses, with their terms; together never above the unscreened level
 * (ISO 9613-2:1996, eq. (3), (4), 7.4).
 *
 * @param working  what works the equations out
 * @param site     air, ground and method
 * @param line     ends, edges crossed, sound power
 */
export function linePaths(working: Working, site: Site, line: Line): LinePaths {
  const distanceM = slantDistanceM(line.source, line.receptor);
  const divergenceDb = working.work(divergence, { distanceM }, "divergence");
  const ground = groundTerms(working, site, line.route, line.source, line.receptor, distanceM);
  const shared: Shared = {
    distanceM,
    directivityDb: ground.solidAngleDb,
    divergenceDb,
    airDb: airDb(working, site, distanceM),
    groundDb: ground.groundDb,
  };
  const found = bendings(line);
  const straight: PathKind = line.reflectedBy === undefined ? "direct" : "reflected";
  const unscreened = pathTerms(
    working.at(found.length > 0 ? "path:unscreened" : `path:${straight}`),
    line,
    shared,
    { kind: straight, name: straight, past: [], pathDifferenceM: undefined },
    perBand(() => 0),
  );
  if (found.length === 0) return { distanceM, groundFactors: ground.factors, paths: [unscreened] };
  const bent = found.map((bending) => {
    const here = working.at(`path:${bending.name}`);
    return bentPath(here, site, line, shared, bending);
  });
  return { distanceM, groundFactors: ground.factors, paths: neverAbove(working, unscreened, bent) };
}

function airDb(working: Working, site: Site, distanceM: number): Bands {
  return perBand((bandHz) => {
    const here = working.at(`band:${bandHz}`);
    const frequencyHz = exactMidbandHz(bandHz);
    const absorptionDbKm = here.work(airAbsorption, { frequencyHz, ...site.air }, "air-absorption");
    return here.work(airAttenuation, { absorptionDbKm, distanceM }, "air");
  });
}

function bentPath(working: Working, site: Site, line: Line, shared: Shared, bending: Bending): PathTerms {
  const { kind, name, past, way } = bending;
  const screenDb = perBand((bandHz) =>
    bending.lossDb(working.at(`band:${bandHz}`), site.method, shared.distanceM, shared.groundDb[bandHz], bandHz),
  );
  const pathDifferenceM = way && detourM(way, shared.distanceM);
  return pathTerms(working, line, shared, { kind, name, past, pathDifferenceM }, screenDb);
}

function pathTerms(
  working: Working,
  line: Line,
  shared: Shared,
  what: Pick<PathTerms, "kind" | "name" | "past" | "pathDifferenceM">,
  screenDb: Bands,
): PathTerms {
  const levelOf = (bandHz: BandHz) => {
    const levelDb = working.at(`band:${bandHz}`).work(
      octaveLevel,
      {
        powerDb: line.powerDb[bandHz],
        controlLossDb: line.controlLossDb[bandHz],
        directivityDb: shared.directivityDb,
        divergenceDb: shared.divergenceDb,
        airDb: shared.airDb[bandHz],
        groundDb: shared.groundDb[bandHz],
        screenDb: screenDb[bandHz],
      },
      "path-level",
    );
    return line.reflectionDb[bandHz] === NOT_COUNTED_DB ? levelDb - NOT_COUNTED_DB : levelDb;
  };
  const past = line.reflectedBy === undefined ? what.past : [line.reflectedBy, ...what.past];
  return {
    ...what,
    line: line.name,
    past,
    ...shared,
    screenDb,
    reflectionDb: line.reflectionDb,
    capDb: perBand(() => 0),
    levelDb: perBand(levelOf),
  };
}

/** The paths of a line, lowered together wherever their sum would lie above the unscreened level. */
function neverAbove(working: Working, unscreened: PathTerms, paths: readonly PathTerms[]): readonly PathTerms[] {
  return paths.map((path) => {
    const limited = (bandHz: BandHz) =>
      working.at(`path:${path.name}`, `band:${bandHz}`).work(
        unscreenedLimit,
        {
          levelDb: path.levelDb[bandHz],
          pathLevelsDb: paths.map((other) => other.levelDb[bandHz]),
          unscreenedDb: unscreened.levelDb[bandHz],
        },
        "limited-level",
      );
    const levelDb = perBand(limited);
    return { ...path, levelDb, capDb: perBand((bandHz) => path.levelDb[bandHz] - levelDb[bandHz]) };
  });
}
