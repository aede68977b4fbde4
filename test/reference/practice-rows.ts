import { equations } from "../../compute/equations/registry.ts";
import { leftOut, type RowGroup, tested } from "./row.ts";

const FOOT_M = 0.3048;
const sum = (levelsDb: readonly number[]) => equations["sum-levels"].of({ levelsDb });
const onTime = (onTimePct: number) => equations["on-time-correction"].of({ onTimePct });
const facade = (levelDb: number, facadeDb: number) => equations["facade-level"].of({ levelDb, facadeDb });
const beyond50Ft = (level: number, feet: number) =>
  level - equations["distance-hard"].of({ distanceM: feet * FOOT_M, referenceM: 50 * FOOT_M });

/** Level over hard ground with the rounded constant 8 that published reports use: 11 less 3 dB. */
const hardGround = (powerDb: number, distanceM: number, screenDb: number) =>
  equations["octave-level"].of({
    powerDb,
    controlLossDb: 0,
    directivityDb: 0,
    divergenceDb: equations.divergence.of({ distanceM }),
    airDb: 0,
    groundDb: -3,
    screenDb,
  });

interface Item {
  readonly LWA: number;
  readonly n: number;
  readonly on_time_pct: number;
  readonly mitigation_dB: number;
}
const eiaReport = "published environmental impact reports, Hong Kong";

const pilingDistances = [0, 1, 5, 10, 15, 20, 25, 30, 50, 100, 150, 200, 250, 300, 400, 500, 600, 700];
const numbered = (prefix: string, count: number) => Array.from({ length: count }, (_, i) => `${prefix}${i + 1}`);

