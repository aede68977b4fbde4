import type { Rule } from "../document-set.ts";
import { mistakeAt } from "../mistake-at.ts";
import { statementsOf } from "../statements-of.ts";

/** ISO 9613-2:1996, 7.4: an obstacle counts as a screen only from this surface density on [kg/m²]. */
const LEAST_KGM2 = 10;

/** A screen is made of a panel that may count as one: closed, and at least 10 kg/m² (ISO 9613-2:1996, 7.4). */
export const screenPanels: Rule = (set) =>
  statementsOf(set).flatMap(({ file, statement }) =>
    statement.controls.flatMap((control, index) => {
      const panel = control.kind === "screen" ? set.panel.valid.get(control.panel)?.sheet : undefined;
      if (!panel || (panel.closed && panel.surfaceDensityKgm2 >= LEAST_KGM2)) return [];
      const received = panel.closed
        ? `"${panel.id}" with ${panel.surfaceDensityKgm2} kg/m²`
        : `"${panel.id}", which is not closed`;
      const expected = `a closed panel of at least ${LEAST_KGM2} kg/m² (ISO 9613-2:1996, 7.4)`;
      return [
        mistakeAt(
          set.texts,
          file,
          `/controls/${index}/panel`,
          expected,
          received,
          "It may not count as a screen: choose another panel.",
        ),
      ];
    }),
  );
