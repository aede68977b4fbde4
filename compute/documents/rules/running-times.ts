import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { plantItems } from "../plant-items.ts";
import { type PlacedStatement, statementsOf } from "../statements-of.ts";

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
    const found: Mistake[] = [];
    const add = (field: string, expected: string, received: string, advice: string) =>
      found.push(mistakeAt(set.texts, file, `/controls/${index}/${field}`, expected, received, advice));
    for (const [position, id] of control.appliesTo.entries()) {
      const item = items.get(id);
      if (!item) continue;
      if (control.kind === "quieter-plant") {
        if (control.insteadOf === item.sheet) {
          add(
            "insteadOf",
            `a sheet other than that of "${id}"`,
            `"${control.insteadOf}"`,
            "Name the plant that would run without this control.",
          );
        } else if (item.onTimePct < 100 && holdsCycle(set, control.insteadOf)) {
          add(
            "insteadOf",
            `a sheet with the level while running, as "${id}" runs ${item.onTimePct} % of the time`,
            `"${control.insteadOf}", whose level holds the work cycle`,
            "Use another sheet for what would run without this control.",
          );
        }
      } else if (holdsCycle(set, item.sheet)) {
        add(
          `appliesTo/${position}`,
          "an item with a level while running",
          `"${id}", whose level holds the work cycle`,
          "Use a sheet with the level while running.",
        );
      } else if (control.insteadOfPct <= item.onTimePct) {
        add(
          "insteadOfPct",
          `more than the ${item.onTimePct} % that "${id}" runs with this control`,
          `${control.insteadOfPct} %`,
          "Enter the on-time there would be without this control.",
        );
      }
    }
    return found;
  });
}
