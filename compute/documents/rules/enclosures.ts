import { totalM2 } from "../../geometry/surface.ts";
import type { DocumentSet, Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { statementsOf } from "../statements-of.ts";
import type { EnclosureControl } from "../types/statement.gen.ts";

/** Above this share of the whole surface an enclosure is a partial one [%]. */
const MOST_OPEN_PCT = 5;

/** An enclosure is a full one, and its lining fits on its faces. */
export const enclosures: Rule = (set) =>
  statementsOf(set).flatMap(({ file, statement }) =>
    statement.controls.flatMap((control, index) =>
      control.kind === "enclosure" ? ofEnclosure(set, file, control, `/controls/${index}`) : [],
    ),
  );

function ofEnclosure(set: DocumentSet, file: string, control: EnclosureControl, here: string): Mistake[] {
  const facesM2 = totalM2(control.faces);
  const openM2 = totalM2(control.openings);
  const openPct = (100 * openM2) / (facesM2 + openM2);
  const found: Mistake[] = [];
  if (openPct > MOST_OPEN_PCT) {
    const expected = `openings of at most ${MOST_OPEN_PCT} % of faces and openings`;
    const advice =
      "That is a partial enclosure, which this version does not compute: close more of it, or enter a screen.";
    found.push(
      mistakeAt(
        set.texts,
        file,
        `${here}/openings`,
        expected,
        `${openPct.toFixed(1)} % (${openM2} of ${facesM2 + openM2} m²)`,
        advice,
      ),
    );
  }
  if (control.lining.areaM2 > facesM2) {
    const expected = `a lined area of at most the ${facesM2} m² of the faces`;
    found.push(
      mistakeAt(
        set.texts,
        file,
        `${here}/lining/areaM2`,
        expected,
        `${control.lining.areaM2} m²`,
        "Enter the area inside the faces that is lined.",
      ),
    );
  }
  return found;
}
