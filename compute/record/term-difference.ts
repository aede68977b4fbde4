import type { Bands } from "../acoustics/bands.ts";
import { inOrder } from "../acoustics/bands.ts";
import type { PathTerms } from "../acoustics/path-terms.ts";
import type { Revision, SealedFigure, SealedPath, SealedTerms } from "../documents/types/revision.gen.ts";
import { resolvedPath } from "../figures/resolved-path.ts";
import type { ItemLevel } from "../statement/assess.ts";
import type { Recomputed } from "./recompute.ts";

/** A stored term that has no fellow in what was worked out again, or the other way round, counts as this far away [dB]. */
const MISSING_DB = 1000;

/**
 * Largest difference between terms worked out again and the stored term tables that a figure rests on.
 *
 * @returns difference [dB], 0 for figures that rest on no term table
 */
export function termDifferenceDb(
  revision: Revision,
  figure: SealedFigure,
  { assessment, activities }: Recomputed,
): number {
  if (!assessment) return 0;
  const differences = activities.flatMap((activity) =>
    assessment.itemLevels(activity, figure.subject).map((level) => {
      const stored = revision.terms.find(
        (terms) => terms.activity === activity && terms.item === level.item.id && terms.point === figure.subject,
      );
      return stored ? tableDifferenceDb(stored, level) : MISSING_DB;
    }),
  );
  return Math.max(0, ...differences);
}

function tableDifferenceDb(stored: SealedTerms, { item, propagation, levelDba, metDb }: ItemLevel): number {
  const { paths } = propagation;
  if (paths.length !== stored.paths.length) return MISSING_DB;
  return Math.max(
    listDifferenceDb(stored.powerDb, item.source.powerDb),
    listDifferenceDb(stored.controlLossDb, item.source.controlLossDb),
    Math.abs(stored.metDb / 1000 - metDb),
    Math.abs(stored.levelDba / 1000 - levelDba),
    ...paths.map((path, index) => pathDifferenceDb(stored, stored.paths[index], path)),
  );
}

function pathDifferenceDb(stored: SealedTerms, kept: SealedPath | undefined, path: PathTerms): number {
  if (!kept || kept.kind !== path.kind || kept.past.join() !== path.past.join()) return MISSING_DB;
  const resolved = resolvedPath(stored, kept);
  return Math.max(
    Math.abs(resolved.divergenceDb / 1000 - path.divergenceDb),
    Math.abs(resolved.directivityDb / 1000 - path.directivityDb),
    listDifferenceDb(resolved.airDb, path.airDb),
    listDifferenceDb(resolved.groundDb, path.groundDb),
    listDifferenceDb(resolved.reflectionDb, path.reflectionDb),
    listDifferenceDb(resolved.screenDb, path.screenDb),
    listDifferenceDb(resolved.capDb, path.capDb),
    listDifferenceDb(resolved.levelDb, path.levelDb),
  );
}

function listDifferenceDb(stored: readonly number[], worked: Bands): number {
  const values = inOrder(worked);
  return Math.max(
    ...values.map((value, index) => Math.abs((stored[index] ?? Number.POSITIVE_INFINITY) / 1000 - value)),
  );
}
