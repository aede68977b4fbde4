import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { BANDS_HZ, inOrder, perBand } from "../../compute/acoustics/bands.ts";
import type { PathTerms, PointSource } from "../../compute/acoustics/propagate.ts";
import { propagate } from "../../compute/acoustics/propagate.ts";
import type { Point, Screen, Site } from "../../compute/acoustics/site.ts";
import { aWeighted } from "../../compute/acoustics/sound-power.ts";
import { sumOfPaths } from "../../compute/acoustics/sum-of-paths.ts";
import { silently } from "../../compute/equations/working.ts";
import { expectCheckValue } from "../helpers/check-value.ts";

const nothing = perBand(() => 0);
const source = (xM: number, yM: number, heightM: number, levelDb = 100): PointSource => ({
  at: { xM, yM },
  groundM: 0,
  heightM,
  powerDb: perBand(() => levelDb),
  controlLossDb: nothing,
});
const point = (xM: number, yM: number, heightM: number): Point => ({ at: { xM, yM }, groundM: 0, heightM });
const wall = (topM: number, ...line: readonly (readonly [number, number])[]): Screen => ({
  id: "wall",
  topM,
  line: line.map(([xM, yM]) => ({ xM, yM })),
});
const site = (
  groundFactor: number,
  screens: readonly Screen[] = [],
  reading: Site["screenOverHardGround"] = "conservative",
): Site => ({
  air: { temperatureC: 10, humidityPct: 70, pressureKpa: 101.325 },
  ground: { elsewhere: groundFactor, areas: [] },
  screens,
  screenOverHardGround: reading,
});
const together = (paths: readonly PathTerms[]) =>
  perBand((bandHz) => 10 * Math.log10(paths.reduce((sum, path) => sum + 10 ** (0.1 * path.levelDb[bandHz]), 0)));

describe("over flat ground without a screen", () => {
  // Source (10, 10, 1), receptor point (200, 50, 4), 93 dB in each octave, 20 °C, 70 %.
  test.each([
    ["T01", 0],
    ["T02", 0.5],
    ["T03", 1],
  ] as const)("check values of %s, G = %d", (name, groundFactor) => {
    const flat = { ...site(groundFactor), air: { temperatureC: 20, humidityPct: 70, pressureKpa: 101.325 } };
    const { paths } = propagate(silently, flat, source(10, 10, 1, 93), point(200, 50, 4));
    expect(paths.map(({ path }) => path)).toEqual(["direct"]);
    expectCheckValue(`flat-${name}-like-bands`, inOrder(paths[0]?.levelDb ?? nothing));
    expectCheckValue(`flat-${name}-like-LA`, sumOfPaths(silently, paths));
  });
});

describe("over the wall of the check values", () => {
  // The rows know the way over the top only; the ends of this wall lie 400 m off, so the ways round them are set aside.
  const long = wall(3, [10, -400], [10, 400]);
  const S = source(0, 0, 1.5);
  const R = point(40, 0, 1.5);
  const over = (groundFactor: number, reading: Site["screenOverHardGround"]) => {
    const { paths } = propagate(silently, site(groundFactor, [long], reading), S, R);
    const [top] = paths;
    if (top?.path !== "over") throw new Error("the first path goes over the top");
    return { screenDb: inOrder(top.screenDb), levelDb: perBand((bandHz) => top.levelDb[bandHz] + top.capDb[bandHz]) };
  };
  test.each([0, 0.5, 1])("check values of the chain, G = %d", (groundFactor) => {
    const { paths } = propagate(silently, site(groundFactor), S, R);
    expectCheckValue(`chain-G${groundFactor}-LA-open`, sumOfPaths(silently, paths));
    const literal = over(groundFactor, "literal");
    expectCheckValue(`chain-G${groundFactor}-abar12`, literal.screenDb);
    expectCheckValue(`chain-G${groundFactor}-LA-bar12`, aWeighted(silently, literal.levelDb, "over"));
    const conservative = over(groundFactor, "conservative");
    expectCheckValue(`chain-G${groundFactor}-abarmax`, conservative.screenDb);
    expectCheckValue(`chain-G${groundFactor}-LA-barmax`, aWeighted(silently, conservative.levelDb, "over"));
  });
  test("check values of the wall 20 m long: over and round both ends together", () => {
    const { paths } = propagate(silently, site(0, [wall(3, [10, -10], [10, 10])]), S, R);
    const [open] = propagate(silently, site(0), S, R).paths;
    const levelDb = together(paths);
    expect(paths.map(({ path }) => path)).toEqual(["over", "left", "right"]);
    expectCheckValue(
      "bar-finite",
      BANDS_HZ.map((bandHz) => (open?.levelDb[bandHz] ?? 0) - levelDb[bandHz]),
    );
  });
});

