import { describe, expect, test } from "vitest";
import { BANDS_HZ, inOrder, perBand } from "../../compute/acoustics/bands.ts";
import type { Emission } from "../../compute/acoustics/sound-power.ts";
import { aWeighted, soundPower } from "../../compute/acoustics/sound-power.ts";
import { recording, type Step, silently } from "../../compute/equations/working.ts";

const byBand = (...values: readonly number[]) => perBand((bandHz) => values[BANDS_HZ.indexOf(bandHz)] ?? Number.NaN);
const power = (level: Emission["level"], quantity: Emission["quantity"] = { kind: "sound-power" }) =>
  inOrder(soundPower(silently, { level, quantity }));
const expectBands = (actual: readonly number[], hand: readonly number[], decimals: number) => {
  expect(actual).toHaveLength(hand.length);
  for (const [band, value] of hand.entries()) expect(actual[band]).toBeCloseTo(value, decimals);
};
// [memory] dossier 8: one recollected code entry, whose A-weighted sum [derived] is 77.9 dB; used as a shape only.
const SHAPE = byBand(80, 83, 76, 73, 72, 70, 69, 66);

describe("octave bands", () => {
  test("of sound power, unweighted, are the sound power", () => {
    expect(power({ kind: "octave", weighting: "Z", bandsDb: SHAPE })).toEqual([80, 83, 76, 73, 72, 70, 69, 66]);
  });
  test("with A-weights lose them: 80 − (−26.2) and so on", () => {
    // [read] IEC 61672-1:2013, Table 3, by hand.
    expectBands(
      power({ kind: "octave", weighting: "A", bandsDb: SHAPE }),
      [106.2, 99.1, 84.6, 76.2, 72, 68.8, 68, 67.1],
      9,
    );
  });
});

describe("pressure at a distance", () => {
  const bandsDb = perBand(() => 80);
  const at = (distanceM: number, directivityFactor: 1 | 2): readonly number[] =>
    power({ kind: "octave", weighting: "Z", bandsDb }, { kind: "pressure-at-distance", distanceM, directivityFactor });
  test("10 m over hard ground: + 27.982 dB", () => {
    // [derived] dossier 1.3: LW = Lp + 10 lg(2π·10²), exact 27.982.
    expectBands(at(10, 2), Array(8).fill(107.982), 3);
  });
  test("10 m without ground: + 30.992 dB", () => {
    expectBands(at(10, 1), Array(8).fill(110.992), 3);
  });
  test("double the distance: + 6.021 dB", () => {
    expectBands(at(20, 2), Array(8).fill(107.982 + 6.021), 2);
    expectBands(at(1, 2), Array(8).fill(87.982), 3);
  });
});

describe("third-octave bands", () => {
  test("three equal ones make an octave 4.771 dB higher; the loudest decides", () => {
    // [derived] 10 lg 3 = 4.771; 10 lg(10^8 + 10^7 + 10^6) = 80.4532.
    const thirds = { 63: [80, 80, 80], 125: [80, 70, 60] } as const;
    const level = {
      kind: "third-octave",
      thirdsDb: {
        ...thirds,
        250: [0, 0, 0],
        500: [0, 0, 0],
        1000: [50, 40, 0],
        2000: [90, 90, 90],
        4000: [0, 0, 0],
        8000: [0, 0, 0],
      },
    } as const;
    const octaves = power(level);
    expect(octaves[0]).toBeCloseTo(84.771, 3);
    expect(octaves[1]).toBeCloseTo(80.4532, 4);
    expect(octaves[5]).toBeCloseTo(94.771, 3);
  });
});

describe("a single A-weighted level with a borrowed shape", () => {
  test("keeps the shape and meets the level", () => {
    // [derived] dossier 1.4: the shape sums to 77.9 dB(A), so 100 dB(A) lifts each band by 22.1 dB.
    const bands = power({ kind: "single", valueDba: 100, shapeDb: SHAPE });
    expectBands(
      bands,
      [80, 83, 76, 73, 72, 70, 69, 66].map((value) => value + 22.1),
      1,
    );
    expect(aWeighted(silently, byBand(...bands), "total")).toBeCloseTo(100, 9);
  });
  test("takes no heed of how loud the shape's lender is", () => {
    const quiet = power({ kind: "single", valueDba: 100, shapeDb: perBand((bandHz) => SHAPE[bandHz] - 40) });
    expectBands(quiet, power({ kind: "single", valueDba: 100, shapeDb: SHAPE }), 9);
  });
  test("at a distance: shape first, then sound power", () => {
    const level = { kind: "single", valueDba: 72.018, shapeDb: SHAPE } as const;
    const bands = power(level, { kind: "pressure-at-distance", distanceM: 10, directivityFactor: 2 });
    expect(aWeighted(silently, byBand(...bands), "total")).toBeCloseTo(100, 3);
  });
});

test("an A-weighted total of the recollected entry is 77.9 dB(A)", () => {
  // [derived] dossier 1.4, sum-A-spectrum.
  expect(aWeighted(silently, SHAPE, "total")).toBeCloseTo(77.9, 1);
});

test("what is worked out leaves steps with the band they belong to", () => {
  const steps: Step[] = [];
  soundPower(recording(steps), {
    level: { kind: "octave", weighting: "Z", bandsDb: SHAPE },
    quantity: { kind: "pressure-at-distance", distanceM: 10, directivityFactor: 2 },
  });
  expect(steps.map(({ at, term }) => [...at, term])).toEqual(
    BANDS_HZ.map((bandHz) => [`band:${bandHz}`, "power-of-pressure"]),
  );
});

test("a level out of its equation's range is refused with the range", () => {
  expect(() =>
    power(
      { kind: "octave", weighting: "Z", bandsDb: SHAPE },
      { kind: "pressure-at-distance", distanceM: 0, directivityFactor: 2 },
    ),
  ).toThrowError(/^distanceM: expected .*, received 0/);
});
