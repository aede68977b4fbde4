/** Nominal octave bands a level is worked out in [Hz] (ISO 9613-2:1996, clause 1). */
export const BANDS_HZ = [63, 125, 250, 500, 1000, 2000, 4000, 8000] as const;
export type BandHz = (typeof BANDS_HZ)[number];

/** One value per octave band, keyed by its nominal midband frequency. */
export type Bands = Readonly<Record<BandHz, number>>;

/** A-weights per octave band as printed [dB] (IEC 61672-1:2013, Table 3). */
export const A_WEIGHTS_DB: Bands = {
  63: -26.2,
  125: -16.1,
  250: -8.6,
  500: -3.2,
  1000: 0,
  2000: 1.2,
  4000: 1.0,
  8000: -1.1,
};

/** Exact base-ten midband frequency of an octave band [Hz], used for air absorption (ISO 266). */
export function exactMidbandHz(bandHz: BandHz): number {
  return 1000 * 10 ** (0.3 * (BANDS_HZ.indexOf(bandHz) - 4));
}

/** One value per band from a function of the band. */
export function perBand(value: (bandHz: BandHz) => number): Bands {
  return Object.fromEntries(BANDS_HZ.map((bandHz) => [bandHz, value(bandHz)])) as Record<BandHz, number>;
}

/** The values in the order of the bands, for sums and tables. */
export function inOrder(bands: Bands): readonly number[] {
  return BANDS_HZ.map((bandHz) => bands[bandHz]);
}
