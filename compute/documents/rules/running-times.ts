import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { plantItems } from "../plant-items.ts";
import { type PlacedStatement, statementsOf } from "../statements-of.ts";
import type { PlantItem, QuieterPlantControl, RunningTimeControl } from "../types/statement.gen.ts";

type Words = readonly [field: string, expected: string, received: string, advice: string];

const CYCLE_ADVICE =
  "The level already holds the stops of the cycle: write 100, or use a sheet with the level while running.";

/** On-time is not taken off twice, and a control shortens it. */
export const runningTimes: Rule = (set) =>
  statementsOf(set).flatMap((placed) => [...onTimes(set, placed), ...controls(set, placed)]);

function holdsCycle(set: DocumentSet, sheet: string): boolean {
  return set.plant.valid.get(sheet)?.sheet.emission.metric === "LAeq-cycle";
}

function onTimes(set: DocumentSet, { file, statement }: PlacedStatement): Mistake[] {
  return plantItems(statement).flatMap(({ item, pointer }) => {
    if (item.onTimePct === 100 || !holdsCycle(set, item.sheet)) return [];
    const expected = `100 % on "${item.sheet}", whose level holds the work cycle`;
    return [mistakeAt(set.texts, file, `${pointer}/onTimePct`, expected, `${item.onTimePct} %`, CYCLE_ADVICE)];
  });
}

function controls(set: DocumentSet, { file, statement }: PlacedStatement): Mistake[] {
  const items = new Map(plantItems(statement).map(({ item }) => [item.id, item]));
  return statement.controls.flatMap((control, index) => {
    if (control.kind !== "running-time" && control.kind !== "quieter-plant") return [];
    return control.appliesTo.flatMap((id, position) => {
      const item = items.get(id);
      if (!item) return [];
      const words =
        control.kind === "running-time" ? shorter(set, control, item, position) : quieter(set, control, item);
      return words.map(([field, ...rest]) => mistakeAt(set.texts, file, `/controls/${index}/${field}`, ...rest));
    });
  });
}

function quieter(set: DocumentSet, { insteadOf }: QuieterPlantControl, item: PlantItem): Words[] {
  if (insteadOf === item.sheet) {
    const advice = "Name the plant that would run without this control.";
    return [["insteadOf", `a sheet other than that of "${item.id}"`, `"${insteadOf}"`, advice]];
  }
  if (item.onTimePct === 100 || !holdsCycle(set, insteadOf)) return [];
  const expected = `a sheet with the level while running, as "${item.id}" runs ${item.onTimePct} % of the time`;
  const advice = "Use another sheet for what would run without this control.";
  return [["insteadOf", expected, `"${insteadOf}", whose level holds the work cycle`, advice]];
}

function shorter(set: DocumentSet, { insteadOfPct }: RunningTimeControl, item: PlantItem, position: number): Words[] {
  if (holdsCycle(set, item.sheet)) {
    const received = `"${item.id}", whose level holds the work cycle`;
    const advice = "Use a sheet with the level while running.";
    return [[`appliesTo/${position}`, "an item with a level while running", received, advice]];
  }
  if (insteadOfPct > item.onTimePct) return [];
  const expected = `more than the ${item.onTimePct} % that "${item.id}" runs with this control`;
  return [["insteadOfPct", expected, `${insteadOfPct} %`, "Enter the on-time there would be without this control."]];
}
