import type { DocumentSet } from "./document-set.ts";
import { pointerTo } from "./pointer-to.ts";
import { statementsOf } from "./statements-of.ts";
import type { Control } from "./types/statement.gen.ts";

/** Kinds of document that others name by id. */
export type SheetKind = "plant" | "panel" | "lining" | "silencer" | "limit-set" | "duty-set";

/** A place where one document names another. */
export interface Reference {
  readonly projectId: string;
  readonly file: string;
  readonly pointer: string;
  readonly kind: SheetKind;
  readonly id: string;
}
type Named = readonly [pointer: string, kind: SheetKind, id: string];

/** Every place where a project or a statement names a sheet, a limit set or a duty set. */
export function references(set: DocumentSet): readonly Reference[] {
  const found: Reference[] = [];
  const add = (projectId: string, file: string, named: readonly Named[]) => {
    for (const [pointer, kind, id] of named) found.push({ projectId, file, pointer, kind, id });
  };
  for (const [projectId, { sheet, file }] of set.project.valid) {
    add(projectId, file, [
      ...sheet.limitSets.map((id, index): Named => [pointerTo("/limitSets", index), "limit-set", id]),
      ["/dutySet", "duty-set", sheet.dutySet],
    ]);
  }
  for (const { projectId, file, statement } of statementsOf(set)) {
    for (const [a, activity] of statement.activities.entries()) {
      add(
        projectId,
        file,
        activity.plant.map((item, p): Named => [`/activities/${a}/plant/${p}/sheet`, "plant", item.sheet]),
      );
    }
    for (const [c, control] of statement.controls.entries()) add(projectId, file, ofControl(control, `/controls/${c}`));
  }
  return found;
}

function ofControl(control: Control, here: string): readonly Named[] {
  switch (control.kind) {
    case "screen":
      return [
        [`${here}/panel`, "panel", control.panel],
        ...(control.facing.kind === "absorptive"
          ? [[`${here}/facing/sheet`, "lining", control.facing.sheet] as const]
          : []),
      ];
    case "enclosure":
      return [
        ...control.faces.map((face, index): Named => [`${here}/faces/${index}/panel`, "panel", face.panel]),
        ...control.openings.flatMap((opening, index): Named[] =>
          opening.silencer === undefined ? [] : [[`${here}/openings/${index}/silencer`, "silencer", opening.silencer]],
        ),
        [`${here}/lining/sheet`, "lining", control.lining.sheet],
        [`${here}/floor/sheet`, "lining", control.floor.sheet],
        ...(control.unlinedSheet === undefined
          ? []
          : [[`${here}/unlinedSheet`, "lining", control.unlinedSheet] as const]),
      ];
    case "quieter-plant":
      return [[`${here}/insteadOf`, "plant", control.insteadOf]];
    default:
      return [];
  }
}
