import type { Entry } from "./content.ts";
import type { DocumentSet } from "./document-set.ts";
import { type Reference, references } from "./references.ts";

/** A place that names a sheet, and the sheet, if its shape is right. */
export interface UsedSheet {
  readonly reference: Reference;
  readonly entry: Entry<{ readonly invented: boolean }>;
}

/** All sheets that projects use, with those whose octave shape they borrow. */
export function usedSheets(set: DocumentSet): readonly UsedSheet[] {
  return references(set).flatMap((reference) => {
    const entry = set[reference.kind].valid.get(reference.id);
    return entry ? [{ reference, entry }, ...lender(set, reference)] : [];
  });
}

function lender(set: DocumentSet, reference: Reference): UsedSheet[] {
  const emission = reference.kind === "plant" ? set.plant.valid.get(reference.id)?.sheet.emission : undefined;
  const shapeFrom = emission?.kind === "single" ? emission.shapeFrom : undefined;
  const entry = shapeFrom === undefined ? undefined : set.plant.valid.get(shapeFrom);
  return entry ? [{ reference, entry }] : [];
}
