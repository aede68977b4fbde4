import type { Bands } from "../acoustics/bands.ts";
import { perBand } from "../acoustics/bands.ts";
import type { Facet } from "../acoustics/reflections/facet.ts";
import type { Building } from "../documents/types/project.gen.ts";
import type { Activity, Control, ScreenControl } from "../documents/types/statement.gen.ts";
import { orientation, sides } from "../geometry/outline.ts";
import type { Place } from "../geometry/place.ts";
import { bandsOf } from "./emission-of.ts";
import type { StatementInputs } from "./inputs.ts";
import { entry } from "./inputs.ts";
import { standsThroughout } from "./stands.ts";

/** Reflection coefficient ρ of walls (ISO 9613-2:1996, Table 4, from memory). */
const WALL_REFLECTION: Readonly<Record<Building["walls"], number>> = {
  flat: 1,
  "with-windows": 0.8,
  "half-open": 0.4,
  "not-reflecting": 0,
};

/** Surfaces that reflect during an activity: walls of buildings that stand, and the screens among the controls in place. */
export function facetsOf(inputs: StatementInputs, placed: readonly Control[], activity: Activity): readonly Facet[] {
  const { project } = inputs;
  const walls = project.buildings
    .filter((building) => standsThroughout(inputs, building, activity.from, activity.until))
    .flatMap((building) => {
      const bottomM = building.groundM ?? project.groundLevelM;
      const reflection = perBand(() => WALL_REFLECTION[building.walls]);
      // The outline clockwise, so that outside lies left of each wall.
      const anticlockwise = orientation(building.outline) > 0;
      return sides(building.outline).map(
        ([a, b]): Facet => ({
          owner: building.id,
          reflects: "left",
          from: anticlockwise ? b : a,
          to: anticlockwise ? a : b,
          bottomM,
          topM: bottomM + building.heightM,
          reflection,
        }),
      );
    });
  const screens = placed
    .filter((control) => control.kind === "screen")
    .flatMap((screen) => screenFacets(inputs, screen));
  return [...walls, ...screens];
}

function screenFacets(inputs: StatementInputs, screen: ScreenControl): readonly Facet[] {
  const bottomM = screen.groundM ?? inputs.project.groundLevelM;
  const reflection = facingReflection(inputs, screen);
  return screen.line.slice(1).map((to, index) => ({
    owner: screen.id,
    reflects: "both-sides",
    from: screen.line[index] as Place,
    to,
    bottomM,
    topM: bottomM + screen.heightM,
    reflection,
  }));
}

function facingReflection(inputs: StatementInputs, { facing }: ScreenControl): Bands {
  if (facing.kind === "reflective") return perBand(() => 1);
  const absorption = bandsOf(entry(inputs.linings, facing.sheet, "lining").absorption);
  return perBand((bandHz) => 1 - absorption[bandHz]);
}
