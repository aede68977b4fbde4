import type { SealedFigure } from "../documents/types/revision.gen.ts";
import { exceedance } from "../equations/levels/exceedance.ts";
import { insertionLoss } from "../equations/levels/insertion-loss.ts";
import type { Working } from "../equations/working.ts";
import type { Assessment } from "../statement/assess.ts";
import { assess } from "../statement/assess.ts";
import { adoptedIds } from "../statement/control-sets.ts";
import type { StatementInputs } from "../statement/inputs.ts";
import type { RuleRef } from "../statement/limit-rules.ts";
import { limitRules } from "../statement/limit-rules.ts";
import { periodLevel } from "../statement/period-level.ts";
import { windowLevel } from "../statement/window-level.ts";
import { earProtection } from "../statement/zones-of.ts";

/** A figure worked out again. */
export interface Recomputed {
  readonly value: number;
  /** Activities whose plant has a part in it. */
  readonly activities: readonly string[];
  /** Loudest day by set of controls, for figures that are judged by the day. */
  readonly days: ReadonlyMap<string, string>;
  /** Item levels with all adopted controls, where the figure rests on them. */
  readonly assessment: Assessment | undefined;
}

interface Level {
  readonly set: string;
  readonly levelDba: number;
  readonly date?: string;
  readonly activities: readonly string[];
  readonly assessment: Assessment;
}

/**
 * Works one figure out from its documents.
 *
 * @param working  what works the equations out; steps stand under `set:all`, `set:none` or `set:without-<control>`
 * @param inputs   documents of the revision
 * @param figure   whose parts say what it is
 */
export function recompute(working: Working, inputs: StatementInputs, figure: SealedFigure): Recomputed {
  switch (figure.quantity) {
    case "zone-edge":
    case "beside-level":
    case "zone-distance":
      return zoneFigure(working, inputs, figure);
    case "limit":
      return { value: ruleOf(inputs, figure).rule.valueDb, activities: [], days: new Map(), assessment: undefined };
    case "level":
      return fromLevels(
        [levelOf(working, inputs, figure, figure.controls)],
        ([level]) => level?.levelDba ?? Number.NaN,
      );
    case "exceedance": {
      const limitDb = ruleOf(inputs, figure).rule.valueDb;
      return fromLevels([levelOf(working, inputs, figure, "all")], ([level]) =>
        working.work(exceedance, { levelDb: level?.levelDba ?? Number.NaN, limitDb }, "exceedance"),
      );
    }
    default: {
      const set = figure.controls === "all" ? "none" : `without-${figure.controls}`;
      const levels = [levelOf(working, inputs, figure, "all"), levelOf(working, inputs, figure, set)];
      return fromLevels(levels, ([withAll, without]) =>
        working.work(
          insertionLoss,
          { withoutDb: without?.levelDba ?? Number.NaN, withDb: withAll?.levelDba ?? Number.NaN },
          figure.quantity,
        ),
      );
    }
  }
}

function fromLevels(levels: readonly Level[], value: (levels: readonly Level[]) => number): Recomputed {
  return {
    value: value(levels),
    activities: [...new Set(levels.flatMap((level) => level.activities))],
    days: new Map(levels.flatMap(({ set, date }) => (date === undefined ? [] : [[set, date] as const]))),
    assessment: levels.find(({ set }) => set === "all")?.assessment,
  };
}

function levelOf(working: Working, inputs: StatementInputs, figure: SealedFigure, set: string): Level {
  const here = working.at(`set:${set}`);
  const assessment = assess(here, inputs, controlsOf(inputs, set));
  if (figure.period === "window") {
    const levelDba = windowLevel(here, assessment, figure.scope, figure.subject);
    return { set, levelDba, activities: [figure.scope], assessment };
  }
  const period = periodLevel(here, inputs, assessment, ruleOf(inputs, figure), figure.subject);
  if (!period) throw new Error(`${figure.key}: no work falls into the period`);
  return {
    set,
    levelDba: period.levelDba,
    date: period.date,
    activities: period.activities.map(({ id }) => id),
    assessment,
  };
}

function controlsOf(inputs: StatementInputs, set: string): ReadonlySet<string> {
  if (set === "none") return new Set();
  return set === "all" ? adoptedIds(inputs) : adoptedIds(inputs, set.slice("without-".length));
}

function ruleOf(inputs: StatementInputs, figure: SealedFigure): RuleRef {
  const ref = limitRules(inputs).find(({ id }) => id === figure.period);
  if (!ref) throw new Error(`${figure.key}: there is no limit rule "${figure.period}"`);
  return ref;
}

function zoneFigure(working: Working, inputs: StatementInputs, figure: SealedFigure): Recomputed {
  const protection = earProtection(working, inputs, assess(working, inputs, adoptedIds(inputs)));
  const zone = protection.zones.find(({ activity, item }) => activity === figure.scope && item === figure.subject);
  const distanceM = zone?.zone.kind === "distance" ? zone.zone.distanceM : Number.NaN;
  const values = {
    "zone-edge": protection.edgeDba,
    "beside-level": zone?.besideDba ?? Number.NaN,
    "zone-distance": distanceM,
  };
  const activities = inputs.statement.activities.map(({ id }) => id);
  return { value: values[figure.quantity as keyof typeof values], activities, days: new Map(), assessment: undefined };
}
