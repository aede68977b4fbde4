import { equations } from "../../../compute/equations/registry.ts";
import { intermediate } from "../intermediate.ts";
import { BANDS } from "../midbands.ts";
import { leftOut, type RowGroup, tested } from "../row.ts";

interface Ends {
  readonly hs_m: number;
  readonly hr_m: number;
  readonly dp_m: number;
}
const own = (name: string, heightM: number, planDistanceM: number) =>
  intermediate("ground-effect", name, { planDistanceM }, [heightM]);
const ground = ({ hs_m, hr_m, dp_m }: Ends, Gs: number, Gm: number, Gr: number) => {
  const path = { sourceHeightM: hs_m, receptorHeightM: hr_m, planDistanceM: dp_m };
  return (bandHz: number) =>
    equations["ground-effect"].of({ bandHz, ...path, groundSource: Gs, groundMiddle: Gm, groundReceptor: Gr });
};

export const groundRows: readonly RowGroup[] = [
  tested<{ h_m: number; dp_m: number }>({
    ids: ["gr-bprime0"],
    equations: [],
    against: "ISO 9613-2:1996, Table 3",
    note: "b'(h) as it stands in the TeX of ground-effect",
    work: ({ h_m, dp_m }) => own("b'", h_m, dp_m),
  }),
  tested<Ends & { G: number }>({
    ids: ["gr-250-porous-onground"],
    equations: ["ground-effect"],
    against: "ISO 9613-2:1996, Table 3, far limit",
    note: "at 10 km, the end of the range, in the place of infinity: the two differ by e to the power −200",
    work: ({ G, ...path }) => ground({ ...path, dp_m: 10000 }, G, G, G)(250),
  }),
  tested<Ends & { G: number }>({
    ids: ["gr-hard-near"],
    equations: ["ground-effect"],
    against: "ISO 9613-2:1996, Table 3, by hand",
    work: ({ G, ...path }) => BANDS.map(ground(path, G, G, G)),
  }),
  tested<{ h_m: number; dp_m: number }>({
    ids: ["gr-fn-1-20", "gr-fn-1-100", "gr-fn-1.5-40", "gr-fn-2-200", "gr-fn-4-194", "gr-fn-5-500"],
    equations: [],
    against: "ISO 9613-2:1996, Table 3, worked apart",
    work: ({ h_m, dp_m }) => ["a'", "b'", "c'", "d'"].map((name) => own(name, h_m, dp_m)),
  }),
  tested<Ends & { Gs: number; Gm: number; Gr: number }>({
    ids: [
      ...["gr-agr-1-4-194-0", "gr-agr-1-4-194-0.5", "gr-agr-1-4-194-1"],
      ...["gr-agr-1.5-1.5-40-0.5", "gr-agr-1.5-1.5-40-1", "gr-agr-2-4-300-0.6"],
    ],
    equations: ["ground-effect"],
    against: "ISO 9613-2:1996, Table 3, worked apart",
    work: ({ Gs, Gm, Gr, ...path }) => BANDS.map(ground(path, Gs, Gm, Gr)),
  }),
  tested<{ d_m: number; hm_m: number }>({
    ids: ["gr-alt", "gr-alt-clamp"],
    equations: ["ground-effect-alternative"],
    against: "ISO 9613-2:1996, eq. (10), by hand",
    work: ({ d_m, hm_m }) => equations["ground-effect-alternative"].of({ distanceM: d_m, meanPathHeightM: hm_m }),
  }),
  tested<Ends>({
    ids: ["gr-domega"],
    equations: ["solid-angle-index"],
    against: "ISO 9613-2:1996, eq. (11), by hand",
    work: ({ hs_m, hr_m, dp_m }) =>
      equations["solid-angle-index"].of({ planDistanceM: dp_m, sourceHeightM: hs_m, receptorHeightM: hr_m }),
  }),
  tested<{ C0_dB: number; hs_plus_hr_m: number; dp_m: number[] }>({
    ids: ["cmet"],
    equations: ["met-correction"],
    against: "ISO 9613-2:1996, eqs. (21) and (22), by hand",
    work: ({ C0_dB, hs_plus_hr_m, dp_m }) =>
      dp_m.map((planDistanceM) =>
        equations["met-correction"].of({
          planDistanceM,
          sourceHeightM: 1,
          receptorHeightM: hs_plus_hr_m - 1,
          c0Db: C0_dB,
        }),
      ),
  }),
  leftOut("ISO 9613-2 Annex A (foliage, sites, housing) is not offered: what stands on a building site moves", [
    ...["hous2", "hous1", "foliage-100m", "site-100m"],
  ]),
];
