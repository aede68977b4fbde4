import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import type { Project } from "../types/project.gen.ts";
import { knownPhase } from "./known-phase.ts";
import { unknownId } from "./unknown-id.ts";

/** Facades name a building of the project, and what stands by phase names a phase of it. */
export const knownInProject: Rule = (set) =>
  [...set.project.valid].flatMap(([id, { sheet, file }]) => [
    ...facades(set, file, sheet),
    ...phases(set, id, file, sheet),
  ]);

function facades(set: DocumentSet, file: string, project: Project): Mistake[] {
  const buildings = project.buildings.map((building) => building.id);
  return project.receptors.flatMap((receptor, r) =>
    receptor.points.flatMap(({ position }, p) =>
      position.kind === "facade"
        ? unknownId(
            set.texts,
            file,
            `/receptors/${r}/points/${p}/position/building`,
            position.building,
            buildings,
            "building of this project",
          )
        : [],
    ),
  );
}

function phases(set: DocumentSet, id: string, file: string, project: Project): Mistake[] {
  const things = [
    ...project.buildings.map((building, index) => [`/buildings/${index}`, building] as const),
    ...project.excavations.map((excavation, index) => [`/excavations/${index}`, excavation] as const),
    ...project.ground.areas.map((area, index) => [`/ground/areas/${index}`, area] as const),
  ];
  return things.flatMap(([pointer, thing]) => [
    ...knownPhase(set, id, file, `${pointer}/standsFrom`, thing.standsFrom),
    ...knownPhase(set, id, file, `${pointer}/standsUntil`, thing.standsUntil),
  ]);
}
