import { angleOfView } from "./code-method/angle-of-view.ts";
import { distanceHard } from "./code-method/distance-hard.ts";
import { distanceSoft } from "./code-method/distance-soft.ts";
import { haulRouteLevel } from "./code-method/haul-route-level.ts";
import { compositeIndex } from "./enclosures/composite-index.ts";
import { enclosureBalance } from "./enclosures/enclosure-balance.ts";
import { enclosureLoss } from "./enclosures/enclosure-loss.ts";
import { massLaw } from "./enclosures/mass-law.ts";
import { meanAbsorption } from "./enclosures/mean-absorption.ts";
import { roomConstant } from "./enclosures/room-constant.ts";
import type { Equation } from "./equation.ts";
import { dailyExposure } from "./hearing/daily-exposure.ts";
import { distanceToLevel } from "./hearing/distance-to-level.ts";
import { equalEnergyTime } from "./hearing/equal-energy-time.ts";
import { exchangeFactor } from "./hearing/exchange-factor.ts";
import { exposurePoints } from "./hearing/exposure-points.ts";
import { permittedTime } from "./hearing/permitted-time.ts";
import { protectionHml } from "./hearing/protection-hml.ts";
import { protectionOctave } from "./hearing/protection-octave.ts";
import { protectionSnr } from "./hearing/protection-snr.ts";
import { signSize } from "./hearing/sign-size.ts";
import { wearingTime } from "./hearing/wearing-time.ts";
import { weeklyExposure } from "./hearing/weekly-exposure.ts";
import { zoneEdgeLevel } from "./hearing/zone-edge-level.ts";
import { zoneLevel } from "./hearing/zone-level.ts";
import { aWeight } from "./levels/a-weight.ts";
import { aWeightedSum } from "./levels/a-weighted-sum.ts";
import { averageLevel } from "./levels/average-level.ts";
import { cWeight } from "./levels/c-weight.ts";
import { exceedance } from "./levels/exceedance.ts";
import { facadeLevel } from "./levels/facade-level.ts";
import { insertionLoss } from "./levels/insertion-loss.ts";
import { intensityOfLevel } from "./levels/intensity-of-level.ts";
import { levelOfIntensity } from "./levels/level-of-intensity.ts";
import { levelOfPressure } from "./levels/level-of-pressure.ts";
import { onTimeCorrection } from "./levels/on-time-correction.ts";
import { periodLevel } from "./levels/period-level.ts";
import { pointSourceLevel } from "./levels/point-source-level.ts";
import { powerOfPressure } from "./levels/power-of-pressure.ts";
import { shapeShift } from "./levels/shape-shift.ts";
import { shareLevel } from "./levels/share-level.ts";
import { subtractLevel } from "./levels/subtract-level.ts";
import { sumLevels } from "./levels/sum-levels.ts";
import { worstShare } from "./levels/worst-share.ts";
import { airAbsorption } from "./propagation/air-absorption.ts";
import { airAttenuation } from "./propagation/air-attenuation.ts";
import { divergence } from "./propagation/divergence.ts";
import { groundEffect } from "./propagation/ground-effect.ts";
import { groundEffectAlternative } from "./propagation/ground-effect-alternative.ts";
import { groundFactor } from "./propagation/ground-factor.ts";
import { metCorrection } from "./propagation/met-correction.ts";
import { metLevel } from "./propagation/met-level.ts";
import { octaveLevel } from "./propagation/octave-level.ts";
import { solidAngleIndex } from "./propagation/solid-angle-index.ts";
import { leastReflector } from "./reflections/least-reflector.ts";
import { reflectedPower } from "./reflections/reflected-power.ts";
import { doubleEdgeFactor } from "./screens/double-edge-factor.ts";
import { edgesCombined } from "./screens/edges-combined.ts";
import { fresnelNumber } from "./screens/fresnel-number.ts";
import { kurzeAnderson } from "./screens/kurze-anderson.ts";
import { pathDifference } from "./screens/path-difference.ts";
import { screenAttenuation } from "./screens/screen-attenuation.ts";
import { screenMetFactor } from "./screens/screen-met-factor.ts";
import { screenOverTop } from "./screens/screen-over-top.ts";
import { screenOverTopLiteral } from "./screens/screen-over-top-literal.ts";
import { throughAndOver } from "./screens/through-and-over.ts";
import { unscreenedLimit } from "./screens/unscreened-limit.ts";
import { levelUncertainty } from "./uncertainty/level-uncertainty.ts";

