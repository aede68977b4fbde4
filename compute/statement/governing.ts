import type { BandHz } from "../acoustics/bands.ts";
import { A_WEIGHTS_DB, BANDS_HZ } from "../acoustics/bands.ts";
import type { PathTerms } from "../acoustics/path-terms.ts";
import type { Step } from "../equations/working.ts";
import { belongsTo, recording, silently } from "../equations/working.ts";
import type { ItemLevel } from "./assess.ts";
import { assess } from "./assess.ts";
import { adoptedIds } from "./control-sets.ts";
import type { PeriodFigure } from "./figures-of.ts";
import type { StatementInputs } from "./inputs.ts";
import { limitRules } from "./limit-rules.ts";
import { periodLevel } from "./period-level.ts";

/** The source, path and band that decide at a receptor point, with every step from its sound power to the judged level. */
export interface Governing {
  readonly point: string;
  readonly rule: string;
  readonly activity: string;
  readonly item: string;
  /** Index of the path in the term table. */
  readonly path: number;
  readonly bandHz: BandHz;
  readonly steps: readonly Step[];
}

/**
 * For each receptor point the governing rule (closest to its limit or farthest over it), and there the source, path and band
 * with the largest part, worked out with a record.
 *
 * @param inputs   documents of the statement
 * @param periods  judged period levels
 */
export function governing(inputs: StatementInputs, periods: readonly PeriodFigure[]): readonly Governing[] {
  const points = [...new Set(periods.map(({ point }) => point))];
  return points.map((point) => {
    const rules = limitRules(inputs);
    const margin = (period: PeriodFigure) =>
      period.levelDba - (rules.find(({ id }) => id === period.rule)?.rule.valueDb ?? 0);
    const closest = periods
      .filter((period) => period.point === point)
      .reduce((kept, next) => (margin(kept) >= margin(next) ? kept : next));
    return governingAt(inputs, closest);
  });
}

function governingAt(inputs: StatementInputs, period: PeriodFigure): Governing {
  const steps: Step[] = [];
  const working = recording(steps);
  const assessment = assess(working, inputs, adoptedIds(inputs));
  const ref = limitRules(inputs).find(({ id }) => id === period.rule);
  if (!ref) throw new Error(`there is no limit rule "${period.rule}"`);
  const { activity, level } = loudestItem(inputs, period);
  assessment.itemLevels(activity, period.point);
  periodLevel(working, inputs, assessment, ref, period.point);
  const { path, bandHz } = loudestPath(level);
  const governs = level.propagation.paths[path] as PathTerms;
  const { line, name } = governs;
  const subject = { activity, item: level.item.id, line, path: name, band: String(bandHz), day: period.date };
  const kept = steps.filter((step) => belongsTo(step, subject) && isPassed(step, governs));
  return { point: period.point, rule: period.rule, activity, item: level.item.id, path, bandHz, steps: kept };
}

/** The sound reduction of a screen belongs to the chain only where the path goes through it. */
function isPassed(step: Step, { kind, past }: PathTerms): boolean {
  return step.term !== "screen-index" || (kind === "through" && step.at.includes(`control:${past[0]}`));
}

/** The item with the largest part in a period level, each at the share of time that counted in it. */
function loudestItem(inputs: StatementInputs, period: PeriodFigure): { activity: string; level: ItemLevel } {
  const assessment = assess(silently, inputs, adoptedIds(inputs));
  const loudest = period.activities
    .flatMap(({ id, shares }) => shares.map((share) => ({ activity: id, ...share })))
    .reduce((kept, next) => (kept.levelDba >= next.levelDba ? kept : next));
  const level = assessment.itemLevels(loudest.activity, period.point).find(({ item }) => item.id === loudest.item);
  if (!level) throw new Error(`"${loudest.item}" is not part of "${loudest.activity}"`);
  return { activity: loudest.activity, level };
}

function loudestPath({ propagation }: ItemLevel): { path: number; bandHz: BandHz } {
  const parts = propagation.paths.flatMap((terms, path) =>
    BANDS_HZ.map((bandHz) => ({ path, bandHz, partDb: terms.levelDb[bandHz] + A_WEIGHTS_DB[bandHz] })),
  );
  return parts.reduce((kept, next) => (kept.partDb >= next.partDb ? kept : next));
}
