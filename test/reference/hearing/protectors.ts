import { equations } from "../../../compute/equations/registry.ts";
import { PRINTED_A, PRINTED_C } from "../midbands.ts";
import { leftOut, type RowGroup, tested } from "../row.ts";

const octave = (levelsDb: readonly number[], assumedProtectionDb: readonly number[]) =>
  equations["protection-octave"].of({ levelsDb, assumedProtectionDb });
const unweighted = (levels: readonly number[]) => levels.map((level, i) => level - (PRINTED_A[i] as number));
const total = (levelsDb: readonly number[], weightsDb: readonly number[]) =>
  equations["a-weighted-sum"].of({ levelsDb, weightsDb });
const hml = (LA: number, LC: number, H: number, M: number, L: number) =>
  equations["protection-hml"].of({ levelDba: LA, levelDbc: LC, highDb: H, mediumDb: M, lowDb: L });

/** [memory] ISO 4869-2, reference noises: A-weighted octave levels 63 to 8000 Hz, each 100 dB(A), and d. */
const NOISES: readonly (readonly [d: number, levels: readonly number[]])[] = [
  [-1.2, [51.4, 62.6, 70.8, 81.0, 90.4, 96.2, 94.7, 92.3]],
  [-0.49, [59.5, 68.9, 78.3, 84.3, 92.8, 96.3, 94.0, 90.0]],
  [0.14, [59.8, 71.1, 80.8, 88.0, 95.0, 94.4, 94.1, 89.0]],
  [1.56, [65.4, 77.2, 84.5, 89.8, 95.5, 94.3, 92.5, 88.8]],
  [-2.98, [65.3, 77.4, 86.5, 92.5, 96.4, 93.0, 90.4, 83.7]],
  [-1.01, [70.7, 82.0, 89.3, 93.3, 95.6, 93.0, 90.1, 83.0]],
  [0.85, [75.6, 84.2, 90.1, 93.6, 96.2, 91.3, 87.9, 81.9]],
  [3.14, [77.6, 88.0, 93.4, 93.8, 94.2, 91.4, 87.9, 79.9]],
];
/** [derived] A-weighted octave levels of pink noise of 100 dB(C). */
const PINK = [65.3, 75.4, 82.9, 88.3, 91.5, 92.7, 92.5, 90.4];

const rating = (noises: typeof NOISES, factor: number) => {
  return ({ APV_63_8k }: { APV_63_8k: number[] }) => {
    const reductions = noises.map(([, levels]) => 100 - octave(unweighted(levels), APV_63_8k));
    return noises.reduce((sum, [d], i) => sum + (0.25 + factor * d) * (reductions[i] as number), 0);
  };
};
const snr = ({ APV_63_8k }: { APV_63_8k: number[] }) => 100 - octave(unweighted(PINK), APV_63_8k);
const recollected = "ISO 4869-2 ratings, from memory and self-consistent";

