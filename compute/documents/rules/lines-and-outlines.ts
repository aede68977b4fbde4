import { crossingEdges } from "../../geometry/crossing-edges.ts";
import type { Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { statementsOf } from "../statements-of.ts";
import type { Place } from "../types/common.gen.ts";

/** Two points of a line nearer than this are one point drawn twice [m]. */
const NEAREST_M = 0.1;

/** Lines and outlines have no step shorter than 0.1 m, and outlines do not cross themselves. */
export const linesAndOutlines: Rule = (set) => {
  const found: Mistake[] = [];
  const line = (file: string, pointer: string, points: readonly Place[]) => {
    const short = points.findIndex((point, index) => index > 0 && stepM(points[index - 1] ?? point, point) < NEAREST_M);
    if (short > 0)
      found.push(shortStep(set.texts, file, `${pointer}/${short}`, stepM(points[short - 1], points[short])));
    return short > 0;
  };
  const outline = (file: string, pointer: string, corners: readonly Place[]) => {
    if (line(file, pointer, corners)) return;
    const closing = stepM(corners.at(-1), corners[0]);
    if (closing < NEAREST_M) found.push(shortStep(set.texts, file, `${pointer}/${corners.length - 1}`, closing));
    else found.push(...crossing(set.texts, file, pointer, corners));
  };
  for (const { sheet, file } of set.project.valid.values()) {
    outline(file, "/boundary", sheet.boundary);
    for (const [index, way] of sheet.publicWays.entries()) line(file, `/publicWays/${index}/line`, way.line);
    for (const [index, building] of sheet.buildings.entries())
      outline(file, `/buildings/${index}/outline`, building.outline);
    for (const [index, pit] of sheet.excavations.entries()) outline(file, `/excavations/${index}/outline`, pit.outline);
    for (const [index, area] of sheet.ground.areas.entries())
      outline(file, `/ground/areas/${index}/outline`, area.outline);
  }
  for (const { file, statement } of statementsOf(set)) {
    for (const [index, control] of statement.controls.entries()) {
      if (control.kind === "screen" || control.kind === "bund") line(file, `/controls/${index}/line`, control.line);
    }
  }
  return found;
};

function stepM(from: Place | undefined, to: Place | undefined): number {
  return from && to ? Math.hypot(to.xM - from.xM, to.yM - from.yM) : 0;
}

function shortStep(texts: ReadonlyMap<string, string>, file: string, pointer: string, lengthM: number): Mistake {
  const advice = "Take one of the two points away, or move it.";
  return mistakeAt(
    texts,
    file,
    pointer,
    `a point at least ${NEAREST_M} m from the one it is joined to`,
    `${lengthM.toFixed(3)} m`,
    advice,
  );
}

function crossing(
  texts: ReadonlyMap<string, string>,
  file: string,
  pointer: string,
  corners: readonly Place[],
): Mistake[] {
  const edges = crossingEdges(corners);
  if (!edges) return [];
  const received = `edges ${edges[0]} and ${edges[1]} that cross or touch (edge 0 leaves corner 0)`;
  return [
    mistakeAt(
      texts,
      file,
      pointer,
      "an outline that does not cross itself",
      received,
      "Put the corners in order around the outline.",
    ),
  ];
}
