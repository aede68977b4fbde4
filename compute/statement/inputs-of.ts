import type { Content, Entry, ProjectEntry } from "../documents/content.ts";
import type { Control } from "../documents/types/statement.gen.ts";
import type { StatementInputs } from "./inputs.ts";
import { entry } from "./inputs.ts";

/**
 * The documents one statement rests on, and no others: a change elsewhere leaves its seal alone.
 *
 * @param content  all valid documents
 * @param project  the project
 * @param phase    id of the phase
 */
export function inputsOf(content: Content, project: ProjectEntry, phase: string): StatementInputs {
  const { statement } = entry(Object.fromEntries(project.statements), phase, "phase");
  const { controls, activities } = statement;
  const plant = plantUsed(content, [
    ...activities.flatMap((activity) => activity.plant.map((item) => item.sheet)),
    ...controls.flatMap((control) => (control.kind === "quieter-plant" ? [control.insteadOf] : [])),
  ]);
  const enclosures = controls.filter((control) => control.kind === "enclosure");
  return {
    project: project.project,
    statement,
    phases: Object.fromEntries(
      [...project.statements].map(([id, { statement: other }]) => [id, { from: other.from, until: other.until }]),
    ),
    plant: pick(content.plant, plant),
    panels: pick(content.panels, controls.flatMap(panelsUsed)),
    linings: pick(content.linings, controls.flatMap(liningsUsed)),
    silencers: pick(
      content.silencers,
      enclosures.flatMap(({ openings }) => openings.flatMap((opening) => opening.silencer ?? [])),
    ),
    limits: pick(content.limits, project.project.limitSets),
    duties: pick(content.duties, [project.project.dutySet]),
  };
}

/** Sheets used and those they borrow their octave shape from. */
function plantUsed(content: Content, used: readonly string[]): readonly string[] {
  const borrowed = used.flatMap((id) => {
    const emission = content.plant.get(id)?.sheet.emission;
    return emission?.kind === "single" && emission.shapeFrom !== undefined ? [emission.shapeFrom] : [];
  });
  return [...used, ...borrowed];
}

function panelsUsed(control: Control): readonly string[] {
  if (control.kind === "screen") return [control.panel];
  return control.kind === "enclosure" ? control.faces.map((face) => face.panel) : [];
}

function liningsUsed(control: Control): readonly string[] {
  if (control.kind === "screen") return control.facing.kind === "absorptive" ? [control.facing.sheet] : [];
  if (control.kind !== "enclosure") return [];
  const { lining, floor, unlinedSheet } = control;
  return [lining.sheet, floor.sheet, ...(unlinedSheet ? [unlinedSheet] : [])];
}

function pick<T>(from: ReadonlyMap<string, Entry<T>>, ids: readonly string[]): Readonly<Record<string, T>> {
  const all = Object.fromEntries(from);
  return Object.fromEntries([...new Set(ids)].sort().map((id) => [id, entry(all, id, "document").sheet]));
}
