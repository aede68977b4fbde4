import { exceedance } from "../equations/levels/exceedance.ts";
import { insertionLoss } from "../equations/levels/insertion-loss.ts";
import type { Working } from "../equations/working.ts";
import type { Figure } from "../figures/figure-key.ts";
import { figure } from "../figures/figure-key.ts";
import type { Assessment, ItemLevelCache } from "./assess.ts";
import { assess } from "./assess.ts";
import { adoptedIds, computed, effectOf } from "./control-sets.ts";
import type { StatementInputs } from "./inputs.ts";
import type { RuleRef } from "./limit-rules.ts";
import { metricOf, rulesFor } from "./limit-rules.ts";
import type { PeriodLevel } from "./period-level.ts";
import { periodLevel } from "./period-level.ts";
import { windowLevel } from "./window-level.ts";
import type { EarProtection } from "./zones-of.ts";
import { earProtection } from "./zones-of.ts";

/** A period level with the rule and receptor point it belongs to. */
export interface PeriodFigure extends PeriodLevel {
  /** Key of the level's figure. */
  readonly key: string;
  readonly rule: string;
  readonly point: string;
}

export interface StatementFigures {
  readonly figures: readonly Figure[];
  readonly periods: readonly PeriodFigure[];
  readonly earProtection: EarProtection;
  /** Item levels with all adopted controls, for the term tables. */
  readonly assessment: Assessment;
}

/** Levels for the subsets of controls that figures compare. */
interface Subsets {
  readonly all: Assessment;
  readonly none: Assessment;
  readonly without: ReadonlyMap<string, Assessment>;
}

/**
 * All figures of a statement: levels with and without controls, what each control is worth, limits, and zones.
 *
 * @param working  what works the equations out
 * @param inputs   documents of the statement
 */
export function figuresOf(working: Working, inputs: StatementInputs): StatementFigures {
  const cache: ItemLevelCache = new Map();
  const subset = (ids: ReadonlySet<string>) => assess(working, inputs, ids, cache);
  const subsets: Subsets = {
    all: subset(adoptedIds(inputs)),
    none: subset(new Set()),
    without: new Map(computed(inputs).map((control) => [control.id, subset(adoptedIds(inputs, control.id))])),
  };
  const judged = inputs.project.receptors.flatMap((receptor) =>
    receptor.points.flatMap((point) =>
      rulesFor(inputs, receptor).flatMap((ref) =>
        periodFigures(working, inputs, subsets, ref, `${receptor.id}.${point.id}`),
      ),
    ),
  );
  const protection = earProtection(working, inputs, subsets.all);
  return {
    figures: [
      ...judged.flatMap(({ figures }) => figures),
      ...windowFigures(working, inputs, subsets),
      ...zoneFigures(protection),
    ],
    periods: judged.map(({ period }) => period),
    earProtection: protection,
    assessment: subsets.all,
  };
}

function periodFigures(working: Working, inputs: StatementInputs, subsets: Subsets, ref: RuleRef, point: string) {
  const level = (assessment: Assessment) => periodLevel(working, inputs, assessment, ref, point);
  const all = level(subsets.all);
  const none = level(subsets.none);
  if (!all || !none) return [];
  const parts = { metric: metricOf(ref.rule), subject: point, period: ref.id, scope: "phase" };
  const limitDb = ref.rule.valueDb;
  const levelFigure = figure({ quantity: "level", ...parts, controls: "all" }, all.levelDba, "dB(A)");
  const worth = (quantity: string, controls: string, withoutDb: number) =>
    figure(
      { quantity, ...parts, controls },
      working.work(insertionLoss, { withoutDb, withDb: all.levelDba }, quantity),
      "dB",
    );
  const controls = computed(inputs).flatMap((control) => {
    const without = level(subsets.without.get(control.id) as Assessment);
    return without ? [worth(effectOf(control), control.id, without.levelDba)] : [];
  });
  return [
    {
      period: { ...all, key: levelFigure.key, rule: ref.id, point },
      figures: [
        levelFigure,
        figure({ quantity: "level", ...parts, controls: "none" }, none.levelDba, "dB(A)"),
        figure({ quantity: "limit", ...parts, controls: "all" }, limitDb, "dB(A)"),
        figure(
          { quantity: "exceedance", ...parts, controls: "all" },
          working.work(exceedance, { levelDb: all.levelDba, limitDb }, "exceedance"),
          "dB",
        ),
        worth("total-reduction", "all", none.levelDba),
        ...controls,
      ],
    },
  ];
}

/** Levels of each activity over its own window at every receptor point, and what each control is worth there. */
function windowFigures(working: Working, inputs: StatementInputs, subsets: Subsets): readonly Figure[] {
  return subsets.all.scene.points.flatMap(({ id: subject }) =>
    subsets.all.scene.activities.flatMap(({ id: scope }) => {
      const level = (assessment: Assessment) => windowLevel(working, assessment, scope, subject);
      const parts = { metric: "LAeq", subject, period: "window", scope };
      const withDb = level(subsets.all);
      const withoutAny = level(subsets.none);
      const worth = (quantity: string, controls: string, withoutDb: number) =>
        figure({ quantity, ...parts, controls }, working.work(insertionLoss, { withoutDb, withDb }, quantity), "dB");
      return [
        figure({ quantity: "level", ...parts, controls: "all" }, withDb, "dB(A)"),
        figure({ quantity: "level", ...parts, controls: "none" }, withoutAny, "dB(A)"),
        worth("total-reduction", "all", withoutAny),
        ...computed(inputs).map((control) =>
          worth(effectOf(control), control.id, level(subsets.without.get(control.id) as Assessment)),
        ),
      ];
    }),
  );
}

function zoneFigures(protection: EarProtection): readonly Figure[] {
  const parts = { metric: "LAeq", period: "shift", controls: "all" };
  return [
    figure({ quantity: "zone-edge", ...parts, subject: "site", scope: "phase" }, protection.edgeDba, "dB(A)"),
    ...protection.zones.flatMap(({ activity: scope, item: subject, zone, besideDba }) => [
      figure({ quantity: "beside-level", ...parts, subject, scope }, besideDba, "dB(A)"),
      ...(zone.kind === "distance"
        ? [figure({ quantity: "zone-distance", ...parts, subject, scope }, zone.distanceM, "m")]
        : []),
    ]),
  ];
}
