import { equations } from "../../../compute/equations/registry.ts";
import { leftOut, type RowGroup, tested } from "../row.ts";

const halving = (levelDb: number, criterionDb: number, exchangeRateDb: number) =>
  equations["permitted-time"].of({ levelDb, criterionDb, exchangeRateDb });
const ids = (prefix: string, levels: readonly number[]) => levels.map((level) => `${prefix}${level}`);
const osha = [80, 85, 86, 88, 90, 92, 95, 97, 100, 102, 104, 105, 110, 115, 118, 120, 125, 130, 83];
const niosh = [
  ...[80, 81, 82, 83, 84, 85, 86, 88, 90, 91, 92, 94, 95, 96, 97, 98, 100, 101, 103, 104, 105, 106, 107, 108, 110],
  ...[111, 112, 113, 115, 118, 121],
];

export const permittedTimeRows: readonly RowGroup[] = [
  tested<{ L: number }>({
    ids: ids("osha-T-", osha),
    equations: ["permitted-time"],
    against: "29 CFR 1910.95, Table G-16a",
    note: "the table is rounded or cut: 1.1 h is printed for 1.149; 21.1 h at 83 dBA is 21.2 on a newer page, exact 21.11",
    work: ({ L }) => halving(L, 90, 5),
  }),
  leftOut("a dose from a rounded table time is a division, no equation", ["osha-dose-92-8h"]),
  tested<{ L: number; C_h: number }>({
    ids: ["osha-dose-92-8h-exact"],
    equations: [],
    against: "29 CFR 1910.95, dose from permitted-time",
    work: ({ L, C_h }) => (100 * C_h) / halving(L, 90, 5),
  }),
  tested<{ D_percent: number }>({
    ids: ["osha-twa-91", "osha-twa-50"],
    equations: [],
    against: "29 CFR 1910.95, Appendix A, with exchange-factor",
    work: ({ D_percent }) => 90 + equations["exchange-factor"].of({ exchangeRateDb: 5 }) * Math.log10(D_percent / 100),
  }),
  tested<{ L: number }>({
    ids: ids("osha-D2-", [90, 92, 95, 97, 100, 102, 105, 110, 115]),
    equations: ["permitted-time"],
    against: "29 CFR 1926.52, Table D-2",
    note: "the table rounds to half hours",
    work: ({ L }) => halving(L, 90, 5),
  }),
  tested<{ L: number }>({
    ids: [...ids("niosh-t-", niosh), "niosh-t-99-misprint"],
    equations: ["permitted-time"],
    against: "NIOSH 98-126, Table 1-1",
    toUnit: 1 / 3600,
    note: "NIOSH prints 18 min 59 s at 99 dBA; its own formula gives 18 min 54 s, kept as a derived row",
    work: ({ L }) => 3600 * halving(L, 85, 3),
  }),
  tested<{ L: number }>({
    ids: ids("ccohs-1A3-", [90, 93, 96, 99, 102, 105]),
    equations: ["permitted-time"],
    against: "CCOHS, Tables 1A and 1B",
    work: ({ L }) => halving(L, 90, 3),
  }),
  tested<{ L: number }>({
    ids: ids("ccohs-1B5-", [85, 90, 95, 100, 105, 110]),
    equations: ["permitted-time"],
    against: "CCOHS, Tables 1A and 1B",
    work: ({ L }) => halving(L, 85, 5),
  }),
  tested<{ L: number }>({
    ids: ids("njc-", [83, 84, 85, 86, 87, 88, 89, 90, 92, 95, 97, 100, 101]),
    equations: ["equal-energy-time"],
    against: "NJC directive, Canada federal",
    note: "two significant figures; halving per 3 dB would fail four of the nineteen printed rows",
    work: ({ L }) => equations["equal-energy-time"].of({ levelDb: L, criterionDb: 87 }),
  }),
];
