import { aWeightedSum } from "../equations/levels/a-weighted-sum.ts";
import { powerOfPressure } from "../equations/levels/power-of-pressure.ts";
import { shapeShift } from "../equations/levels/shape-shift.ts";
import { sumLevels } from "../equations/levels/sum-levels.ts";
import type { Working } from "../equations/working.ts";
import type { BandHz, Bands } from "./bands.ts";
import { A_WEIGHTS_DB, BANDS_HZ, inOrder, perBand } from "./bands.ts";

/** An emission level as sound power is made from it. */
export interface Emission {
  readonly level:
    | { readonly kind: "single"; readonly valueDba: number; readonly shapeDb: Bands }
    | { readonly kind: "octave"; readonly weighting: "Z" | "A"; readonly bandsDb: Bands }
    | { readonly kind: "third-octave"; readonly thirdsDb: Readonly<Record<BandHz, readonly [number, number, number]>> };
  readonly quantity:
    | { readonly kind: "sound-power" }
    /** Directivity factor 2 over hard ground, 1 without ground. */
    | { readonly kind: "pressure-at-distance"; readonly distanceM: number; readonly directivityFactor: 1 | 2 };
}

/**
 * Sound power of a source per octave band, from the kind of level its data sheet holds.
 *
 * @param working   what works the equations out
 * @param emission  level while running; a single A-weighted level with the octave shape it borrows
 * @returns         sound power per band [dB re 1 pW], unweighted, unrounded
 * @throws {InputError} if a level or distance lies outside the equations' range
 */
export function soundPower(working: Working, emission: Emission): Bands {
  const bandsDb = unweighted(working, emission.level);
  const { quantity } = emission;
  if (quantity.kind === "sound-power") return bandsDb;
  return perBand((bandHz) =>
    working
      .at(`band:${bandHz}`)
      .work(
        powerOfPressure,
        { levelDb: bandsDb[bandHz], distanceM: quantity.distanceM, directivityFactor: quantity.directivityFactor },
        "power-of-pressure",
      ),
  );
}

function unweighted(working: Working, level: Emission["level"]): Bands {
  switch (level.kind) {
    case "octave":
      return perBand((bandHz) => level.bandsDb[bandHz] - weightDb(level.weighting, bandHz));
    case "third-octave":
      return perBand((bandHz) =>
        working.at(`band:${bandHz}`).work(sumLevels, { levelsDb: level.thirdsDb[bandHz] }, "octave-of-thirds"),
      );
    case "single":
      return shaped(working, level.valueDba, level.shapeDb);
  }
}

function weightDb(weighting: "Z" | "A", bandHz: BandHz): number {
  return weighting === "A" ? A_WEIGHTS_DB[bandHz] : 0;
}

function shaped(working: Working, valueDba: number, shapeDb: Bands): Bands {
  const shapeTotalDba = working.work(
    aWeightedSum,
    { levelsDb: inOrder(shapeDb), weightsDb: inOrder(A_WEIGHTS_DB) },
    "shape-total",
  );
  return perBand((bandHz) =>
    working
      .at(`band:${bandHz}`)
      .work(shapeShift, { shapeDb: shapeDb[bandHz], shapeTotalDba, levelDba: valueDba }, "borrowed-shape"),
  );
}

/** A-weighted total of a spectrum [dB(A)] with the printed weights. */
export function aWeighted(working: Working, levelDb: Bands, term: string): number {
  return working.work(
    aWeightedSum,
    { levelsDb: BANDS_HZ.map((bandHz) => levelDb[bandHz]), weightsDb: inOrder(A_WEIGHTS_DB) },
    term,
  );
}
