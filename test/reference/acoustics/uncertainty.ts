import { equations } from "../../../compute/equations/registry.ts";
import { leftOut, type RowGroup, tested } from "../row.ts";

interface Sum {
  readonly L_dB: number[];
  readonly u_dB: number[];
}
const sum = (levelsDb: readonly number[]) => equations["sum-levels"].of({ levelsDb });

/** Root of the sum of squares: each part as the source's own, what came before as the shared one. */
function rootOfSquares(parts: readonly number[]): number {
  return parts.reduce(
    (so_far, part) =>
      equations["level-uncertainty"].of({ levelsDb: [60], ownUncertaintiesDb: [part], sharedUncertaintyDb: so_far }),
    0,
  );
}

/** Normal random numbers from a fixed seed (mulberry32 and Box and Muller). */
function normals(seed: number): () => number {
  let state = seed;
  const uniform = () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  return () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform());
}

/** Mean, standard deviation and percentiles 2.5, 95, 97.5 of the sum of levels drawn at random. */
function drawn({ L_dB, u_dB }: Sum): readonly number[] {
  const draws = 400_000;
  const normal = normals(1993);
  const sums = Float64Array.from({ length: draws }, () =>
    sum(L_dB.map((level, i) => level + (u_dB[i] ?? 0) * normal())),
  ).sort();
  const mean = sums.reduce((total, value) => total + value, 0) / draws;
  const spread = Math.sqrt(sums.reduce((total, value) => total + (value - mean) ** 2, 0) / (draws - 1));
  return [mean, spread, ...[0.025, 0.95, 0.975].map((part) => sums[Math.floor(part * draws)] as number)];
}

export const uncertaintyRows: readonly RowGroup[] = [
  tested<{ c_u_dB: number[] }>({
    ids: ["unc-1996-2"],
    equations: ["level-uncertainty"],
    against: "ISO 1996-2, Annex G.2",
    work: ({ c_u_dB }) => rootOfSquares(c_u_dB),
  }),
  tested<{ sR0_dB: number; somc_dB: number; k: number }>({
    ids: ["unc-3745"],
    equations: ["level-uncertainty"],
    against: "ISO 3745:2012, 10.5",
    work: ({ sR0_dB, somc_dB, k }) => k * rootOfSquares([sR0_dB, somc_dB]),
  }),
  tested<Sum>({
    ids: ["unc-sum"],
    equations: ["level-uncertainty", "sum-levels"],
    against: "law of propagation, worked apart",
    work: ({ L_dB, u_dB }) => [
      sum(L_dB),
      equations["level-uncertainty"].of({ levelsDb: L_dB, ownUncertaintiesDb: u_dB, sharedUncertaintyDb: 0 }),
    ],
  }),
  tested<Sum>({
    ids: ["unc-sum-mc"],
    equations: [],
    against: "random draws of another program",
    note: "levels drawn at random and summed by sum-levels; the linear 1.760 dB lies within 1 % of the drawn spread",
    work: drawn,
  }),
  leftOut("a standard uncertainty times k is a product, no equation", ["unc-1996-2-U"]),
  leftOut("fully correlated sources with different uncertainties are not offered: what they share is one figure", [
    "unc-sum-corr",
  ]),
  leftOut("engines are not estimated from their horsepower: levels come from data sheets", ["engine-exhaust-base"]),
];