describe("a screen counts only in bands whose wavelength is shorter than its extent square to the line", () => {
  // [derived] ISO 9613-2:1996, 7.4: ll + lr > λ = 340/f: 5.397, 2.72, 1.36, 0.68, 0.34, 0.17, 0.085, 0.0425 m.
  const counts = (...line: readonly (readonly [number, number])[]) => {
    const R = point(40, 0, 1.5);
    const { paths } = propagate(silently, site(0, [wall(6, ...line)]), source(0, 0, 1.5), R);
    const levelDb = together(paths);
    const [open] = propagate(silently, site(0), source(0, 0, 1.5), R).paths;
    const lossDb = BANDS_HZ.map((bandHz) => (open?.levelDb[bandHz] ?? 0) - levelDb[bandHz]);
    return lossDb.map((loss) => (Math.abs(loss) < 1e-9 ? "open" : "screened"));
  };
  const from = (first: number) => BANDS_HZ.map((_, index) => (index < first ? "open" : "screened"));
  test("1.4 m: from 250 Hz; 1.3 m: from 500 Hz", () => {
    expect(counts([10, -0.7], [10, 0.7])).toEqual(from(2));
    expect(counts([10, -0.65], [10, 0.65])).toEqual(from(3));
  });
  test("an extent of just one wavelength does not count", () => {
    expect(counts([10, -1.36], [10, 1.36])).toEqual(from(2));
    expect(counts([10, -1.361], [10, 1.361])).toEqual(from(1));
  });
  test("a long screen almost along the line has a short extent", () => {
    expect(counts([5, -0.7], [35, 0.7])).toEqual(from(2));
  });
});

describe("a screen never raises a level", () => {
  const coordinate = fc.double({ min: -60, max: 60, noNaN: true });
  const height = fc.double({ min: 0.3, max: 12, noNaN: true });
  test("whatever the geometry and ground: together the paths stay at the unscreened level or below", () => {
    fc.assert(
      fc.property(
        coordinate,
        coordinate,
        height,
        height,
        fc.double({ min: 0.5, max: 9, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.boolean(),
        (y1, y2, hs, hr, topM, groundFactor, literal) => {
          const screens = [wall(topM, [10, y1], [12, y2])];
          const S = source(0, 0, hs);
          const R = point(50, 3, hr);
          const { paths } = propagate(
            silently,
            site(groundFactor, screens, literal ? "literal" : "conservative"),
            S,
            R,
          );
          const [open] = propagate(silently, site(groundFactor), S, R).paths;
          const levelDb = together(paths);
          for (const bandHz of BANDS_HZ) {
            expect(levelDb[bandHz]).toBeLessThanOrEqual((open?.levelDb[bandHz] ?? Number.NaN) + 1e-9);
            for (const path of paths) expect(path.capDb[bandHz]).toBeGreaterThanOrEqual(0);
          }
        },
      ),
      { numRuns: 200, seed: 9613 },
    );
  });
  test("what the paths would lie above it is taken off each of them alike", () => {
    // Over soft ground at 250 Hz the ground term is larger than the screen's (dossier 3.7): the top path loses nothing.
    const { paths } = propagate(
      silently,
      site(1, [wall(3, [10, -10], [10, 10])]),
      source(0, 0, 1.5),
      point(40, 0, 1.5),
    );
    const capsDb = paths.map((path) => path.capDb[250]);
    expect(paths[0]?.screenDb[250]).toBe(0);
    // [derived] Ways round: z = 5.764912 m, λ = 1.36 m: 10 lg(3 + 20·5.764912/1.36) = 19.433 dB each; 10 lg(1 + 2·10^−1.9433) = 0.0978.
    for (const capDb of capsDb) expect(capDb).toBeCloseTo(0.0978, 4);
  });
});

describe("of several screens", () => {
  const S = source(0, 0, 1.5);
  const R = point(40, 0, 1.5);
  const near = { ...wall(3, [5, -20], [5, 20]), id: "near" };
  const middle = { ...wall(3, [20, -20], [20, 20]), id: "middle" };
  const beside = { ...wall(9, [20, 5], [20, 20]), id: "beside" };
  const governing = (...screens: readonly Screen[]) => propagate(silently, site(0, screens), S, R).paths[0]?.screen;
  test("the one with the longest way over counts, in any order", () => {
    expect(governing(near, middle)).toBe("near");
    expect(governing(middle, near)).toBe("near");
    expect(governing({ ...middle, topM: 6 }, near)).toBe("middle");
  });
  test("one that the line passes beside does not count", () => {
    expect(governing(beside, middle)).toBe("middle");
    expect(governing(beside)).toBeUndefined();
  });
  test("one below the line of sight gives way to one that blocks it", () => {
    expect(governing({ ...near, topM: 0.5 }, middle)).toBe("middle");
  });
});

test("what a control at the machine takes off comes off every path", () => {
  const S = source(0, 0, 1.5);
  const R = point(40, 0, 1.5);
  const screens = [wall(3, [10, -10], [10, 10])];
  const bare = propagate(silently, site(0.5, screens), S, R).paths;
  const quiet = propagate(silently, site(0.5, screens), { ...S, controlLossDb: perBand(() => 7) }, R).paths;
  for (const [index, path] of quiet.entries()) {
    for (const bandHz of BANDS_HZ) expect(path.levelDb[bandHz]).toBeCloseTo((bare[index]?.levelDb[bandHz] ?? 0) - 7, 9);
  }
});

test("a source and a receptor point at the same place are refused", () => {
  expect(() => propagate(silently, site(0), source(0, 0, 1.5), point(0, 0, 1.5))).toThrowError(
    /^distanceM: expected .* above 0 .*, received 0/,
  );
});
