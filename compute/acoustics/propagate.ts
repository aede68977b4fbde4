import { airAbsorption } from "../equations/propagation/air-absorption.ts";
import { airAttenuation } from "../equations/propagation/air-attenuation.ts";
import { divergence } from "../equations/propagation/divergence.ts";
import { groundEffect } from "../equations/propagation/ground-effect.ts";
import { octaveLevel } from "../equations/propagation/octave-level.ts";
import { screenOverTop } from "../equations/screens/screen-over-top.ts";
import { screenOverTopLiteral } from "../equations/screens/screen-over-top-literal.ts";
import { unscreenedLimit } from "../equations/screens/unscreened-limit.ts";
import type { Working } from "../equations/working.ts";
import { planDistanceM } from "../geometry/place.ts";
import type { Bands } from "./bands.ts";
import { type BANDS_HZ, exactMidbandHz, perBand } from "./bands.ts";
import type { GroundFactors } from "./ground-regions.ts";
import { groundFactors } from "./ground-regions.ts";
import { SCREEN_SOUND_SPEED_MS, screenLoss } from "./screen-loss.ts";
import type { ScreenPath, ScreenPaths } from "./screen-paths.ts";
import { screenPaths } from "./screen-paths.ts";
import type { Point, Site } from "./site.ts";
import { slantDistanceM } from "./site.ts";

/** A point source: sound power per band [dB re 1 pW] and what a control at the machine takes off it [dB]. */
export interface PointSource extends Point {
  readonly powerDb: Bands;
  readonly controlLossDb: Bands;
}

/** The terms of one path [dB per band], the level they give, and the geometry they come from. */
export interface PathTerms {
  readonly path: "direct" | "over" | "left" | "right";
  readonly screen: string | undefined;
  readonly pathDifferenceM: number | undefined;
  readonly divergenceDb: number;
  readonly airDb: Bands;
  readonly groundDb: Bands;
  readonly screenDb: Bands;
  /** What the paths together would lie above the unscreened level, taken off each of them. */
  readonly capDb: Bands;
  readonly levelDb: Bands;
}

export interface Propagation {
  readonly distanceM: number;
  readonly planM: number;
  readonly groundFactors: GroundFactors;
  readonly paths: readonly PathTerms[];
}

/**
 * Levels of one source at one receptor point while it runs, per path and octave band, with the terms they are made of
 * (ISO 9613-2:1996, eq. (3), (4); paths over and round one screen, never above the unscreened level).
 *
 * @param working   what works the equations out
 * @param site      air, ground and the screens that stand
 * @param source    position, sound power per band [dB re 1 pW]
 * @param receptor  receptor point; at a distance above 0 from the source
 * @returns         levels [dB re 20 µPa], free field, unrounded
 * @throws {InputError} if a length or a value of the air lies outside the standard's range
 */
export function propagate(working: Working, site: Site, source: PointSource, receptor: Point): Propagation {
  const distanceM = slantDistanceM(source, receptor);
  const planM = planDistanceM(source.at, receptor.at);
  const factors = groundFactors(working, site.ground, source, receptor);
  const shared = {
    distanceM,
    divergenceDb: working.work(divergence, { distanceM }, "divergence"),
    airDb: airDb(working, site, distanceM),
    groundDb: groundDb(working, factors, planM, source, receptor),
  };
  const past = governingScreen(site, source, receptor, distanceM);
  const direct = pathTerms(
    past ? working.at("path:unscreened") : working.at("path:direct"),
    site,
    source,
    shared,
    undefined,
  );
  if (!past) return { distanceM, planM, groundFactors: factors, paths: [direct] };
  const beside = [past.over, ...past.around].map((path) =>
    pathTerms(working.at(`path:${path.kind}`), site, source, shared, { path, extentM: past.extentM }),
  );
  return { distanceM, planM, groundFactors: factors, paths: neverAbove(working, direct, beside) };
}

interface Shared {
  readonly distanceM: number;
  readonly divergenceDb: number;
  readonly airDb: Bands;
  readonly groundDb: Bands;
}