/** Every equation by its id. Ids are fixed: commands, sealed revisions and pages name them. */
export const equations = {
  "angle-of-view": angleOfView,
  "distance-hard": distanceHard,
  "distance-soft": distanceSoft,
  "haul-route-level": haulRouteLevel,
  "composite-index": compositeIndex,
  "enclosure-balance": enclosureBalance,
  "enclosure-loss": enclosureLoss,
  "mass-law": massLaw,
  "mean-absorption": meanAbsorption,
  "room-constant": roomConstant,
  "daily-exposure": dailyExposure,
  "distance-to-level": distanceToLevel,
  "equal-energy-time": equalEnergyTime,
  "exchange-factor": exchangeFactor,
  "exposure-points": exposurePoints,
  "permitted-time": permittedTime,
  "protection-hml": protectionHml,
  "protection-octave": protectionOctave,
  "protection-snr": protectionSnr,
  "sign-size": signSize,
  "wearing-time": wearingTime,
  "weekly-exposure": weeklyExposure,
  "zone-edge-level": zoneEdgeLevel,
  "zone-level": zoneLevel,
  "a-weight": aWeight,
  "a-weighted-sum": aWeightedSum,
  "average-level": averageLevel,
  "c-weight": cWeight,
  exceedance: exceedance,
  "facade-level": facadeLevel,
  "insertion-loss": insertionLoss,
  "intensity-of-level": intensityOfLevel,
  "level-of-intensity": levelOfIntensity,
  "level-of-pressure": levelOfPressure,
  "on-time-correction": onTimeCorrection,
  "period-level": periodLevel,
  "point-source-level": pointSourceLevel,
  "power-of-pressure": powerOfPressure,
  "shape-shift": shapeShift,
  "share-level": shareLevel,
  "subtract-level": subtractLevel,
  "sum-levels": sumLevels,
  "worst-share": worstShare,
  "air-absorption": airAbsorption,
  "air-attenuation": airAttenuation,
  divergence: divergence,
  "ground-effect-alternative": groundEffectAlternative,
  "ground-effect": groundEffect,
  "ground-factor": groundFactor,
  "met-correction": metCorrection,
  "met-level": metLevel,
  "octave-level": octaveLevel,
  "solid-angle-index": solidAngleIndex,
  "least-reflector": leastReflector,
  "reflected-power": reflectedPower,
  "double-edge-factor": doubleEdgeFactor,
  "edges-combined": edgesCombined,
  "fresnel-number": fresnelNumber,
  "kurze-anderson": kurzeAnderson,
  "path-difference": pathDifference,
  "screen-attenuation": screenAttenuation,
  "screen-met-factor": screenMetFactor,
  "screen-over-top-literal": screenOverTopLiteral,
  "screen-over-top": screenOverTop,
  "through-and-over": throughAndOver,
  "unscreened-limit": unscreenedLimit,
  "level-uncertainty": levelUncertainty,
} as const;

export type EquationId = keyof typeof equations;

export const equationIds = Object.keys(equations) as readonly EquationId[];

/** The equation of an id that comes from a document or the command line, or nothing. */
export function equationOf(id: string): Equation | undefined {
  return Object.hasOwn(equations, id) ? (equations[id as EquationId] as unknown as Equation) : undefined;
}
