import type { Rule } from "../document-set.ts";
import { mistakeAt } from "../mistake-at.ts";
import { statementsOf } from "../statements-of.ts";

/** No control has the id of a building or an excavation: a sound path names what it passes by id alone. */
export const obstacleIds: Rule = (set) =>
  statementsOf(set).flatMap(({ file, statement, project }) => {
    const taken = new Set([...(project?.buildings ?? []), ...(project?.excavations ?? [])].map(({ id }) => id));
    return statement.controls.flatMap((control, index) => {
      if (!taken.has(control.id)) return [];
      const expected = "an id that no building or excavation of the project has";
      return [
        mistakeAt(
          set.texts,
          file,
          `/controls/${index}/id`,
          expected,
          `"${control.id}"`,
          "Give the control another id.",
        ),
      ];
    });
  });
