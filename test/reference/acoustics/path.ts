import { equations } from "../../../compute/equations/registry.ts";
import { BANDS, exactMidband, PRINTED_A } from "../midbands.ts";

/** One source, one receptor, flat ground: the equations put together as ISO 9613-2 does. Works out reference scenes only. */
export interface Scene {
  readonly powerDb: number;
  readonly planDistanceM: number;
  readonly sourceHeightM: number;
  readonly receptorHeightM: number;
  readonly ground: number;
  readonly temperatureC: number;
  readonly humidityPct: number;
}

export function distanceOf(scene: Scene): number {
  return Math.hypot(scene.planDistanceM, scene.sourceHeightM - scene.receptorHeightM);
}

export function groundOf(scene: Scene, bandHz: number): number {
  const { planDistanceM, sourceHeightM, receptorHeightM, ground } = scene;
  const path = { planDistanceM, sourceHeightM, receptorHeightM };
  return equations["ground-effect"].of({
    bandHz,
    ...path,
    groundSource: ground,
    groundMiddle: ground,
    groundReceptor: ground,
  });
}

/** Octave band levels at the receptor for a screen term per band. */
export function bandLevels(scene: Scene, screenDb: (bandHz: number) => number): readonly number[] {
  const { temperatureC, humidityPct, powerDb } = scene;
  const distanceM = distanceOf(scene);
  return BANDS.map((bandHz) => {
    const climate = { temperatureC, humidityPct, pressureKpa: 101.325 };
    const absorptionDbKm = equations["air-absorption"].of({ frequencyHz: exactMidband(bandHz), ...climate });
    return equations["octave-level"].of({
      powerDb,
      controlLossDb: 0,
      directivityDb: 0,
      divergenceDb: equations.divergence.of({ distanceM }),
      airDb: equations["air-attenuation"].of({ absorptionDbKm, distanceM }),
      groundDb: groundOf(scene, bandHz),
      screenDb: screenDb(bandHz),
    });
  });
}

export function levelA(levelsDb: readonly number[]): number {
  return equations["a-weighted-sum"].of({ levelsDb, weightsDb: PRINTED_A });
}
