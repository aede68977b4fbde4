import { stringify } from "csv-stringify/sync";
import { A_WEIGHTS_DB, BANDS_HZ } from "../acoustics/bands.ts";
import type { Revision, SealedPeriod, SealedTerms } from "../documents/types/revision.gen.ts";
import { resolvedPath } from "./resolved-path.ts";

/** Columns of figures.csv, in order. */
export const CSV_COLUMNS = [
  "row",
  "figure",
  "value",
  "unit",
  "activity",
  "item",
  "path",
  "past",
  "distance_m",
  "band_hz",
  "sound_power_db",
  "control_loss_db",
  "reflection_db",
  "directivity_db",
  "divergence_db",
  "air_db",
  "ground_db",
  "screen_db",
  "cap_db",
  "path_level_db",
  "a_weight_db",
  "met_db",
  "on_time_pct",
  "window_h",
  "period_h",
  "share",
  "facade_db",
] as const;

type Row = Partial<Record<(typeof CSV_COLUMNS)[number], string | number>>;

/**
 * figures.csv of a revision: a row per figure, and under each level of a limit's period a row per source, path and band with
 * every term in its own column, so that a spreadsheet can redo the sum:
 * path_level_db = sound_power_db − control_loss_db − reflection_db + directivity_db − divergence_db − air_db − ground_db
 * − screen_db − cap_db; value = 10 lg Σ share · 10^((path_level_db + a_weight_db − met_db)/10) + facade_db.
 */
export function figuresCsv(revision: Revision): string {
  const figures = revision.figures.map(({ key, value, unit }): Row => ({ row: "figure", figure: key, value, unit }));
  const terms = revision.periods.flatMap((period) => periodRows(revision, period));
  return stringify([...figures, ...terms], { header: true, columns: [...CSV_COLUMNS] });
}

function periodRows(revision: Revision, period: SealedPeriod): readonly Row[] {
  const levelOf = revision.figures.find(({ key }) => key === period.key);
  if (!levelOf) throw new Error(`${period.key}: the revision has no such figure`);
  return period.activities.flatMap(({ id, windowH, shares }) =>
    shares.flatMap(({ item, share }) => {
      const terms = revision.terms.find(
        (each) => each.activity === id && each.item === item && each.point === period.point,
      );
      if (!terms) throw new Error(`${period.key}: there are no terms of ${id}/${item}`);
      return termRows(terms, {
        row: "term",
        figure: period.key,
        value: levelOf.value,
        unit: levelOf.unit,
        activity: id,
        item,
        on_time_pct: terms.onTimePct,
        window_h: windowH,
        period_h: period.periodH,
        share,
        facade_db: period.facadeDb,
      });
    }),
  );
}

function termRows(terms: SealedTerms, common: Row): readonly Row[] {
  const db = (list: readonly number[], band: number) => (list[band] ?? Number.NaN) / 1000;
  return terms.paths.flatMap((path, index) => {
    const resolved = resolvedPath(terms, path);
    return BANDS_HZ.map(
      (bandHz, band): Row => ({
        ...common,
        path: `${index + 1} ${path.kind}`,
        past: path.past.join(" "),
        distance_m: resolved.distanceM,
        band_hz: bandHz,
        sound_power_db: db(terms.powerDb, band),
        control_loss_db: db(terms.controlLossDb, band),
        reflection_db: db(resolved.reflectionDb, band),
        directivity_db: resolved.directivityDb / 1000,
        divergence_db: resolved.divergenceDb / 1000,
        air_db: db(resolved.airDb, band),
        ground_db: db(resolved.groundDb, band),
        screen_db: db(resolved.screenDb, band),
        cap_db: db(resolved.capDb, band),
        path_level_db: db(resolved.levelDb, band),
        a_weight_db: A_WEIGHTS_DB[bandHz],
        met_db: terms.metDb / 1000,
      }),
    );
  });
}
