import type { Bands } from "../acoustics/bands.ts";
import { perBand } from "../acoustics/bands.ts";
import type { EdgePoint, Obstacle, TopEdge } from "../acoustics/obstacles/obstacle.ts";
import type { Activity, Control, ScreenControl } from "../documents/types/statement.gen.ts";
import { compositeIndex } from "../equations/enclosures/composite-index.ts";
import type { Working } from "../equations/working.ts";
import { sides } from "../geometry/outline.ts";
import type { Place } from "../geometry/place.ts";
import { lineLengthM } from "../geometry/place.ts";
import { totalM2 } from "../geometry/surface.ts";
import { bandsOf } from "./emission-of.ts";
import type { StatementInputs } from "./inputs.ts";
import { entry } from "./inputs.ts";
import { standsThroughout } from "./stands.ts";

/**
 * What stands in the way of sound during an activity: screens and bunds among the controls in place, buildings, and the rims of
 * excavations.
 *
 * @param working  what works the sound reduction of screens out
 * @param placed   controls in place
 */
export function obstaclesOf(
  working: Working,
  inputs: StatementInputs,
  placed: readonly Control[],
  activity: Activity,
): readonly Obstacle[] {
  const { project } = inputs;
  const stands = (thing: Parameters<typeof standsThroughout>[1]) =>
    standsThroughout(inputs, thing, activity.from, activity.until);
  const lines = placed.flatMap((control): readonly Obstacle[] => {
    if (control.kind !== "screen" && control.kind !== "bund") return [];
    const topM = (control.groundM ?? project.groundLevelM) + control.heightM;
    const edges = control.line.slice(1).map((to, index) => edge(control.line[index] as Place, to, topM));
    const throughDb =
      control.kind === "screen" ? throughScreen(working.at(`control:${control.id}`), inputs, control) : undefined;
    return [{ id: control.id, kind: control.kind, edges, corners: control.line, throughDb }];
  });
  const buildings = project.buildings.filter(stands).map((building): Obstacle => {
    const topM = (building.groundM ?? project.groundLevelM) + building.heightM;
    const edges = sides(building.outline).map(([from, to]) => edge(from, to, topM));
    return { id: building.id, kind: "building", edges, corners: building.outline, throughDb: undefined };
  });
  const rims = project.excavations.filter(stands).map((excavation): Obstacle => {
    const rimM = excavation.rimM ?? project.groundLevelM;
    const edges = sides(excavation.outline).map(([from, to]) => edge(from, to, rimM));
    return { id: excavation.id, kind: "excavation", edges, corners: [], throughDb: undefined };
  });
  return [...lines, ...buildings, ...rims];
}

function edge(from: Place, to: Place, levelM: number): TopEdge {
  const end = (place: Place): EdgePoint => ({ xM: place.xM, yM: place.yM, levelM });
  return [end(from), end(to)];
}

/** Sound reduction of a screen as built: its panel less the deduction for joints, together with its gaps, which take nothing. */
function throughScreen(working: Working, inputs: StatementInputs, screen: ScreenControl): Bands {
  const panelDb = bandsOf(entry(inputs.panels, screen.panel, "panel").reductionIndexDb);
  // The gaps lie in the face: under the panels and between them.
  const closedM2 = lineLengthM(screen.line) * screen.heightM - totalM2(screen.gaps);
  const gapsM2 = screen.gaps.map(({ areaM2 }) => areaM2);
  return perBand((bandHz) =>
    working.at(`band:${bandHz}`).work(
      compositeIndex,
      {
        areasM2: [closedM2, ...gapsM2],
        reductionIndexesDb: [Math.max(0, panelDb[bandHz] - screen.siteBuildDeductionDb), ...gapsM2.map(() => 0)],
      },
      "screen-index",
    ),
  );
}
