import type { Revision, SealedFigure } from "../documents/types/revision.gen.ts";
import type { Step } from "../equations/working.ts";
import { belongsTo, recording } from "../equations/working.ts";
import type { DocumentUse } from "./documents-used.ts";
import { documentsUsed } from "./documents-used.ts";
import type { Recomputed } from "./recompute.ts";
import { recompute } from "./recompute.ts";
import { termDifferenceDb } from "./term-difference.ts";

/** The whole chain of one figure, from documents to value. */
export interface Explanation {
  readonly figure: SealedFigure;
  /** The value as worked out again, unrounded. */
  readonly value: number;
  /** Every equation on the way, in order. */
  readonly steps: readonly Step[];
  readonly documents: readonly DocumentUse[];
  /** Largest difference between the terms worked out again and the stored ones [dB]; rounding alone gives up to 0.0005. */
  readonly termDifferenceDb: number;
}

/**
 * Works one figure of a revision out again, with a record of every step.
 *
 * @param revision  a sealed revision
 * @param key       key of one of its figures
 * @returns         the chain; nothing if the revision has no such figure
 */
export function explain(revision: Revision, key: string): Explanation | undefined {
  const figure = revision.figures.find((each) => each.key === key);
  if (!figure) return undefined;
  const steps: Step[] = [];
  const recomputed = recompute(recording(steps), revision.inputs, figure);
  return {
    figure,
    value: recomputed.value,
    steps: steps.filter((step) => isPart(step, recomputed)),
    documents: documentsUsed(revision.inputs, figure, recomputed.activities),
    termDifferenceDb: termDifferenceDb(revision, figure, recomputed),
  };
}

/** Steps of days that are not the loudest, and of activities that do not work then, are not part of the figure. */
function isPart(step: Step, { days, activities }: Recomputed): boolean {
  const set = step.at.find((place) => place.startsWith("set:"))?.slice("set:".length) ?? "";
  const day = days.get(set);
  const activity = step.at.find((place) => place.startsWith("activity:"))?.slice("activity:".length);
  return (day === undefined || belongsTo(step, { day })) && (activity === undefined || activities.includes(activity));
}
