import type { LimitRule } from "../documents/types/limit-set.gen.ts";
import type { Receptor } from "../documents/types/project.gen.ts";
import type { StatementInputs } from "./inputs.ts";
import { entry } from "./inputs.ts";

/** A rule of a limit set that a project names, with the id that stands for both. */
export interface RuleRef {
  /** `<limit set>.<rule>` */
  readonly id: string;
  readonly limitSet: string;
  readonly rule: LimitRule;
}

/** All rules of the limit sets a project names, in their order. */
export function limitRules(inputs: StatementInputs): readonly RuleRef[] {
  return inputs.project.limitSets.flatMap((limitSet) =>
    entry(inputs.limits, limitSet, "limit set").rules.map((rule) => ({ id: `${limitSet}.${rule.id}`, limitSet, rule })),
  );
}

/** The rules that hold for a receptor's use. */
export function rulesFor(inputs: StatementInputs, receptor: Receptor): readonly RuleRef[] {
  return limitRules(inputs).filter(({ rule }) => rule.uses.includes(receptor.use));
}

/** Metric of a rule as it stands in figure keys: `LAeq` over the whole period or `LAeq-15min`. */
export function metricOf(rule: LimitRule): string {
  return rule.averaging.kind === "worst" ? `LAeq-${rule.averaging.minutes}min` : "LAeq";
}
