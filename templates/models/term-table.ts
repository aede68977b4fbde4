import { A_WEIGHTS_DB, BANDS_HZ } from "../../compute/acoustics/bands.ts";
import type { SealedPath, SealedTerms } from "../../compute/documents/types/revision.gen.ts";
import { decimals, tenthDb } from "../../compute/figures/display.ts";
import { pathName } from "./path-name.ts";
import type { RevisionView } from "./revision-view.ts";
import { itemOf } from "./revision-view.ts";
import type { Words } from "./words.ts";

/** A term table as a page prints it: a row per term, a column per octave band. */
export function termTable(view: RevisionView, terms: SealedTerms) {
  const { words, text } = view;
  const activity = view.statement.activities.find(({ id }) => id === terms.activity);
  if (!activity) throw new Error(`the statement has no activity "${terms.activity}"`);
  const row = (key: string, values: readonly number[], path = "") => ({
    label: words.say(`terms.row-${key}`, { path }),
    cells: values.map((value) => cellText(words, value / 1000)),
  });
  return {
    caption: words.say("workings.table-caption", {
      item: text(itemOf(view, terms.item).name),
      activity: text(activity.title),
      distance: decimals(terms.distanceM, 1),
      ground:
        terms.groundFactors.length === 0
          ? words.say("workings.alternative-ground")
          : words.say("workings.ground-factors", {
              factors: terms.groundFactors.map((factor) => decimals(factor, 2)).join(" / "),
            }),
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
      ...(terms.directivityDb === 0
        ? []
        : [
            row(
              "directivity",
              BANDS_HZ.map(() => terms.directivityDb),
            ),
          ]),
      ...terms.paths.flatMap((path) => pathRows(pathName(view, path), path, row)),
      row(
        "weight",
        BANDS_HZ.map((bandHz) => 1000 * A_WEIGHTS_DB[bandHz]),
      ),
    ],
    total: words.say(terms.metDb === 0 ? "workings.table-total" : "workings.table-total-met", {
      level: tenthDb(terms.levelDba / 1000),
      met: tenthDb(terms.metDb / 1000),
    }),
  };
}

/** A term to a tenth; a dash in a band in which the path does not count, where terms and levels stand hundreds of decibels off. */
function cellText(words: Words, valueDb: number): string {
  return Math.abs(valueDb) > 150 ? words.say("terms.not-counted") : tenthDb(valueDb);
}

type Row = { readonly label: string; readonly cells: readonly string[] };

/** Rows of one path: those of its own line if it is reflected, the screen it passes, its level. */
function pathRows(
  name: string,
  path: SealedPath,
  row: (key: string, values: readonly number[], path: string) => Row,
): readonly Row[] {
  const { own, screenDb, capDb, levelDb } = path;
  const line = own
    ? [
        row("reflection", own.reflectionDb, name),
        row(
          "own-divergence",
          BANDS_HZ.map(() => own.divergenceDb),
          name,
        ),
        row("own-air", own.airDb, name),
        row("own-ground", own.groundDb, name),
      ]
    : [];
  const bends = path.kind !== "direct" && (path.kind !== "reflected" || path.pathDifferenceM !== undefined);
  return [
    ...line,
    ...(bends ? [row("screen", screenDb, name)] : []),
    ...(capDb ? [row("cap", capDb, name)] : []),
    row("level", levelDb, name),
  ];
}
