import { equations } from "../../../compute/equations/registry.ts";
import { leftOut, type RowGroup, tested } from "../row.ts";

interface Enclosure {
  readonly R_dB: number[];
  readonly SE_m2: number;
  readonly Si_m2: number;
  readonly alpha_i: number;
}
const loss = ({ SE_m2, Si_m2, alpha_i }: Omit<Enclosure, "R_dB">) => {
  return (reductionIndexDb: number) =>
    equations["enclosure-loss"].of({
      reductionIndexDb,
      externalAreaM2: SE_m2,
      internalAreaM2: Si_m2,
      absorption: alpha_i,
    });
};
const mean = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
const bies = "guide to Bies, Hansen and Howard 2017, eqs. (7.103) and (7.111)";

const panels = [
  ...["steel-0.55", "steel-0.9", "steel-1.2", "steel-1.6", "steel-6", "ply-6", "ply-9", "ply-12", "ply-18", "chip-19"],
  ...["lv-2", "lv-3", "steel16-gf100", "steel16-gf100-perf", "brick-125", "brick-255", "brick-plain-100"],
  ...["block-hollow-painted", "block-hollow-bare", "block-aer-100", "conc-100", "conc-200", "glass-4", "glass-6"],
  ...["lam-13", "acdoor", "tg-21"],
];

export const enclosureRows: readonly RowGroup[] = [
  leftOut(
    "tables of panels are data, kept with the data sheets",
    panels.map((panel) => `tl-${panel}`),
  ),
  leftOut("tables of linings are data, kept with the data sheets", [
    ...["abs-gf16-50", "abs-gf24-50", "abs-gf48-50", "abs-gf48-100", "abs-gf60-25", "abs-concrete", "abs-hard"],
  ]),
  leftOut("stiff, double and slit panels are not offered: panels come from tables, mass-law is for limp sheets", [
    ...["norton-311", "norton-314", "norton-314-above", "fc-panel", "fc-glass6", "sharp-B", "ml-normal-20-500"],
    ...["dw-f0", "dw-fl", "slit-2-100", "slit-res", "close-fit"],
  ]),
  tested<{ m_kg_m2: number; f_Hz: number }>({
    ids: ["ml-field-10-500", "ml-field-10-1000", "ml-field-20-500", "ml-field-13-250"],
    equations: ["mass-law"],
    against: "20 lg(m f) − 47, by hand",
    work: ({ m_kg_m2, f_Hz }) => equations["mass-law"].of({ surfaceDensityKgm2: m_kg_m2, frequencyHz: f_Hz }),
  }),
  tested<{ areas: number[]; R_dB: number[] }>({
    ids: ["comp-1pct"],
    equations: ["composite-index"],
    against: "tests of a general acoustics library",
    work: ({ areas, R_dB }) => equations["composite-index"].of({ areasM2: areas, reductionIndexesDb: R_dB }),
  }),
  tested<{ areas_m2: number[]; R_dB: number[] }>({
    ids: ["comp-2"],
    equations: ["composite-index"],
    against: "Hopkins 2007, eq. (4.92), by hand",
    work: ({ areas_m2, R_dB }) => equations["composite-index"].of({ areasM2: areas_m2, reductionIndexesDb: R_dB }),
  }),
  tested<Enclosure>({
    ids: ["encl-C"],
    equations: ["enclosure-loss"],
    against: bies,
    note: "the correction is what a panel of 50 dB loses",
    work: (enclosure) => 50 - loss(enclosure)(50),
  }),
  tested<Enclosure>({
    ids: ["encl-IL"],
    equations: ["enclosure-loss"],
    against: bies,
    work: ({ R_dB, ...enclosure }) => R_dB.map(loss(enclosure)),
  }),
  tested<Enclosure>({
    ids: ["encl-IL-mean"],
    equations: ["enclosure-loss"],
    against: bies,
    work: ({ R_dB, ...enclosure }) => mean(R_dB.map(loss(enclosure))),
  }),
  tested<Enclosure & { door_m2: number; door_R_dB: number; gap_m2?: number }>({
    ids: ["encl-door", "encl-door-gap"],
    equations: ["enclosure-loss", "composite-index"],
    against: bies,
    work: ({ R_dB, door_m2, door_R_dB, gap_m2, ...enclosure }) => {
      const gap = gap_m2 === undefined ? [] : [gap_m2];
      const panel = enclosure.SE_m2 - door_m2 - (gap_m2 ?? 0);
      const together = (index: number) =>
        equations["composite-index"].of({
          areasM2: [panel, door_m2, ...gap],
          reductionIndexesDb: [index, door_R_dB, ...gap.map(() => 0)],
        });
      return mean(R_dB.map(together).map(loss(enclosure)));
    },
  }),
  tested<{ alpha: number; R_dB: number; S_total_m2: number; open_m2: number[] }>({
    ids: ["pb-0.05", "pb-0.3", "pb-0.8"],
    equations: ["enclosure-balance"],
    against: "power balance, worked apart",
    work: ({ alpha, R_dB, S_total_m2, open_m2 }) =>
      open_m2.map((openAreaM2) =>
        equations["enclosure-balance"].of({
          openAreaM2,
          areasM2: [S_total_m2 - openAreaM2],
          absorptions: [alpha],
          reductionIndexesDb: [R_dB],
        }),
      ),
  }),
  leftOut("the level inside a room is not offered: enclosures are judged by what they take off outside", [
    "room-lp",
    "room-lp-direct",
  ]),
];
