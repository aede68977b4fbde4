import { equations } from "../../../compute/equations/registry.ts";
import { BANDS } from "../midbands.ts";
import { type RowGroup, tested } from "../row.ts";
import { levelA } from "./path.ts";
import { edgeOf, type Wall } from "./screen-geometry.ts";

const FOOT_M = 0.3048;
type Point = [number, number];
interface Feet {
  readonly source_ft: Point;
  readonly edge_ft: Point;
  readonly receiver_ft: Point;
}
const metres = ([x, y]: Point): Point => [x * FOOT_M, y * FOOT_M];
const edgeInFeet = (feet: Feet) => edgeOf(metres(feet.source_ft), metres(feet.edge_ft), metres(feet.receiver_ft));

/** Loss of a thin screen with the cap of field practice, which is no part of the equation. */
function thinScreen(pathDifferenceM: number, frequencyHz: number, soundSpeedMs: number, capDb: number): number {
  const fresnelNumber = equations["fresnel-number"].of({ pathDifferenceM, frequencyHz, soundSpeedMs });
  return Math.min(capDb, equations["kurze-anderson"].of({ fresnelNumber }));
}

export const thinScreenRows: readonly RowGroup[] = [
  tested<{ N: number }>({
    ids: ["ka-0", "ka-0.01", "ka-0.1", "ka-0.5", "ka-1", "ka-2", "ka-5", "ka-10", "ka-12.6", "ka-20", "ka-100"],
    equations: ["kurze-anderson"],
    against: "Bies, Hansen and Howard 2017, eq. (5.138), worked apart",
    work: ({ N }) => equations["kurze-anderson"].of({ fresnelNumber: N }),
  }),
  tested<{ N: number }>({
    ids: ["mk-0", "mk-0.1", "mk-1", "mk-10"],
    equations: ["screen-attenuation"],
    against: "10 lg(3 + 20 N), which eq. (14) becomes with C2 = 40",
    work: ({ N }) =>
      equations["screen-attenuation"].of({
        bandHz: 500,
        pathDifferenceM: (N * 340) / 500 / 2,
        groundConstant: 40,
        edgeFactor: 1,
        metFactor: 1,
        capDb: 25,
      }),
  }),
  tested<Feet & { c_ft_s: number; L_unweighted_dB: number[] }>({
    ids: ["barlib-16", "barlib-17"],
    equations: ["a-weighted-sum"],
    against: "tests of a general acoustics library",
    note: "each octave capped at 20 dB, as that library does; the sum of the differences of two A-weighted totals",
    work: ({ c_ft_s, L_unweighted_dB, ...feet }) => {
      const { pathDifferenceM } = edgeInFeet(feet);
      const behind = L_unweighted_dB.map(
        (level, i) => level - thinScreen(pathDifferenceM, BANDS[i] as number, c_ft_s * FOOT_M, 20),
      );
      return equations["insertion-loss"].of({ withoutDb: levelA(L_unweighted_dB), withDb: levelA(behind) });
    },
  }),
  tested<Feet>({
    ids: ["barlib-16-delta", "barlib-17-delta"],
    equations: ["path-difference"],
    against: "tests of a general acoustics library",
    toUnit: FOOT_M,
    work: (feet) => edgeInFeet(feet).pathDifferenceM / FOOT_M,
  }),
  tested<{ hs_m: number; hr_m: number; H_m: number; s_m: number; r_m: number }>({
    ids: ["helm-delta"],
    equations: ["path-difference"],
    against: "HELM workbook 4.1, worked by hand",
    work: ({ hs_m, hr_m, H_m, s_m, r_m }) => edgeOf([0, hs_m], [s_m, H_m], [s_m + r_m, hr_m]).pathDifferenceM,
  }),
  tested<Wall & { c_m_s: number }>({
    ids: ["bar-4path"],
    equations: ["sum-levels", "insertion-loss"],
    against: "four-path image method, worked apart",
    note: "the method is not offered; its terms are",
    work: (wall) => BANDS.map((bandHz) => fourPathLoss(wall, bandHz)),
  }),
];

/** Images of source and receptor below hard ground, each path over the top with its own detour, 24 dB at most. */
function fourPathLoss(wall: Wall & { c_m_s: number }, bandHz: number): number {
  const { hs_m, hr_m, barrier_top_m, source_to_barrier_m, barrier_to_receiver_m, c_m_s } = wall;
  const spread = (distanceM: number) => -equations.divergence.of({ distanceM });
  const far = source_to_barrier_m + barrier_to_receiver_m;
  const behind: number[] = [];
  for (const source of [hs_m, -hs_m]) {
    for (const receptor of [hr_m, -hr_m]) {
      const edge = edgeOf([0, source], [source_to_barrier_m, barrier_top_m], [far, receptor]);
      behind.push(spread(edge.distanceM) - thinScreen(edge.pathDifferenceM, bandHz, c_m_s, 24));
    }
  }
  const open = [spread(Math.hypot(far, hs_m - hr_m)), spread(Math.hypot(far, hs_m + hr_m))];
  const sum = (levelsDb: readonly number[]) => equations["sum-levels"].of({ levelsDb });
  return equations["insertion-loss"].of({ withoutDb: sum(open), withDb: sum(behind) });
}
