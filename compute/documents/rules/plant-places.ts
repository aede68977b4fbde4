import { distanceToLineM } from "../../geometry/distance-to-line.ts";
import { isInsideOrOnEdge } from "../../geometry/outline.ts";
import { standsSpan } from "../calendar/stands-span.ts";
import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { type PlacedItem, plantItems } from "../plant-items.ts";
import { type PlacedStatement, statementsOf } from "../statements-of.ts";
import type { Building, Project } from "../types/project.gen.ts";

/** Nearer than this, a machine would stand in the screen itself, or on the crest of the bund [m]. */
const NEAREST_M = 0.1;

/** No plant stands inside a building that stands while its activity runs, nor in a screen or on a bund. */
export const plantPlaces: Rule = (set) =>
  statementsOf(set).flatMap((placed) =>
    plantItems(placed.statement).flatMap((item) => [
      ...insideBuilding(set, placed, item),
      ...inScreen(set, placed, item),
    ]),
  );

function insideBuilding(
  set: DocumentSet,
  { file, project, projectId }: PlacedStatement,
  { item, activity, pointer }: PlacedItem,
): Mistake[] {
  const sheet = set.plant.valid.get(item.sheet)?.sheet;
  if (!project || !sheet) return [];
  const centreM = (item.groundM ?? project.groundLevelM) + sheet.acousticCentreHeightM;
  return project.buildings.flatMap((building) => {
    const span = standsSpan(set, projectId, building);
    const stands = span !== undefined && span.from <= activity.from && span.until >= activity.until;
    if (!stands || centreM > roofM(building, project) || !isInsideOrOnEdge(item.at, building.outline)) return [];
    const expected = "a place outside the buildings that stand while the activity runs";
    const advice = "Move it, give its groundM if it stands on the roof, or say when the building is taken down.";
    return [mistakeAt(set.texts, file, `${pointer}/at`, expected, `a place inside "${building.id}"`, advice)];
  });
}

/** Height of a building's roof above the project's datum [m]. */
function roofM(building: Building, project: Project): number {
  return (building.groundM ?? project.groundLevelM) + building.heightM;
}

function inScreen(set: DocumentSet, { file, statement }: PlacedStatement, { item, pointer }: PlacedItem): Mistake[] {
  return statement.controls.flatMap((control) => {
    if (control.kind !== "screen" && control.kind !== "bund") return [];
    const distanceM = distanceToLineM(item.at, control.line);
    if (distanceM > NEAREST_M) return [];
    const received = `${distanceM.toFixed(3)} m from "${control.id}"`;
    return [
      mistakeAt(
        set.texts,
        file,
        `${pointer}/at`,
        `a place more than ${NEAREST_M} m from every ${control.kind}`,
        received,
        `Move the machine or the ${control.kind}.`,
      ),
    ];
  });
}
