import fc from "fast-check";
import { describe, expect, test } from "vitest";
import type { Bands } from "../../compute/acoustics/bands.ts";
import { BANDS_HZ, inOrder, perBand } from "../../compute/acoustics/bands.ts";
import type { Obstacle } from "../../compute/acoustics/obstacles/obstacle.ts";
import type { PathTerms } from "../../compute/acoustics/path-terms.ts";
import type { PointSource, Receptor } from "../../compute/acoustics/propagate.ts";
import { propagate } from "../../compute/acoustics/propagate.ts";
import type { Site } from "../../compute/acoustics/site.ts";
import { aWeighted } from "../../compute/acoustics/sound-power.ts";
import { sumOfPaths } from "../../compute/acoustics/sum-of-paths.ts";
import { silently } from "../../compute/equations/working.ts";
import { expectCheckValue } from "../helpers/check-value.ts";
import { block, receptorAt as point, siteOf as site, sourceAt as source, surface, wall } from "../helpers/site-of.ts";

const nothing = perBand(() => 0);
const levelAt = (place: Site, from: PointSource, to: Receptor) => {
  const { paths, planM } = propagate(silently, place, from, to);
  return sumOfPaths(silently, place, paths, from, to, planM).levelDba;
};
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
    expect(paths.map(({ kind }) => kind)).toEqual(["direct"]);
    expectCheckValue(`flat-${name}-like-bands`, inOrder(paths[0]?.levelDb ?? nothing));
    expectCheckValue(`flat-${name}-like-LA`, levelAt(flat, source(10, 10, 1, 93), point(200, 50, 4)));
  });
});

