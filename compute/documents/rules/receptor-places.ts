import { distanceToLineM } from "../../geometry/distance-to-line.ts";
import { isInsideOrOnEdge } from "../../geometry/outline.ts";
import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { type PlacedStatement, statementsOf } from "../statements-of.ts";
import type { Project } from "../types/project.gen.ts";

/** Nearer than this, a receptor point would stand in the screen itself, or on the crest of the bund [m]. */
const NEAREST_M = 0.1;

/** No receptor point lies inside a building, in a screen or on a bund. */
export const receptorPlaces: Rule = (set) => [
  ...[...set.project.valid.values()].flatMap(({ sheet, file }) => insideBuildings(set, file, sheet)),
  ...statementsOf(set).flatMap((placed) => inScreens(set, placed)),
];

function insideBuildings(set: DocumentSet, file: string, project: Project): Mistake[] {
  return project.receptors.flatMap((receptor, r) =>
    receptor.points.flatMap((point, p) => {
      const heightM = (point.groundM ?? project.groundLevelM) + point.heightM;
      const around = project.buildings.find(
        (building) =>
          heightM <= (building.groundM ?? project.groundLevelM) + building.heightM &&
          isInsideOrOnEdge(point.at, building.outline),
      );
      if (!around) return [];
      const advice = "Put it in front of the facade, for instance 1 m.";
      return [
        mistakeAt(
          set.texts,
          file,
          `/receptors/${r}/points/${p}/at`,
          "a place outside every building",
          `a place inside "${around.id}"`,
          advice,
        ),
      ];
    }),
  );
}

function inScreens(set: DocumentSet, { file, statement, project }: PlacedStatement): Mistake[] {
  const points = (project?.receptors ?? []).flatMap((receptor) => receptor.points);
  return statement.controls.flatMap((control, index) => {
    if (control.kind !== "screen" && control.kind !== "bund") return [];
    return points.flatMap((point) => {
      const distanceM = distanceToLineM(point.at, control.line);
      if (distanceM > NEAREST_M) return [];
      const expected = `a line more than ${NEAREST_M} m from every receptor point`;
      const received = `${distanceM.toFixed(3)} m from "${point.id}"`;
      return [
        mistakeAt(
          set.texts,
          file,
          `/controls/${index}/line`,
          expected,
          received,
          `Move the ${control.kind} or the receptor point.`,
        ),
      ];
    });
  });
}
