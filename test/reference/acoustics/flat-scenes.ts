import { type RowGroup, tested } from "../row.ts";
import { bandLevels, levelA, type Scene } from "./path.ts";

interface Flat {
  readonly source_xyz_m: [number, number, number];
  readonly receiver_xyz_m: [number, number, number];
  readonly Lw_dB_each_octave_63_8000: number;
  readonly G: number;
  readonly t_C: number;
  readonly RH_pct: number;
}
const sceneOf = ({ source_xyz_m: s, receiver_xyz_m: r, Lw_dB_each_octave_63_8000, G, t_C, RH_pct }: Flat): Scene => ({
  powerDb: Lw_dB_each_octave_63_8000,
  planDistanceM: Math.hypot(r[0] - s[0], r[1] - s[1]),
  sourceHeightM: s[2],
  receptorHeightM: r[2],
  ground: G,
  temperatureC: t_C,
  humidityPct: RH_pct,
});
const levels = (flat: Flat) => bandLevels(sceneOf(flat), () => 0);

export const flatSceneRows: readonly RowGroup[] = [
  tested<Flat>({
    ids: ["tr17534-T01-LA", "tr17534-T02-LA", "tr17534-T03-LA"],
    equations: ["octave-level", "a-weighted-sum"],
    against: "ISO/TR 17534-3:2015, T01 to T03, recollected",
    note: "from memory; the independent calculation of the same scenes stands beside them",
    work: (flat) => levelA(levels(flat)),
  }),
  tested<Flat>({
    ids: ["flat-T01-like-bands", "flat-T02-like-bands", "flat-T03-like-bands"],
    equations: ["octave-level"],
    against: "ISO 9613-2:1996, whole path, worked apart",
    work: levels,
  }),
  tested<Flat>({
    ids: ["flat-T01-like-LA", "flat-T02-like-LA", "flat-T03-like-LA"],
    equations: ["octave-level", "a-weighted-sum"],
    against: "ISO 9613-2:1996, whole path, worked apart",
    work: (flat) => levelA(levels(flat)),
  }),
];
