import { A_WEIGHTS_DB, BANDS_HZ } from "../../compute/acoustics/bands.ts";
import type { SealedPath, SealedTerms } from "../../compute/documents/types/revision.gen.ts";
import { decimals, tenthDb } from "../../compute/figures/display.ts";
import type { RevisionView } from "./revision-view.ts";
import { controlOf, itemOf } from "./revision-view.ts";

/** A term table as a page prints it: a row per term, a column per octave band. */
export function termTable(view: RevisionView, terms: SealedTerms) {
  const { words, text } = view;
  const activity = view.statement.activities.find(({ id }) => id === terms.activity);
  if (!activity) throw new Error(`the statement has no activity "${terms.activity}"`);
  const row = (key: string, values: readonly number[], path = "") => ({
    label: words.say(`terms.row-${key}`, { path }),
    cells: values.map((value) => tenthDb(value / 1000)),
  });
  return {
    caption: words.say("workings.table-caption", {
      item: text(itemOf(view, terms.item).name),
      activity: text(activity.title),
      distance: decimals(terms.distanceM, 1),
      ground: terms.groundFactors.map((factor) => decimals(factor, 2)).join(" / "),
    }),
    rows: [
      row("power", terms.powerDb),
      row("control", terms.controlLossDb),
      row(
        "divergence",
        BANDS_HZ.map(() => terms.divergenceDb),
      ),
      row("air", terms.airDb),
      row("ground", terms.groundDb),
      ...terms.paths.flatMap((path) => {
        const name = pathName(view, path);
        const screened =
          path.path === "direct" ? [] : [row("screen", path.screenDb, name), row("cap", path.capDb, name)];
        return [...screened, row("level", path.levelDb, name)];
      }),
      row(
        "weight",
        BANDS_HZ.map((bandHz) => 1000 * A_WEIGHTS_DB[bandHz]),
      ),
    ],
    total: words.say("workings.table-total", { level: tenthDb(terms.levelDba / 1000) }),
  };
}

function pathName(view: RevisionView, { path, screen, pathDifferenceM }: SealedPath): string {
  const { words, text } = view;
  return words.say(`terms.path-${path}`, {
    screen: screen ? text(controlOf(view, screen).name) : "",
    z: pathDifferenceM === undefined ? "" : decimals(pathDifferenceM, 3),
  });
}
