import { equations } from "../../../compute/equations/registry.ts";
import { leftOut, type RowGroup, tested } from "../row.ts";

const size = (viewingDistanceM: number) => equations["sign-size"].of({ viewingDistanceM });
/** [read] ASR A1.3: diameters [mm] that are sold. */
const COMMERCIAL_MM = [12.5, 25, 50, 100, 200, 300, 400, 600, 900];
const texts = [1, 2, 3, 5, 10, 20, 25, 30];
const signs = [0.5, 1, 2, 3, 4, 5, 8, 9, 12, 13, 16, 17, 24, 25, 30];

export const zoneRows: readonly RowGroup[] = [
  tested<{ E_m: number }>({
    ids: signs.map((distance) => `sign-d-${distance}`),
    equations: [],
    against: "ASR A1.3, table of sign sizes",
    note: "the smallest diameter sold that is no smaller than sign-size gives",
    work: ({ E_m }) => COMMERCIAL_MM.find((diameter) => diameter >= size(E_m)) ?? Number.NaN,
  }),
  leftOut(
    "the height of letters is set by the sheets, no equation",
    texts.map((distance) => `sign-text-${distance}`),
  ),
  tested<{ E_m: number }>({
    ids: ["sign-z40-20m"],
    equations: ["sign-size"],
    against: "BGV A8, 4.9, by hand",
    work: ({ E_m }) => size(E_m),
  }),
  leftOut("facts of signs, not results of an equation", [
    "sign-area-factor",
    "sign-edge",
    "sign-blue-min",
    "sign-own-blue",
  ]),
  tested<{ L0: number; r0: number; Lt: number }>({
    ids: ["z-83at10-85", "z-83at10-80", "z-90at1-85", "z-102at1-85", "z-111at1-85"],
    equations: ["distance-to-level"],
    against: "point source law, by hand",
    work: ({ L0, r0, Lt }) => equations["distance-to-level"].of({ levelDb: L0, atDistanceM: r0, targetDb: Lt }),
  }),
  tested<{ LWA: number; Lt: number }>({
    ids: ["z-lwa110-85"],
    equations: ["distance-to-level"],
    against: "point source law, by hand",
    work: ({ LWA, Lt }) => {
      const levelDb = equations["zone-level"].of({ powerDba: LWA, distanceM: 1, walls: 0 });
      return equations["distance-to-level"].of({ levelDb, atDistanceM: 1, targetDb: Lt });
    },
  }),
  tested<{ LWA: number; r: number }>({
    ids: ["z-lwa110-5m"],
    equations: ["zone-level"],
    against: "point source law, by hand",
    work: ({ LWA, r }) => equations["zone-level"].of({ powerDba: LWA, distanceM: r, walls: 0 }),
  }),
  leftOut("a wavelength is a division, no equation; the near field is twice the largest dimension", [
    ...["lambda-63", "lambda-125", "lambda-250", "lambda-500"],
  ]),
];
