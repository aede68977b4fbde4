import { exactMidbandHz } from "../../../compute/acoustics/bands.ts";
import { equations } from "../../../compute/equations/registry.ts";
import { intermediate } from "../intermediate.ts";
import { BANDS, exactMidband, PRINTED_A } from "../midbands.ts";
import { type RowGroup, tested } from "../row.ts";

const weight = (id: "a-weight" | "c-weight") => (frequencyHz: number) => equations[id].of({ frequencyHz });
const pole = (name: string) => intermediate("a-weight", name, {});

export const levelRows: readonly RowGroup[] = [
  tested<{ levels_dB: number[] }>({
    ids: ["lev-sum-equal", "lev-sum-fhwa", "lev-sum-3", "lev-sum-10dB-apart"],
    equations: ["sum-levels"],
    against: "definition of the level; FHWA Noise Barrier Design Handbook, 3.1",
    work: ({ levels_dB }) => equations["sum-levels"].of({ levelsDb: levels_dB }),
  }),
  tested<{ L1_dB: number; L2_dB: number }>({
    ids: ["lev-sub"],
    equations: ["subtract-level"],
    against: "definition of the level",
    work: ({ L1_dB, L2_dB }) => equations["subtract-level"].of({ totalDb: L1_dB, partDb: L2_dB }),
  }),
  tested<{ levels_dB: number[] }>({
    ids: ["lev-avg"],
    equations: ["average-level"],
    against: "definition of the level",
    work: ({ levels_dB }) =>
      equations["average-level"].of({
        levelsDb: levels_dB,
        durationsH: levels_dB.map(() => 1),
        periodH: levels_dB.length,
      }),
  }),
  tested({
    ids: ["rad-sph-const"],
    equations: ["point-source-level"],
    against: "area of the sphere",
    work: () => -equations["point-source-level"].of({ powerDb: 0, distanceM: 1, directivityFactor: 1 }),
  }),
  tested({
    ids: ["rad-hemi-const"],
    equations: ["point-source-level"],
    against: "area of the sphere",
    work: () => -equations["point-source-level"].of({ powerDb: 0, distanceM: 1, directivityFactor: 2 }),
  }),
  tested<{ Lw_dB: number; r_m: number }>({
    ids: ["rad-hemi-10m"],
    equations: ["point-source-level"],
    against: "hemispherical spreading",
    work: ({ Lw_dB, r_m }) =>
      equations["point-source-level"].of({ powerDb: Lw_dB, distanceM: r_m, directivityFactor: 2 }),
  }),
  tested<{ Lw_dB: number; r_m: number }>({
    ids: ["rad-hemi-50m"],
    equations: ["octave-level"],
    against: "hemispherical spreading with the rounded constant 8",
    note: "8 is 11 less the 3 dB of hard ground",
    work: ({ Lw_dB, r_m }) =>
      equations["octave-level"].of({
        powerDb: Lw_dB,
        controlLossDb: 0,
        directivityDb: 0,
        divergenceDb: equations.divergence.of({ distanceM: r_m }),
        airDb: 0,
        groundDb: -3,
        screenDb: 0,
      }),
  }),
  tested<{ d_m: number }>({
    ids: ["rad-adiv-100", "rad-adiv-194"],
    equations: ["divergence"],
    against: "ISO 9613-2:1996, eq. (7)",
    work: ({ d_m }) => equations.divergence.of({ distanceM: d_m }),
  }),
  tested<{ nominal_Hz: number[] }>({
    ids: ["wt-A-third-table"],
    equations: ["a-weight"],
    against: "IEC 61672-1:2013, Table 3",
    work: ({ nominal_Hz }) => nominal_Hz.map(exactMidband).map(weight("a-weight")),
  }),
  tested<{ nominal_Hz: number[] }>({
    ids: ["wt-C-third-table"],
    equations: ["c-weight"],
    against: "IEC 61672-1:2013, Table 3",
    work: ({ nominal_Hz }) => nominal_Hz.map(exactMidband).map(weight("c-weight")),
  }),
  tested<{ bands_Hz: number[] }>({
    ids: ["wt-A-oct-table"],
    equations: ["a-weight"],
    against: "IEC 61672-1:2013, Table 3",
    work: ({ bands_Hz }) => bands_Hz.map(exactMidband).map(weight("a-weight")),
  }),
  tested<{ bands_Hz: number[] }>({
    ids: ["wt-C-oct-table"],
    equations: ["c-weight"],
    against: "IEC 61672-1:2013, Table 3",
    work: ({ bands_Hz }) => bands_Hz.map(exactMidband).map(weight("c-weight")),
  }),
  tested<{ bands_Hz: number[] }>({
    ids: ["wt-A-oct-analytic"],
    equations: ["a-weight"],
    against: "IEC 61672-1:2013, Annex E, worked apart",
    work: ({ bands_Hz }) => bands_Hz.map(weight("a-weight")),
  }),
  tested<{ bands_Hz: number[] }>({
    ids: ["wt-C-oct-analytic"],
    equations: ["c-weight"],
    against: "IEC 61672-1:2013, Annex E, worked apart",
    work: ({ bands_Hz }) => bands_Hz.map(weight("c-weight")),
  }),
  tested({
    ids: ["wt-poles"],
    equations: [],
    against: "IEC 61672-1:2013, Annex E",
    note: "the constants as they stand in the TeX of a-weight",
    work: () => ["f_1", "f_2", "f_3", "f_4"].map(pole),
  }),
  tested({
    ids: ["wt-poles-printed"],
    equations: [],
    against: "IEC 61672-1:2013, E.4.1",
    note: "rounded to the digits the standard prints: 20.60, 107.7, 737.9, 12194",
    work: () =>
      [pole("f_1").toFixed(2), pole("f_2").toFixed(1), pole("f_3").toFixed(1), pole("f_4").toFixed(0)].map(Number),
  }),
  tested({
    ids: ["wt-norm"],
    equations: [],
    against: "IEC 61672-1:2013, Annex E",
    work: () => [pole("A_1000"), intermediate("c-weight", "C_1000", {})],
  }),
  tested({
    ids: ["band-exact-oct"],
    equations: [],
    against: "ISO 266, exact midbands",
    work: () => BANDS.map(exactMidbandHz),
  }),
  tested<{ L_dB: number[] }>({
    ids: ["sum-A-spectrum"],
    equations: ["a-weighted-sum"],
    against: "ISO 9613-2:1996, eq. (5), worked by hand",
    work: ({ L_dB }) => equations["a-weighted-sum"].of({ levelsDb: L_dB, weightsDb: PRINTED_A }),
  }),
];
