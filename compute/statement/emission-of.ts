import type { BandHz, Bands } from "../acoustics/bands.ts";
import { A_WEIGHTS_DB, BANDS_HZ, perBand } from "../acoustics/bands.ts";
import type { Emission } from "../acoustics/sound-power.ts";
import type { Level, LevelQuantity, SingleLevel, ThirdOctaveLevel } from "../documents/types/common.gen.ts";
import { InputError } from "../equations/input-error.ts";
import type { StatementInputs } from "./inputs.ts";
import { entry } from "./inputs.ts";

/** Third-octave bands that make up each octave [Hz]. */
const THIRDS_HZ: Readonly<Record<BandHz, readonly [number, number, number]>> = {
  63: [50, 63, 80],
  125: [100, 125, 160],
  250: [200, 250, 315],
  500: [400, 500, 630],
  1000: [800, 1000, 1250],
  2000: [1600, 2000, 2500],
  4000: [3150, 4000, 5000],
  8000: [6300, 8000, 10000],
};

/** The emission of a plant data sheet in the form sound power is made from. */
export function emissionOf(inputs: StatementInputs, sheetId: string): Emission {
  const level = entry(inputs.plant, sheetId, "plant").emission;
  return { level: levelOf(inputs, level), quantity: quantityOf(level.quantity) };
}

/** A document's record of bands, its keys read as numbers. */
export function bandsOf(record: object): Bands {
  const values = record as Readonly<Record<string, number>>;
  return perBand((bandHz) => values[String(bandHz)] as number);
}

function levelOf(inputs: StatementInputs, level: Level): Emission["level"] {
  switch (level.kind) {
    case "single":
      return { kind: "single", valueDba: level.valueDb, shapeDb: shapeOf(inputs, level) };
    case "octave":
      return { kind: "octave", weighting: weightingOf(level.weighting), bandsDb: bandsOf(level.bandsDb) };
    case "third-octave":
      return { kind: "third-octave", thirdsDb: thirdsOf(level) };
  }
}

function shapeOf(inputs: StatementInputs, level: SingleLevel): Bands {
  const lender = level.shapeFrom === undefined ? undefined : entry(inputs.plant, level.shapeFrom, "plant").emission;
  if (lender?.kind !== "octave") throw new InputError("shapeFrom", level.shapeFrom, "a plant sheet with octave bands");
  const bands = bandsOf(lender.bandsDb);
  return lender.weighting === "A" ? perBand((bandHz) => bands[bandHz] - A_WEIGHTS_DB[bandHz]) : bands;
}

function weightingOf(weighting: string): "Z" | "A" {
  if (weighting === "Z" || weighting === "A") return weighting;
  throw new InputError("weighting", weighting, '"Z" or "A" for the emission of plant');
}

function thirdsOf(level: ThirdOctaveLevel): Readonly<Record<BandHz, readonly [number, number, number]>> {
  if (level.weighting !== "Z") throw new InputError("weighting", level.weighting, '"Z" for third-octave bands');
  const values = level.bandsDb as unknown as Readonly<Record<string, number>>;
  const thirds = BANDS_HZ.map((bandHz) => [bandHz, THIRDS_HZ[bandHz].map((third) => values[String(third)] as number)]);
  return Object.fromEntries(thirds) as Record<BandHz, [number, number, number]>;
}

function quantityOf(quantity: LevelQuantity): Emission["quantity"] {
  if (quantity.kind === "sound-power") return quantity;
  if (quantity.kind === "work-station")
    throw new InputError("quantity", quantity.kind, "sound power or pressure at a distance");
  if (quantity.ground === "hard") return { kind: quantity.kind, distanceM: quantity.distanceM, directivityFactor: 2 };
  if (quantity.ground === "none") return { kind: quantity.kind, distanceM: quantity.distanceM, directivityFactor: 1 };
  throw new InputError("ground", quantity.ground, '"hard" or "none"');
}