function airDb(working: Working, site: Site, distanceM: number): Bands {
  return perBand((bandHz) => {
    const here = working.at(`band:${bandHz}`);
    const absorptionDbKm = here.work(
      airAbsorption,
      { frequencyHz: exactMidbandHz(bandHz), ...site.air },
      "air-absorption",
    );
    return here.work(airAttenuation, { absorptionDbKm, distanceM }, "air");
  });
}

function groundDb(working: Working, factors: GroundFactors, planM: number, source: Point, receptor: Point): Bands {
  return perBand((bandHz) =>
    working.at(`band:${bandHz}`).work(
      groundEffect,
      {
        bandHz,
        sourceHeightM: source.heightM,
        receptorHeightM: receptor.heightM,
        planDistanceM: planM,
        groundSource: factors.source,
        groundMiddle: factors.middle,
        groundReceptor: factors.receptor,
      },
      "ground",
    ),
  );
}

/** Of the screens crossed, the one whose top edge makes the way longest; one screen counts, the others are left out. */
function governingScreen(site: Site, source: Point, receptor: Point, distanceM: number): ScreenPaths | undefined {
  const detourM = ({ over }: ScreenPaths) => {
    const bentM = Math.sqrt((over.sourceToEdgeM + over.edgeToReceptorM) ** 2 + over.alongEdgeM ** 2);
    return over.sightBlocked ? bentM - distanceM : distanceM - bentM;
  };
  return site.screens
    .flatMap((screen) => screenPaths(screen, source, receptor) ?? [])
    .reduce<ScreenPaths | undefined>((kept, next) => (kept && detourM(kept) >= detourM(next) ? kept : next), undefined);
}

/** The terms and level of one path; the way round an end keeps the ground term (eq. (13)), the way over the top holds it (eq. (12)). */
function pathTerms(
  working: Working,
  site: Site,
  source: PointSource,
  shared: Shared,
  past: { readonly path: ScreenPath; readonly extentM: number } | undefined,
): PathTerms {
  const loss = past && screenLoss(working, past.path, shared.distanceM);
  const screenDb = perBand((bandHz) => {
    if (!past || !loss || past.extentM <= SCREEN_SOUND_SPEED_MS / bandHz) return 0;
    if (past.path.kind !== "over") return loss.lossDb[bandHz];
    const overTop = site.screenOverHardGround === "literal" ? screenOverTopLiteral : screenOverTop;
    return working
      .at(`band:${bandHz}`)
      .work(overTop, { diffractionDb: loss.lossDb[bandHz], groundDb: shared.groundDb[bandHz] }, "screen");
  });
  return {
    path: past?.path.kind ?? "direct",
    screen: past?.path.screen,
    pathDifferenceM: loss?.pathDifferenceM,
    divergenceDb: shared.divergenceDb,
    airDb: shared.airDb,
    groundDb: shared.groundDb,
    screenDb,
    capDb: perBand(() => 0),
    levelDb: perBand((bandHz) =>
      working.at(`band:${bandHz}`).work(
        octaveLevel,
        {
          powerDb: source.powerDb[bandHz],
          controlLossDb: source.controlLossDb[bandHz],
          directivityDb: 0,
          divergenceDb: shared.divergenceDb,
          airDb: shared.airDb[bandHz],
          groundDb: shared.groundDb[bandHz],
          screenDb: screenDb[bandHz],
        },
        "path-level",
      ),
    ),
  };
}

/** The paths past a screen, lowered together wherever their sum would lie above the unscreened level. */
function neverAbove(working: Working, direct: PathTerms, paths: readonly PathTerms[]): readonly PathTerms[] {
  return paths.map((path) => {
    const limited = (bandHz: (typeof BANDS_HZ)[number]) =>
      working.at(`path:${path.path}`, `band:${bandHz}`).work(
        unscreenedLimit,
        {
          levelDb: path.levelDb[bandHz],
          pathLevelsDb: paths.map((other) => other.levelDb[bandHz]),
          unscreenedDb: direct.levelDb[bandHz],
        },
        "limited-level",
      );
    const levelDb = perBand(limited);
    return { ...path, levelDb, capDb: perBand((bandHz) => path.levelDb[bandHz] - levelDb[bandHz]) };
  });
}