export const protectorRows: readonly RowGroup[] = [
  tested<{ LA: number; LC: number; H: number; M: number; L: number; margin?: number }>({
    ids: ["hml-manual", "hml-faq"],
    equations: ["protection-hml"],
    against: "worked examples of a meter manual and a supplier",
    note: "where a margin is stated it is added to the result",
    work: ({ LA, LC, H, M, L, margin }) => hml(LA, LC, H, M, L) + (margin ?? 0),
  }),
  tested<{ LC: number; SNR: number; margin: number }>({
    ids: ["snr-faq"],
    equations: ["protection-snr"],
    against: "worked example of a supplier",
    work: ({ LC, SNR, margin }) => equations["protection-snr"].of({ levelDbc: LC, snrDb: SNR }) + margin,
  }),
  tested<{ Lf: number[]; APV: number[] }>({
    ids: ["oct-faq"],
    equations: ["protection-octave"],
    against: "worked examples of a meter manual and a supplier",
    note: "the page says that 4 dB were added; its 86.9 holds none",
    work: ({ Lf, APV }) => octave(Lf, APV),
  }),
  tested<{ LA_bands_63_8k: number[]; APV: number[] }>({
    ids: ["oct-manual"],
    equations: ["protection-octave"],
    against: "worked examples of a meter manual and a supplier",
    note: "bands given A-weighted; the result is printed as a whole dB",
    work: ({ LA_bands_63_8k, APV }) => octave(unweighted(LA_bands_63_8k), APV),
  }),
  leftOut("NRR, its derating and dual protection are not offered: SNR and NRR are different tests", [
    ...["wa-single-95", "wa-dual-100", "wa-single-90", "wa-dual-105", "osha-nrr-A", "osha-nrr-C", "osha-nrr-dual-C"],
    ...["osha-nrr-derated", "niosh-derate-muff", "niosh-derate-foam-plug", "niosh-derate-other-plug"],
  ]),
  tested<{ APV_63_8k: number[] }>({
    ids: ["iso4869-muff-H", "iso4869-plug-H"],
    equations: ["protection-octave"],
    against: recollected,
    work: rating(NOISES.slice(0, 4), -0.48),
  }),
  tested<{ APV_63_8k: number[] }>({
    ids: ["iso4869-muff-M", "iso4869-plug-M"],
    equations: ["protection-octave"],
    against: recollected,
    work: rating(NOISES.slice(4), -0.16),
  }),
  tested<{ APV_63_8k: number[] }>({
    ids: ["iso4869-muff-L", "iso4869-plug-L"],
    equations: ["protection-octave"],
    against: recollected,
    work: rating(NOISES.slice(4), 0.23),
  }),
  tested<{ APV_63_8k: number[] }>({
    ids: ["iso4869-muff-SNR", "iso4869-plug-SNR", "iso4869-flat20-SNR"],
    equations: ["protection-octave"],
    against: "SNR from pink noise, worked apart",
    work: snr,
  }),
  tested<{ Lf: number[] }>({
    ids: ["sel-LA"],
    equations: ["a-weighted-sum"],
    against: "example spectrum, worked apart",
    work: ({ Lf }) => total(Lf, PRINTED_A),
  }),
  tested<{ Lf: number[] }>({
    ids: ["sel-LC"],
    equations: ["a-weighted-sum"],
    against: "example spectrum, worked apart",
    note: "with the printed C-weights",
    work: ({ Lf }) => total(Lf, PRINTED_C),
  }),
  tested<{ Lf: number[]; APV: number[] }>({
    ids: ["sel-oct"],
    equations: ["protection-octave"],
    against: "example spectrum, worked apart",
    work: ({ Lf, APV }) => octave(Lf, APV),
  }),
  tested<{ LA: number; LC: number; H: number; M: number; L: number }>({
    ids: ["sel-hml"],
    equations: ["protection-hml"],
    against: "example spectrum, worked apart",
    work: ({ LA, LC, H, M, L }) => hml(LA, LC, H, M, L),
  }),
  tested<{ LC: number; SNR: number }>({
    ids: ["sel-snr"],
    equations: ["protection-snr"],
    against: "example spectrum, worked apart",
    work: ({ LC, SNR }) => equations["protection-snr"].of({ levelDbc: LC, snrDb: SNR }),
  }),
  tested<{ P_dB: number; fraction: number }>({
    ids: ["wear-30-50", "wear-30-90", "wear-30-95", "wear-30-99", "wear-20-90", "wear-20-50"],
    equations: ["wearing-time"],
    against: "energies added by hand",
    work: ({ P_dB, fraction }) => equations["wearing-time"].of({ protectionDb: P_dB, wornPct: 100 * fraction }),
  }),
  leftOut("the German practice deductions come with the duty set, not as an equation", [
    "dguv-98-27-9",
    "dguv-98-27-5",
    "dguv-92-20-5",
  ]),
];
