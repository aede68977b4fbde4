import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import type { Plant } from "../types/plant.gen.ts";

/** A work-station level is an average at the operator's place, and a peak is one C-weighted peak. */
export const operatorLevels: Rule = (set) =>
  [...set.plant.valid.values()].flatMap(({ sheet, file }) => [
    ...workStation(set, file, sheet),
    ...peak(set, file, sheet),
  ]);

function workStation(set: DocumentSet, file: string, { workStation: level }: Plant): Mistake[] {
  if (!level) return [];
  const found: Mistake[] = [];
  if (level.quantity.kind !== "work-station") {
    const advice = "Enter other levels under emission.";
    found.push(
      mistakeAt(set.texts, file, "/workStation/quantity/kind", '"work-station"', `"${level.quantity.kind}"`, advice),
    );
  }
  if (level.metric !== "LAeq-running" && level.metric !== "LAeq-cycle") {
    const advice = "Exposure is worked out from an average; enter a peak under peak.";
    found.push(
      mistakeAt(set.texts, file, "/workStation/metric", '"LAeq-running" or "LAeq-cycle"', `"${level.metric}"`, advice),
    );
  }
  if (level.weighting === "C" || (level.kind === "single" && level.weighting !== "A")) {
    const expected = level.kind === "single" ? '"A" for a single value' : '"Z" or "A" for bands';
    found.push(
      mistakeAt(set.texts, file, "/workStation/weighting", expected, `"${level.weighting}"`, "Exposure is A-weighted."),
    );
  }
  return found;
}

function peak(set: DocumentSet, file: string, { peak: level }: Plant): Mistake[] {
  if (!level) return [];
  const advice = "Peaks are compared as one C-weighted value.";
  const wrong = [
    ["/peak/kind", "single", level.kind],
    ["/peak/metric", "LCpeak", level.metric],
    ["/peak/weighting", "C", level.weighting],
  ] as const;
  return wrong
    .filter(([, expected, given]) => expected !== given)
    .map(([pointer, expected, given]) => mistakeAt(set.texts, file, pointer, `"${expected}"`, `"${given}"`, advice));
}
