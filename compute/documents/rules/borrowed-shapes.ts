import type { Rule } from "../document-set.ts";
import { mistakeAt } from "../mistake-at.ts";
import { unknownId } from "./unknown-id.ts";

/** The octave shape is borrowed from a sheet that has octave bands. */
export const borrowedShapes: Rule = (set) =>
  [...set.plant.valid.values()].flatMap(({ sheet: { emission }, file }) => {
    if (emission.kind !== "single" || emission.shapeFrom === undefined) return [];
    const lender = set.plant.valid.get(emission.shapeFrom)?.sheet.emission;
    if (!lender || lender.kind === "octave")
      return unknownId(set.texts, file, "/emission/shapeFrom", emission.shapeFrom, set.plant.names, "plant sheet");
    const received = `"${emission.shapeFrom}", which has the kind "${lender.kind}"`;
    return [
      mistakeAt(
        set.texts,
        file,
        "/emission/shapeFrom",
        "a plant sheet with octave bands",
        received,
        "Name the sheet of a like machine with octave bands.",
      ),
    ];
  });
