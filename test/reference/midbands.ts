/** Exact base-ten one-third-octave midband of a nominal frequency [Hz], ISO 266: 1000·10^(k/10). */
export function exactMidband(nominalHz: number): number {
  return 1000 * 10 ** (Math.round(10 * Math.log10(nominalHz / 1000)) / 10);
}

export const BANDS = [63, 125, 250, 500, 1000, 2000, 4000, 8000] as const;

/** [read] IEC 61672-1:2013, Table 3, as printed. */
export const PRINTED_A = [-26.2, -16.1, -8.6, -3.2, 0, 1.2, 1.0, -1.1] as const;
export const PRINTED_C = [-0.8, -0.2, 0, 0, 0, -0.2, -0.8, -3.0] as const;
