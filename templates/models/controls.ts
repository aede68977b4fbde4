import type { Control, ScreenControl } from "../../compute/documents/types/statement.gen.ts";
import { decimals, tenthDb } from "../../compute/figures/display.ts";
import { lineLengthM } from "../../compute/geometry/place.ts";
import { totalM2 } from "../../compute/geometry/surface.ts";
import { effectOf } from "../../compute/statement/control-sets.ts";
import { metricOf } from "../../compute/statement/limit-rules.ts";
import { dateText, listText } from "./dates.ts";
import type { RevisionView } from "./revision-view.ts";
import { pointName, ruleOf } from "./revision-view.ts";
import type { Words } from "./words.ts";

/** Every control of a statement: what it is, its state, who sees to it, what it is worth where and when. */
export function controlsPart(view: RevisionView) {
  return view.statement.controls.map((control) => ({
    id: control.id,
    name: view.text(control.name),
    kind: view.words.say(`statement.control-${control.kind}`),
    what: controlText(view, control),
    state: stateText(view, control),
    by: view.words.say("statement.control-by", {
      by: view.text(control.by),
      due: dateText(view.words, control.due),
      checkedBy: view.text(control.checkedBy),
    }),
    effect: effectPart(view, control),
  }));
}

function controlText(view: RevisionView, control: Control): string {
  const { words, text } = view;
  const sheetName = (sheets: Readonly<Record<string, { name: unknown }>>, id: string) =>
    text((sheets[id]?.name ?? {}) as Readonly<Record<string, unknown>>);
  switch (control.kind) {
    case "screen":
      return words.say("statement.screen-what", {
        height: decimals(control.heightM, 1),
        length: decimals(lineLengthM(control.line), 0),
        panel: sheetName(view.revision.inputs.panels, control.panel),
        deduction: decimals(control.siteBuildDeductionDb, 0),
        gaps: gapsText(words, control),
        facing:
          control.facing.kind === "reflective"
            ? words.say("statement.facing-reflective")
            : words.say("statement.facing-absorptive", {
                sheet: sheetName(view.revision.inputs.linings, control.facing.sheet),
              }),
      });
    case "bund":
      return words.say("statement.bund-what", {
        height: decimals(control.heightM, 1),
        length: decimals(lineLengthM(control.line), 0),
      });
    case "enclosure":
      return words.say(control.namedClosedOnNotice ? "statement.enclosure-named" : "statement.enclosure-what", {
        panels: control.faces.map((face) => sheetName(view.revision.inputs.panels, face.panel)).join(", "),
        deduction: decimals(control.siteBuildDeductionDb, 0),
      });
    case "quieter-plant":
      return words.say("statement.quieter-what", { other: sheetName(view.revision.inputs.plant, control.insteadOf) });
    case "running-time":
      return words.say("statement.running-what", { pct: decimals(control.insteadOfPct, 0) });
    case "practice":
      return text(control.measure);
  }
}

function gapsText(words: Words, screen: ScreenControl): string {
  if (screen.gaps.length === 0) return words.say("statement.screen-no-gaps");
  return words.say("statement.screen-gaps", { area: decimals(totalM2(screen.gaps), 1) });
}

function stateText(view: RevisionView, control: Control): string {
  return control.state.kind === "rejected"
    ? view.words.say("statement.state-rejected", { reason: view.text(control.state.reason) })
    : view.words.say(`statement.state-${control.state.kind}`);
}

/** What an adopted control is worth: a row per receptor point, a column per limit that work falls under. */
function effectPart(view: RevisionView, control: Control) {
  if (control.state.kind !== "adopted" || control.kind === "practice") {
    return { kind: "none", text: view.words.say("statement.effect-none") };
  }
  const quantity = effectOf(control);
  const rules = [...new Set(view.revision.periods.map(({ rule }) => rule))];
  const points = [...new Set(view.revision.periods.map(({ point }) => point))];
  return {
    kind: "worth",
    caption: view.words.say(`statement.effect-${quantity}`),
    rules: rules.map((rule) => ruleHead(view, rule)),
    rows: points.map((point) => ({
      point: pointName(view, point),
      cells: rules.map((rule) => effectCell(view, quantity, point, rule, control.id)),
    })),
  };
}

/** Period, averaging and uses of a limit: what tells its column from the others. */
function ruleHead(view: RevisionView, ruleId: string): string {
  const { rule } = ruleOf(view, ruleId);
  const { words } = view;
  const uses = listText(
    words,
    rule.uses.map((use) => words.say(`uses.${use}`)),
  );
  const period = view.text(rule.period.name);
  return rule.averaging.kind === "worst"
    ? words.say("statement.effect-head-worst", { period, uses, minutes: rule.averaging.minutes })
    : words.say("statement.effect-head", { period, uses });
}

type EffectCell = { readonly kind: "value"; readonly key: string; readonly db: string } | { readonly kind: "none" };

function effectCell(view: RevisionView, quantity: string, point: string, ruleId: string, control: string): EffectCell {
  const key = [quantity, metricOf(ruleOf(view, ruleId).rule), point, ruleId, "phase", control].join("/");
  const found = view.revision.figures.find((figure) => figure.key === key);
  return found ? { kind: "value", key, db: tenthDb(found.value) } : { kind: "none" };
}