/** Every row of practice-check-values.json. */
export const practiceRows: readonly RowGroup[] = [
  tested<{ LWA: number; d_m: number; truck_level: number; facade: number }>({
    ids: ["EIA-061-1", "EIA-061-2"],
    equations: ["facade-level", "octave-level"],
    against: eiaReport,
    work: ({ LWA, d_m, truck_level, facade: facadeDb }) =>
      facade(sum([hardGround(LWA, d_m, 0), truck_level]), facadeDb),
  }),
  tested<{ levels: number[] }>({
    ids: ["EIA-061-3", "EIA-tai-2"],
    equations: ["sum-levels"],
    against: eiaReport,
    work: ({ levels }) => sum(levels),
  }),
  tested<{ LWA: number[] }>({
    ids: numbered("EIA-091-sum", 7),
    equations: ["sum-levels"],
    against: eiaReport,
    work: ({ LWA }) => sum(LWA),
  }),
  tested<{ items: [number, number][] }>({
    ids: numbered("EIA-091-n", 3),
    equations: ["sum-levels"],
    against: eiaReport,
    work: ({ items }) => sum(items.flatMap(([level, count]) => Array<number>(count).fill(level))),
  }),
  tested<Item>({
    ids: [...numbered("EIA-rail-", 11), "EIA-rail-13"],
    equations: ["on-time-correction", "sum-levels"],
    against: eiaReport,
    work: ({ LWA, n, on_time_pct, mitigation_dB }) =>
      sum(Array<number>(n).fill(LWA)) + onTime(on_time_pct) + mitigation_dB,
  }),
  tested<{ LWA: number; on_time_pct: number; screen: number }>({
    ids: ["EIA-tai-1"],
    equations: ["on-time-correction"],
    against: eiaReport,
    work: ({ LWA, on_time_pct, screen }) => LWA + onTime(on_time_pct) + screen,
  }),
  tested<{ on_time_pct: number[] }>({
    ids: ["EIA-tai-3"],
    equations: ["on-time-correction"],
    against: eiaReport,
    note: "the report rounds to whole dB",
    work: ({ on_time_pct }) => on_time_pct.map(onTime),
  }),
  leftOut("adding levels by a table of steps is not offered: levels are summed energetically", numbered("HK-T4-", 13)),
  leftOut("the statutory table for percussive piling is a national procedure of its own, not offered", [
    ...pilingDistances.map((distance) => `HK-PP-${distance}`),
  ]),
  tested<{ d_m: number }>({
    ids: [10, 20, 50, 100, 300].map((distance) => `hemi-${distance}`),
    equations: ["point-source-level"],
    against: "20 lg d + 8, by hand",
    note: "exact 7.98 dB against the rounded 8",
    work: ({ d_m }) => -equations["point-source-level"].of({ powerDb: 0, distanceM: d_m, directivityFactor: 2 }),
  }),
  tested<{ R_m: number }>({
    ids: [25, 50, 100, 200].map((distance) => `F-hard-${distance}`),
    equations: ["distance-hard"],
    against: "BS 5228-1, Annex F, by hand",
    work: ({ R_m }) => -equations["distance-hard"].of({ distanceM: R_m, referenceM: 10 }),
  }),
  tested<{ R_m: number }>({
    ids: [25, 50, 100, 200].map((distance) => `F-soft-${distance}`),
    equations: ["distance-soft"],
    against: "BS 5228-1, Annex F, by hand",
    work: ({ R_m }) => -equations["distance-soft"].of({ distanceM: R_m }),
  }),
  tested<{ on_time_pct: number }>({
    ids: [100, 90, 75, 60, 50, 40, 30, 25, 20, 15, 10, 5, 1].map((share) => `ontime-${share}`),
    equations: ["on-time-correction"],
    against: "10 lg(t/100), by hand",
    work: ({ on_time_pct }) => onTime(on_time_pct),
  }),
  tested<{ LWA: number; Q_per_h: number; V_kmh: number; d_m: number }>({
    ids: ["haul-108-20-20-50", "haul-103-60-30-25", "haul-110-6-15-100"],
    equations: ["haul-route-level"],
    against: "energy of passes on a long straight, derived",
    note: "the derived constant is −33.01",
    work: ({ LWA, Q_per_h, V_kmh, d_m }) =>
      equations["haul-route-level"].of({ powerDb: LWA, passesPerHour: Q_per_h, speedKmh: V_kmh, distanceM: d_m }),
  }),
  leftOut("plant moving in a limited area is not offered: its tabulated factors were not read", [
    ...["limited-0.5", "limited-1", "limited-2", "limited-4", "limited-10"],
  ]),
  tested<{ L_50ft: number; usage: number; D_ft: number }>({
    ids: ["fta-101-1-100-0", "fta-88-1-100-0", "fta-85-0.4-200-0", "fta-90-0.2-50-0"],
    equations: ["distance-hard", "share-level"],
    against: "FTA procedure with G = 0, by hand",
    work: ({ L_50ft, usage, D_ft }) => beyond50Ft(equations["share-level"].of({ levelDb: L_50ft, share: usage }), D_ft),
  }),
  leftOut("the FTA ground factor is a national procedure of its own, not offered", ["fta-85-0.4-200-0.66"]),
  tested<{ L_50ft: number[]; D_ft: number }>({
    ids: ["fta-gen-1"],
    equations: ["distance-hard", "sum-levels"],
    against: "FTA general assessment, by hand",
    work: ({ L_50ft, D_ft }) => beyond50Ft(sum(L_50ft), D_ft),
  }),
  tested<{ L_50ft: number; D_ft: number[] }>({
    ids: ["rn-92", "rn-86", "rn-67"],
    equations: ["distance-hard"],
    against: "a published assessment, Renton",
    note: "52 is printed at 300 ft where the law gives 51.44: the report does not round alike",
    work: ({ L_50ft, D_ft }) => D_ft.map((feet) => beyond50Ft(L_50ft, feet)),
  }),
  tested<{ Leq: number; baseline: number }>({
    ids: ["base-1", "base-2"],
    equations: ["subtract-level"],
    against: "energies subtracted by hand",
    work: ({ Leq, baseline }) => equations["subtract-level"].of({ totalDb: Leq, partDb: baseline }),
  }),
  leftOut("permissible sound powers of new plant are data, kept with their source", [
    ...["eu-comp-100", "eu-comp-8", "eu-trk-55", "eu-trk-142", "eu-whl-100", "eu-exc-15", "eu-exc-100", "eu-cmp-50"],
    ...["eu-brk-20", "eu-brk-30", "eu-twr-50"],
  ]),
  leftOut("the German time correction is a table, kept with the limit set", ["avv-1"]),
  tested<{ Lr: number; value: number }>({
    ids: ["avv-2", "avv-3"],
    equations: ["exceedance"],
    against: "AVV Baulaerm, worked example",
    note: "whether to intervene is judged by the limit set",
    work: ({ Lr, value }) => ({ exceedance_dB: equations.exceedance.of({ levelDb: Lr, limitDb: value }) }),
  }),
  leftOut("categories by ambient level are judged by the limit set", ["abc-1", "abc-2", "abc-3"]),
  tested<{ ambient: number; site: number }>({
    ids: ["abc-4"],
    equations: ["sum-levels"],
    against: "BS 5228-1, Annex E, by hand",
    note: "the verdict is the limit set's",
    work: ({ ambient, site }) => ({ total: sum([ambient, site]), rise: sum([ambient, site]) - ambient }),
  }),
  tested<{ ambient: number; site: number }>({
    ids: ["5db-1", "5db-2"],
    equations: ["sum-levels"],
    against: "BS 5228-1, Annex E, by hand",
    note: "the verdict is the limit set's",
    work: ({ ambient, site }) => ({ total: sum([ambient, site]), change: sum([ambient, site]) - ambient }),
  }),
  leftOut("a limit raised for short works is judged by the limit set", ["hk-anl-1"]),
  tested<{ LWA: number; d_m: number }>({
    ids: ["hk-cnl-1"],
    equations: ["facade-level", "octave-level"],
    against: "Hong Kong technical memorandum, by hand",
    work: ({ LWA, d_m }) => facade(hardGround(LWA, d_m, 10), 3),
  }),
  leftOut("facts of monitoring, not results of an equation", ["trig-arun", "cal-drift", "wx"]),
];
