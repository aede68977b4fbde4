import { equations } from "../../../compute/equations/registry.ts";
import { BANDS } from "../midbands.ts";
import { leftOut, type RowGroup, tested } from "../row.ts";
import { bandLevels, groundOf, levelA, type Scene } from "./path.ts";
import { diffraction, double, type Edge, edgeOf, metFactor, single, topEdge, type Wall } from "./screen-geometry.ts";

const byHand = "ISO 9613-2:1996, 7.4, worked apart";
const overWall = (wall: Wall) => {
  const edge = topEdge(wall);
  return diffraction(edge, 20, metFactor(edge), 20, single);
};

type Chain = Wall & { G: number; t_C: number; RH_pct: number; Lw_dB_each_band: number };
const sceneOf = (chain: Chain): Scene => ({
  powerDb: chain.Lw_dB_each_band,
  planDistanceM: chain.source_to_barrier_m + chain.barrier_to_receiver_m,
  sourceHeightM: chain.hs_m,
  receptorHeightM: chain.hr_m,
  ground: chain.G,
  temperatureC: chain.t_C,
  humidityPct: chain.RH_pct,
});
const screenTerm = (chain: Chain, id: "screen-over-top" | "screen-over-top-literal") => (bandHz: number) =>
  equations[id].of({ diffractionDb: overWall(chain)(bandHz), groundDb: groundOf(sceneOf(chain), bandHz) });
const grounds = ["G0", "G0.5", "G1"];

export const screenRows: readonly RowGroup[] = [
  tested<Wall>({
    ids: ["bar-z"],
    equations: ["path-difference"],
    against: byHand,
    work: (wall) => topEdge(wall).pathDifferenceM,
  }),
  tested<Wall>({
    ids: ["bar-kmet"],
    equations: ["screen-met-factor"],
    against: byHand,
    work: (wall) => metFactor(topEdge(wall)),
  }),
  tested<Wall>({
    ids: ["bar-dz-single"],
    equations: ["screen-attenuation"],
    against: byHand,
    work: (wall) => BANDS.map(overWall(wall)),
  }),
  tested<Wall>({
    ids: ["bar-dz-c2-40"],
    equations: ["screen-attenuation"],
    against: byHand,
    work: (wall) => BANDS.map(diffraction(topEdge(wall), 40, metFactor(topEdge(wall)), 20, single)),
  }),
  tested<{ z_m: number }>({
    ids: ["bar-grazing"],
    equations: ["screen-attenuation"],
    against: "ISO 9613-2:1996, eq. (14), by hand",
    work: ({ z_m }) =>
      equations["screen-attenuation"].of({
        bandHz: 500,
        pathDifferenceM: z_m,
        groundConstant: 20,
        edgeFactor: 1,
        metFactor: 1,
        capDb: 20,
      }),
  }),
  tested<{ z_m: number; f_Hz: number; e_m?: number }>({
    ids: ["bar-cap-single", "bar-cap-double"],
    equations: ["screen-attenuation"],
    against: "ISO 9613-2:1996, 7.4, caps",
    work: ({ z_m, f_Hz, e_m }) =>
      equations["screen-attenuation"].of({
        bandHz: f_Hz,
        pathDifferenceM: z_m,
        groundConstant: 20,
        edgeFactor: e_m ? double(e_m)(f_Hz) : 1,
        metFactor: 1,
        capDb: e_m ? 25 : 20,
      }),
  }),
  tested<{ e_m: number }>({
    ids: ["bar-c3"],
    equations: ["double-edge-factor"],
    against: byHand,
    work: ({ e_m }) => BANDS.map(double(e_m)),
  }),
  tested<Wall & { e_m: number }>({
    ids: ["bar-dz-double"],
    equations: ["screen-attenuation"],
    against: byHand,
    note: "a body 5 m thick: the second edge 15 m, the receptor 45 m from the source",
    work: (wall) => BANDS.map(diffraction(thickEdge(wall), 20, metFactor(thickEdge(wall)), 25, double(wall.e_m))),
  }),
  tested<Chain>({
    ids: grounds.map((ground) => `chain-${ground}-abar12`),
    equations: ["screen-over-top-literal"],
    against: byHand,
    work: (chain) => BANDS.map(screenTerm(chain, "screen-over-top-literal")),
  }),
  tested<Chain>({
    ids: grounds.map((ground) => `chain-${ground}-abarmax`),
    equations: ["screen-over-top"],
    against: byHand,
    work: (chain) => BANDS.map(screenTerm(chain, "screen-over-top")),
  }),
  tested<Chain>({
    ids: grounds.map((ground) => `chain-${ground}-LA-open`),
    equations: ["octave-level", "a-weighted-sum"],
    against: "ISO 9613-2:1996, whole path, worked apart",
    work: (chain) => levelA(bandLevels(sceneOf(chain), () => 0)),
  }),
  tested<Chain>({
    ids: grounds.map((ground) => `chain-${ground}-LA-bar12`),
    equations: ["octave-level", "a-weighted-sum"],
    against: "ISO 9613-2:1996, whole path, worked apart",
    work: (chain) => levelA(bandLevels(sceneOf(chain), screenTerm(chain, "screen-over-top-literal"))),
  }),
  tested<Chain>({
    ids: grounds.map((ground) => `chain-${ground}-LA-barmax`),
    equations: ["octave-level", "a-weighted-sum"],
    against: "ISO 9613-2:1996, whole path, worked apart",
    work: (chain) => levelA(bandLevels(sceneOf(chain), screenTerm(chain, "screen-over-top"))),
  }),
  tested<Wall & { half_length_m: number }>({
    ids: ["bar-lateral-z"],
    equations: ["path-difference"],
    against: byHand,
    work: (wall) => sideEdge(wall).pathDifferenceM,
  }),
  tested<Wall & { half_length_m: number }>({
    ids: ["bar-finite"],
    equations: ["edges-combined"],
    against: byHand,
    work: (wall) =>
      BANDS.map((bandHz) => {
        const side = diffraction(sideEdge(wall), 20, 1, 20, single)(bandHz);
        return equations["edges-combined"].of({ lossesDb: [overWall(wall)(bandHz), side, side] });
      }),
  }),
  tested<{ IL_diffracted_dB: number; R_panel_dB: number }>({
    ids: ["bar-trans-15-25", "bar-trans-15-20", "bar-trans-15-15", "bar-trans-20-30", "bar-trans-10-20"],
    equations: ["through-and-over"],
    against: "energies added by hand",
    work: ({ IL_diffracted_dB, R_panel_dB }) =>
      equations["through-and-over"].of({ diffractedLossDb: IL_diffracted_dB, reductionIndexDb: R_panel_dB }),
  }),
  leftOut("the illuminated side is not offered: kurze-anderson holds for N ≥ 0", ["ka--0.1", "ka--0.05"]),
];

/** Both top edges of a body in the place of the wall, with the receptor as far behind it as before. */
function thickEdge(wall: Wall & { e_m: number }): Edge {
  const thin = topEdge(wall);
  const lengths = { ...thin, betweenEdgesM: wall.e_m, distanceM: thin.distanceM + wall.e_m };
  return {
    ...lengths,
    pathDifferenceM: equations["path-difference"].of({ ...lengths, alongEdgeM: 0, sightBlocked: 1 }),
  };
}

/** The end of a wall, seen from above. */
function sideEdge(wall: Wall & { half_length_m: number }) {
  const { source_to_barrier_m, barrier_to_receiver_m, half_length_m } = wall;
  return edgeOf([0, 0], [source_to_barrier_m, half_length_m], [source_to_barrier_m + barrier_to_receiver_m, 0]);
}
