import { compositeIndex } from "../equations/enclosures/composite-index.ts";
import { enclosureBalance } from "../equations/enclosures/enclosure-balance.ts";
import { enclosureLoss } from "../equations/enclosures/enclosure-loss.ts";
import { meanAbsorption } from "../equations/enclosures/mean-absorption.ts";
import type { Working } from "../equations/working.ts";
import type { BandHz, Bands } from "./bands.ts";
import { perBand } from "./bands.ts";

/** A full enclosure as built: what its faces, openings, lining and floor are made of. */
export interface Enclosure {
  readonly faces: readonly { readonly areaM2: number; readonly indexDb: Bands }[];
  /** Openings; with a silencer, its insertion loss stands for the sound reduction index. */
  readonly openings: readonly { readonly areaM2: number; readonly silencerLossDb: Bands | undefined }[];
  readonly lining: { readonly areaM2: number; readonly absorption: Bands };
  readonly unlined: Bands;
  readonly floor: { readonly areaM2: number; readonly absorption: Bands };
  /** Taken off every panel's index for joints made on site [dB]. */
  readonly siteBuildDeductionDb: number;
}

/** Index that stands for a surface that lets nothing through: the floor [dB]. */
const CLOSED_INDEX_DB = 99;

/**
 * Insertion loss of a full enclosure per octave band: the lower of two estimates, never below 0
 * (Bies, Hansen and Howard, 5th edition, eq. (7.103), (7.111); power balance).
 *
 * @param working    what works the equations out
 * @param enclosure  areas [m²], sound reduction indexes [dB], absorption [1]
 * @returns          insertion loss per band [dB], unrounded
 * @throws {InputError} if an area or index lies outside the equations' range
 */
export function enclosureInsertionLoss(working: Working, enclosure: Enclosure): Bands {
  return perBand((bandHz) => bandLoss(working.at(`band:${bandHz}`), enclosure, bandHz));
}

function bandLoss(working: Working, enclosure: Enclosure, bandHz: BandHz): number {
  const { faces, openings, lining, floor } = enclosure;
  const faceAreaM2 = faces.reduce((sum, face) => sum + face.areaM2, 0);
  const linedShare = lining.areaM2 / faceAreaM2;
  const faceAbsorption = linedShare * lining.absorption[bandHz] + (1 - linedShare) * enclosure.unlined[bandHz];
  const faceIndexDb = faces.map((face) => Math.max(0, face.indexDb[bandHz] - enclosure.siteBuildDeductionDb));
  const openingIndexDb = openings.map((opening) => opening.silencerLossDb?.[bandHz] ?? 0);
  const faceAreasM2 = faces.map((face) => face.areaM2);
  const openingAreasM2 = openings.map((opening) => opening.areaM2);
  const shellM2 = [...faceAreasM2, ...openingAreasM2];

  const reductionIndexDb = working.work(
    compositeIndex,
    { areasM2: shellM2, reductionIndexesDb: [...faceIndexDb, ...openingIndexDb] },
    "enclosure-index",
  );
  const inside = insideSurfaces(enclosure, bandHz, faceAreaM2);
  const absorption = working.work(meanAbsorption, inside, "enclosure-absorption");
  const byRoom = working.work(
    enclosureLoss,
    {
      reductionIndexDb,
      externalAreaM2: shellM2.reduce((sum, area) => sum + area, 0),
      internalAreaM2: inside.areasM2.reduce((sum, area) => sum + area, 0),
      absorption,
    },
    "enclosure-by-room",
  );
  const byBalance = working.work(
    enclosureBalance,
    {
      openAreaM2: 0,
      areasM2: [...shellM2, floor.areaM2],
      absorptions: [...faces.map(() => faceAbsorption), ...openings.map(() => 0), floor.absorption[bandHz]],
      reductionIndexesDb: [...faceIndexDb, ...openingIndexDb, CLOSED_INDEX_DB],
    },
    "enclosure-by-balance",
  );
  return Math.max(0, Math.min(byRoom, byBalance));
}

/** What absorbs inside: lining, bare faces and floor; an opening absorbs nothing in this estimate. */
function insideSurfaces(enclosure: Enclosure, bandHz: BandHz, faceAreaM2: number) {
  const { lining, floor, unlined } = enclosure;
  const surfaces = [
    { areaM2: lining.areaM2, absorption: lining.absorption[bandHz] },
    { areaM2: faceAreaM2 - lining.areaM2, absorption: unlined[bandHz] },
    { areaM2: floor.areaM2, absorption: floor.absorption[bandHz] },
  ].filter((surface) => surface.areaM2 > 0);
  return {
    areasM2: surfaces.map((surface) => surface.areaM2),
    absorptions: surfaces.map((surface) => surface.absorption),
  };
}