describe("over the wall of the check values", () => {
  // The rows know the way over the top only; the ends of this wall lie 400 m off, so the ways round them are set aside.
  const long = wall(3, [10, -400], [10, 400]);
  const S = source(0, 0, 1.5);
  const R = point(40, 0, 1.5);
  const over = (groundFactor: number, reading: Site["method"]["screenOverHardGround"]) => {
    const { paths } = propagate(silently, site(groundFactor, [long], { screenOverHardGround: reading }), S, R);
    const [top] = paths;
    if (top?.kind !== "over") throw new Error("the first path goes over the top");
    return { screenDb: inOrder(top.screenDb), levelDb: perBand((bandHz) => top.levelDb[bandHz] + top.capDb[bandHz]) };
  };
  test.each([0, 0.5, 1])("check values of the chain, G = %d", (groundFactor) => {
    expectCheckValue(`chain-G${groundFactor}-LA-open`, levelAt(site(groundFactor), S, R));
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
    expect(paths.map(({ kind }) => kind)).toEqual(["over", "left", "right"]);
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
            site(groundFactor, screens, { screenOverHardGround: literal ? "literal" : "conservative" }),
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

describe("over a body with two edges", () => {
  test("check values of the wall 5 m thick", () => {
    // bar-dz-double: both ways round lie 400 m off.
    const thick = block(3, [10, -400], [15, -400], [15, 400], [10, 400]);
    const [top] = propagate(silently, site(0, [thick]), source(0, 0, 1.5), point(45, 0, 1.5)).paths;
    expectCheckValue("bar-dz-double", inOrder(top?.screenDb ?? nothing));
  });
});

describe("sound through a screen", () => {
  // [derived] Through it the level is the unscreened one less its sound reduction: divergence, air and ground stay.
  const throughDb: Bands = { 63: 5, 125: 9, 250: 12, 500: 16, 1000: 20, 2000: 24, 4000: 27, 8000: 30 };
  const thin: Obstacle = { ...wall(3, [10, -400], [10, 400]), throughDb };
  const [S, R] = [source(0, 0, 1.5), point(40, 0, 1.5)];
  test("is a path of its own with the screen's sound reduction", () => {
    const { paths } = propagate(silently, site(0, [thin]), S, R);
    const through = paths.find(({ kind }) => kind === "through");
    expect(through?.past).toEqual(["wall"]);
    expect(through?.screenDb).toEqual(throughDb);
  });
  test("adds to what bends over: at 2 kHz 12.76 dB over the top and 24 dB through leave 12.45 dB", () => {
    // [derived] −10 lg(10^−1.2761233 + 10^−2.4) = 12.4464; the ways round, 400 m off, are left out of the sum.
    const { paths } = propagate(silently, site(0, [thin]), S, R);
    const [open] = propagate(silently, site(0), S, R).paths;
    const kept = paths.filter(({ kind }) => kind === "over" || kind === "through");
    const levelDb = 10 * Math.log10(kept.reduce((sum, path) => sum + 10 ** (0.1 * path.levelDb[2000]), 0));
    expect((open?.levelDb[2000] ?? 0) - levelDb).toBeCloseTo(12.4464, 3);
  });
  test("bends over what else stands in the line", () => {
    const behind = { ...wall(3, [20, -400], [20, 400]), id: "behind" };
    const { paths } = propagate(silently, site(0, [thin, behind]), S, R);
    const through = paths.find(({ kind }) => kind === "through");
    expect(through?.past).toEqual(["wall", "behind"]);
    // [derived] z over the second alone: 2·√402.25 − 40 = 0.1123422 m; Kmet = exp(−√(402.25·40/(2·0.1123422))/2000) = 0.874760;
    // Dz at 1 kHz = 10 lg(3 + 20/0.34·0.1123422·0.874760) = 9.4353; with the panel 29.4353.
    expect(through?.screenDb[1000]).toBeCloseTo(29.4353, 3);
  });
  test("a thick panel with another screen behind is worked out too", () => {
    // [derived] 60 dB of panel and, at 8 kHz, the 20 dB that one edge is credited with at most.
    const thick: Obstacle = { ...wall(6, [10, -400], [10, 400]), throughDb: perBand(() => 60) };
    const behind = { ...wall(6, [20, -400], [20, 400]), id: "behind" };
    const through = propagate(silently, site(0, [thick, behind]), S, R).paths.find(({ kind }) => kind === "through");
    expect(through?.screenDb[8000]).toBeCloseTo(80, 9);
  });
  test("in a band in which its screen is too narrow to count is no path of its own", () => {
    // [derived] 2 m wide counts from 250 Hz on (1.36 m); a wide one behind counts in every band.
    const narrow: Obstacle = { ...wall(3, [10, -1], [10, 1]), throughDb };
    const behind = { ...wall(3, [20, -400], [20, 400]), id: "behind" };
    const { paths } = propagate(silently, site(0, [narrow, behind]), S, R);
    const alone = propagate(silently, site(0, [behind]), S, R).paths;
    expect(together(paths)[125]).toBeCloseTo(together(alone)[125], 9);
  });
  test("a screen that sight passes above lets nothing through that is not counted already", () => {
    const low = { ...thin, edges: wall(1, [10, -400], [10, 400]).edges };
    expect(propagate(silently, site(0, [low]), S, R).paths.some(({ kind }) => kind === "through")).toBe(false);
  });
});

describe("a house corner that only just cuts the line behind a long hoarding", () => {
  test("takes no more than 10 lg 3 off: sound passes over the hoarding and round the corner", () => {
    const hoarding = { ...wall(2.4, [5, -100], [5, 100]), id: "hoarding" };
    const house = { ...block(8, [30, -30], [40, -30], [40, 0.001], [30, 0.001]), id: "house" };
    const [S, R] = [source(0, 0, 1.5), point(60, 0, 1.5)];
    const alone = together(propagate(silently, site(0, [hoarding]), S, R).paths);
    const { paths } = propagate(silently, site(0, [hoarding, house]), S, R);
    const both = together(paths);
    for (const bandHz of BANDS_HZ) {
      expect(alone[bandHz] - both[bandHz]).toBeGreaterThan(0);
      expect(alone[bandHz] - both[bandHz]).toBeLessThan(4.78);
    }
    const corner = paths.find(({ kind, past }) => kind === "left-then-over" && past[0] === "house");
    expect(corner?.past).toEqual(["house", "hoarding"]);
    // [derived] At 1 kHz round the corner 10 lg 3 = 4.7712 dB, over the hoarding z = √(25 + 0.81) + √(3025 + 0.81) − 60 = 0.0877175 m,
    // Kmet = exp(−√(5.080354·55.007363·60/(2·0.0877175))/2000) = 0.856777, Dz = 10 lg(3 + 20/0.34·0.0877175·0.856777) = 8.7045.
    expect(corner?.screenDb[1000]).toBeCloseTo(13.4757, 3);
  });
});

describe("from a pit past a screen", () => {
  const rim: Obstacle = { ...wall(0, [5, -400], [5, 400]), id: "rim", kind: "excavation", corners: [] };
  const [S, R] = [source(0, 0, 1.5, 100, -3), point(40, 0, 1.5)];
  test("the ways round the screen bend over the rim too", () => {
    // [derived] Round, z = √(4·416 + 9) − √1609 = 0.789981 m, Dz at 1 kHz 16.9434 dB; over the rim z = √27.25 + √1227.25 − √1609
    // = 0.139939 m, Kmet = 0.922243, Dz 10.2496 dB; over hard ground both count whole.
    const { paths } = propagate(silently, site(0, [rim, wall(4, [20, -4], [20, 4])]), S, R);
    const left = paths.find(({ kind }) => kind === "left");
    expect(left?.past).toEqual(["wall", "rim"]);
    expect(left?.screenDb[1000]).toBeCloseTo(27.193, 3);
  });
  test("in a band in which the screen does not count only the way over the rim is left", () => {
    // [derived] 4 m wide: below the 5.4 m of 63 Hz, above the 2.72 m of 125 Hz.
    const narrow: Obstacle = { ...wall(4, [20, -2], [20, 2]), throughDb: perBand(() => 20) };
    const { paths } = propagate(silently, site(0, [rim, narrow]), S, R);
    const alone = propagate(silently, site(0, [rim]), S, R).paths;
    expect(paths.map(({ kind }) => kind)).toEqual(["over", "left", "right", "through"]);
    expect(together(paths)[63]).toBeCloseTo(alone[0]?.levelDb[63] ?? Number.NaN, 9);
    expect(together(paths)[125]).toBeLessThan((alone[0]?.levelDb[125] ?? Number.NaN) - 1);
  });
});

describe("a reflection", () => {
  const [S, R] = [source(0, 0, 1.5), point(40, 0, 1.5)];
  const beside = surface(10, [-100, 20], [140, 20]);
  test("comes from the mirrored source: 56.57 m by way of a wall 20 m beside the line", () => {
    // [derived] √(40² + 40²) = 56.5685 m, divergence 20 lg 56.5685 + 11 = 46.0515 dB.
    const { paths } = propagate(silently, site(0, [], {}, [beside]), S, R);
    expect(paths.map(({ kind }) => kind)).toEqual(["direct", "reflected"]);
    expect(paths[1]?.distanceM).toBeCloseTo(56.5685, 4);
    expect(paths[1]?.divergenceDb).toBeCloseTo(46.0515, 4);
    expect(paths[1]?.reflectionDb[1000]).toBe(0);
  });
  test("loses 10 lg ρ: 0.97 dB at ρ = 0.8", () => {
    const soft = { ...beside, reflection: perBand(() => 0.8) };
    const reflected = propagate(silently, site(0, [], {}, [soft]), S, R).paths[1];
    expect(reflected?.reflectionDb[1000]).toBeCloseTo(0.9691, 4);
  });
  test("with ρ up to 0.2 does not count", () => {
    const dull = { ...beside, reflection: perBand(() => 0.2) };
    expect(propagate(silently, site(0, [], {}, [dull]), S, R).paths).toHaveLength(1);
  });
  test("counts in a band only from surfaces large enough: 3.69 m at 500 Hz, 20 m there and 20 m back, square on", () => {
    // [derived] dossier 3.9: √(2·0.68·20·20/40) = 3.688 m. Source and receptor point 0.02 m apart in plan see the wall square on.
    const near = point(0.02, 0, 1.5);
    const bands = (heightM: number) => {
      const small = surface(heightM, [-50, 20], [50, 20]);
      const { paths } = propagate(silently, site(0, [], {}, [small]), S, near);
      return BANDS_HZ.filter((bandHz) => paths[1] && paths[1].reflectionDb[bandHz] < 300);
    };
    expect(bands(3.7)).toEqual([500, 1000, 2000, 4000, 8000]);
    expect(bands(3.68)).toEqual([1000, 2000, 4000, 8000]);
  });
  test("a band in which it does not count adds nothing", () => {
    const small = surface(2, [-50, 20], [50, 20]);
    const { paths } = propagate(silently, site(0, [], {}, [small]), S, R);
    expect(10 ** (0.1 * (paths[1]?.levelDb[63] ?? 0))).toBeLessThan(1e-20);
  });
  test("comes off the outer side of a wall only", () => {
    const outside = { ...beside, reflects: "left" as const };
    expect(propagate(silently, site(0, [], {}, [outside]), S, R).paths).toHaveLength(1);
    const turned = { ...outside, from: beside.to, to: beside.from };
    expect(propagate(silently, site(0, [], {}, [turned]), S, R).paths).toHaveLength(2);
  });
  test("bends over another wing of the same building", () => {
    // [derived] The wing crosses the first leg (0, 0)–(20, 20) square at (10, 10), 14.142136 m from the source, top at 6 m:
    // √(200 + 4.5²) + √(1800 + 4.5²) − √3200 = 0.936668 m.
    const wing = { ...wall(6, [5, 15], [15, 5]), id: "surface" };
    const reflected = propagate(silently, site(0, [wing], {}, [beside]), S, R).paths[1];
    expect(reflected?.past).toEqual(["surface", "surface"]);
    expect(reflected?.pathDifferenceM).toBeCloseTo(0.936668, 4);
  });
  test("is worked out a long way off too, all but along the wall, past a screen and in bands that do not count", () => {
    // 1 m off a wall 2.5 km long the angle of incidence is 89.95°; at 8 kHz the air takes some 290 dB.
    const long = surface(2, [-100, 1], [5000, 1]);
    const across = wall(4, [2, -3], [2, 0.9]);
    const { paths } = propagate(silently, site(0, [across], {}, [long]), S, point(2500, 0, 1.5));
    expect(paths.filter(({ kind }) => kind === "reflected").every(({ levelDb }) => levelDb[8000] < -150)).toBe(true);
  });
  test("needs a place on the surface: beside its end or above it there is none", () => {
    expect(propagate(silently, site(0, [], {}, [surface(10, [21, 20], [140, 20])]), S, R).paths).toHaveLength(1);
    expect(propagate(silently, site(0, [], {}, [surface(1, [-50, 20], [140, 20])]), S, R).paths).toHaveLength(1);
  });
  test("from the receptor's own facade is left out; that of another building counts", () => {
    const own = { ...R, facadeOf: "surface" };
    expect(propagate(silently, site(0, [], {}, [beside]), S, own).paths).toHaveLength(1);
    const other = { ...R, facadeOf: "elsewhere" };
    expect(propagate(silently, site(0, [], {}, [beside]), S, other).paths).toHaveLength(2);
  });
  test("bends over what stands on its way, before the surface or behind it", () => {
    // [derived] The reflected line runs (0, 0)–(20, 20)–(40, 0); a wall across either leg, not across the straight line.
    const before = wall(4, [4, 16], [16, 4]);
    const behind = wall(4, [24, 4], [36, 16]);
    for (const across of [before, behind]) {
      const { paths } = propagate(silently, site(0, [across], {}, [beside]), S, R);
      const reflected = paths.find(({ kind }) => kind === "reflected");
      expect(paths[0]?.kind).toBe("direct");
      expect(reflected?.past).toEqual(["surface", "wall"]);
      // Square to the leg, 10·√2 m from the source's or the receptor point's end: √(200 + 2.5²) + √(1800 + 2.5²) − √3200 = 0.29286 m.
      expect(reflected?.pathDifferenceM).toBeCloseTo(0.29286, 4);
    }
  });
  test("takes the ground along its own way", () => {
    // [derived] Grass beyond y = 10: half of both legs, so of all three regions of the reflected line the middle is all grass.
    const grass = [-100, 140]
      .map((xM) => [
        { xM, yM: 10 },
        { xM, yM: 30 },
      ])
      .flatMap(([a, b], index) => (index === 0 ? [a, b] : [b, a]));
    const outline = grass as { xM: number; yM: number }[];
    const place = site(0, [], {}, [beside], [{ outline, groundFactor: 1 }]);
    const low = propagate(silently, place, source(0, 0, 0.3), point(40, 0, 0.3));
    expect(low.groundFactors).toEqual({ source: 0, middle: 0, receptor: 0 });
    // Middle region from 9 to 47.57 m of 56.57 m: grass from 14.142 to 42.426 m, a share of 28.284/38.569 = 0.73334;
    // q = 1 − 18/56.5685 = 0.68180; at 1 kHz −3·0.68180·(1 − 0.73334) = −0.54543, with −1.5 at each end −3.54543 dB.
    expect(low.paths[1]?.groundDb[1000]).toBeCloseTo(-3.54543, 4);
  });
});

describe("the alternative ground method", () => {
  test("takes eq. (10) with the solid-angle index of eq. (11)", () => {
    // [derived] d = 200 m, both ends 2 m high: hm = 2 m, Agr = 4.8 − (4/200)(17 + 1.5) = 4.43 dB; DΩ = 10 lg(1 + 40000/40016) = 3.00943 dB.
    const [direct] = propagate(
      silently,
      site(1, [], { ground: "alternative" }),
      source(0, 0, 2),
      point(200, 0, 2),
    ).paths;
    expect(direct?.groundDb[63]).toBeCloseTo(4.43, 9);
    expect(direct?.groundDb[8000]).toBeCloseTo(4.43, 9);
    expect(direct?.directivityDb).toBeCloseTo(3.00943, 4);
  });
});

describe("the meteorological correction", () => {
  test("takes C0·(1 − 10(hs + hr)/dp) off the A-weighted level", () => {
    // [derived] dossier 3.10: C0 = 2, hs + hr = 3 m: 1.4 dB at 100 m, nothing up to 30 m.
    const [S, R] = [source(0, 0, 1.5), (xM: number) => point(xM, 0, 1.5)];
    const difference = (xM: number) => levelAt(site(0), S, R(xM)) - levelAt(site(0, [], { c0Db: 2 }), S, R(xM));
    expect(difference(100)).toBeCloseTo(1.4, 9);
    expect(difference(30)).toBeCloseTo(0, 9);
  });
});
