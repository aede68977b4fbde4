import { lineLengthM } from "../../geometry/place.ts";
import { totalM2 } from "../../geometry/surface.ts";
import type { Rule } from "../document-set.ts";
import { mistakeAt } from "../mistake-at.ts";
import { statementsOf } from "../statements-of.ts";

/** The gaps of a screen lie in its face, which is larger than they are. */
export const screenGaps: Rule = (set) =>
  statementsOf(set).flatMap(({ file, statement }) =>
    statement.controls.flatMap((control, index) => {
      if (control.kind !== "screen") return [];
      const faceM2 = lineLengthM(control.line) * control.heightM;
      const gapsM2 = totalM2(control.gaps);
      if (gapsM2 < faceM2) return [];
      const expected = `gaps of less than the ${faceM2.toFixed(1)} m² of the face`;
      const advice = "Enter the area of the openings under and between the panels.";
      return [
        mistakeAt(set.texts, file, `/controls/${index}/gaps`, expected, `${gapsM2.toFixed(1)} m² of gaps`, advice),
      ];
    }),
  );
