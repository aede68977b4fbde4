/** Any level or band level. Behind long air paths levels lie far below hearing; the lower end keeps their energy above zero. */
export const anyLevel = { unit: "dB", min: -1500, max: 200 } as const;

/** Levels at a work place. */
export const exposureLevel = { unit: "dB", min: 0, max: 140 } as const;

/** Octave bands of ISO 9613-2 by their nominal midband frequency. */
export const octaveBand = {
  unit: "Hz",
  min: 63,
  max: 8000,
  oneOf: [63, 125, 250, 500, 1000, 2000, 4000, 8000],
  decimals: 0,
} as const;

/** Distances of a sound path. ISO 9613-2 makes no claim of accuracy beyond 1000 m: pages say so. */
export const pathLength = { unit: "m", min: 0, aboveMin: true, max: 10000 } as const;

/** Heights above local ground. */
export const height = { unit: "m", min: 0, max: 200 } as const;

/** Ground factor: 0 hard, 1 porous. */
export const groundFactor = { unit: "1", min: 0, max: 1 } as const;

/** Sound reduction index of a panel, a door or (0) a gap. */
export const reductionIndex = { unit: "dB", min: 0, max: 99 } as const;
