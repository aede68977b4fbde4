import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { BANDS_HZ, perBand } from "../../compute/acoustics/bands.ts";
import { enclosureInsertionLoss } from "../../compute/acoustics/enclosure.ts";
import type { Obstacle } from "../../compute/acoustics/obstacles/obstacle.ts";
import type { Receptor } from "../../compute/acoustics/propagate.ts";
import { propagate } from "../../compute/acoustics/propagate.ts";
import type { Method } from "../../compute/acoustics/site.ts";
import { silently } from "../../compute/equations/working.ts";
import { receptorAt, siteOf, sourceAt, wall } from "../helpers/site-of.ts";

// What must hold whatever the geometry, from the physics or from the form of ISO 9613-2:1996, not from worked numbers. Reflections
// are off and nothing passes through the screens.
const number = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const height = number(0.3, 10);
const share = number(0, 1);
const reading = fc.constantFrom<Method["screenOverHardGround"]>("conservative", "literal");

/** A screen somewhere between a source at (0, 0) and a receptor point at (60, 0). */
const screen = fc
  .record({ xM: number(2, 58), slantM: number(-15, 15), fromM: number(-40, 40), toM: number(-40, 40), topM: height })
  .map(({ xM, slantM, fromM, toM, topM }) => wall(topM, [xM, fromM], [xM + slantM, toM]));
const named = (screens: readonly Obstacle[]) => screens.map((each, index) => ({ ...each, id: `screen-${index}` }));

/** Levels per band over all paths. */
function levels(
  obstacles: readonly Obstacle[],
  groundFactor: number,
  sourceM: number,
  receptor: Receptor,
  screenOverHardGround: Method["screenOverHardGround"] = "conservative",
): readonly number[] {
  const site = siteOf(groundFactor, named(obstacles), { screenOverHardGround });
  const { paths } = propagate(silently, site, sourceAt(0, 0, sourceM), receptor);
  return BANDS_HZ.map(
    (bandHz) => 10 * Math.log10(paths.reduce((sum, path) => sum + 10 ** (0.1 * path.levelDb[bandHz]), 0)),
  );
}
const risesDb = (before: readonly number[], after: readonly number[]) =>
  after.map((level, band) => level - (before[band] ?? Number.NaN));

describe("a screen", () => {
  test("that is made higher never raises a level behind it", () => {
    fc.assert(
      fc.property(screen, number(0.01, 10), height, height, share, reading, (one, moreM, hs, hr, groundFactor, how) => {
        const R = receptorAt(60, 0, hr);
        const [[a, b] = []] = one.edges;
        if (!a || !b) throw new Error("a screen has an edge");
        const higher = { ...one, edges: [[a, b].map((end) => ({ ...end, levelM: end.levelM + moreM }))] };
        const before = levels([one], groundFactor, hs, R, how);
        const after = levels([higher as unknown as Obstacle], groundFactor, hs, R, how);
        expect(Math.max(...risesDb(before, after))).toBeLessThanOrEqual(1e-9);
      }),
      { numRuns: 500, seed: 74 },
    );
  });

  test("where there was none never raises a level behind it", () => {
    fc.assert(
      fc.property(screen, height, height, share, reading, (one, hs, hr, groundFactor, how) => {
        const R = receptorAt(60, 0, hr);
        const before = levels([], groundFactor, hs, R, how);
        expect(Math.max(...risesDb(before, levels([one], groundFactor, hs, R, how)))).toBeLessThanOrEqual(1e-9);
      }),
      { numRuns: 500, seed: 75 },
    );
  });

  test("added to others raises a level behind it by the standard's own steps at most: 5 dB", () => {
    // A higher screen between two takes the string off both: z grows, but two edges become one. Then C3 falls from at most 3 to 1,
    // which is 10 lg 3 = 4.77 dB, and the cap from 25 to 20 dB. Where a screen that sight only grazes is out of sight of the string
    // once another stands there, what it took, up to 10 lg 3, goes with it. No way loses more, so neither does their sum.
    fc.assert(
      fc.property(
        fc.array(screen, { minLength: 1, maxLength: 3 }),
        screen,
        height,
        height,
        share,
        (others, added, hs, hr, groundFactor) => {
          const R = receptorAt(60, 0, hr);
          const before = levels(others, groundFactor, hs, R);
          const after = levels([...others, added], groundFactor, hs, R);
          expect(Math.max(...risesDb(before, after))).toBeLessThanOrEqual(5);
        },
      ),
      { numRuns: 1000, seed: 76 },
    );
  });

  test("alone or behind another changes a level by no more than 5 dB at the edge of its shadow, in plan", () => {
    // At the edge z = 0 and the way round takes 10 lg 3 = 4.77 dB, whatever the other ways take.
    fc.assert(
      fc.property(
        fc.array(screen, { maxLength: 1 }),
        number(2, 58),
        number(1, 40),
        fc.constantFrom(-1, 1),
        height,
        height,
        height,
        share,
        (others, xM, lengthM, sign, topM, hs, hr, groundFactor) => {
          const edge = wall(topM, [xM, 0], [xM, sign * lengthM]);
          const at = (offM: number) => levels([...others, edge], groundFactor, hs, receptorAt(60, offM, hr));
          const steps = risesDb(at(-1e-4), at(1e-4)).map(Math.abs);
          expect(Math.max(...steps)).toBeLessThanOrEqual(5);
        },
      ),
      { numRuns: 1000, seed: 77 },
    );
  });

  test("alone or behind another changes a level by no more than 5 dB at the edge of its shadow, in height", () => {
    // Over the top z passes through 0 without a step; a second edge that is only just touched adds C3 of at most 3, and 5 dB of cap.
    fc.assert(
      fc.property(
        fc.array(screen, { maxLength: 1 }),
        number(2, 58),
        height,
        height,
        share,
        (others, xM, hs, hr, groundFactor) => {
          const sightM = hs + (xM / 60) * (hr - hs);
          const at = (offM: number) =>
            levels([...others, wall(sightM + offM, [xM, -30], [xM, 25])], groundFactor, hs, receptorAt(60, 0, hr));
          expect(Math.max(...risesDb(at(-1e-5), at(1e-5)).map(Math.abs))).toBeLessThanOrEqual(5);
        },
      ),
      { numRuns: 1000, seed: 78 },
    );
  });
});

describe("far away", () => {
  // [derived] ISO 9613-2:1996, Table 3, at the limit d_p → ∞, with q → 1: what is left is within 3·30(h_s + h_r)/d_p of it, the rest of
  // a'(h) to d'(h) having died out by 2 km to less than 0.001 dB.
  const shapes: readonly ((h: number, G: number) => number)[] = [
    () => -1.5,
    (h, G) => -1.5 + G * (1.5 + 3 * Math.exp(-0.12 * (h - 5) ** 2) + 5.7 * Math.exp(-0.09 * h ** 2)),
    (h, G) => -1.5 + G * (1.5 + 8.6 * Math.exp(-0.09 * h ** 2)),
    (h, G) => -1.5 + G * (1.5 + 14 * Math.exp(-0.46 * h ** 2)),
    (h, G) => -1.5 + G * (1.5 + 5 * Math.exp(-0.9 * h ** 2)),
    (_, G) => -1.5 * (1 - G),
    (_, G) => -1.5 * (1 - G),
    (_, G) => -1.5 * (1 - G),
  ];
  const limit = (band: number, hs: number, hr: number, G: number) =>
    (shapes[band]?.(hs, G) ?? 0) + (shapes[band]?.(hr, G) ?? 0) - (band === 0 ? 3 : 3 * (1 - G));

  test("what air and divergence leave of the attenuation is the ground's", () => {
    fc.assert(
      fc.property(number(2000, 9000), height, height, share, (dp, hs, hr, G) => {
        const { paths } = propagate(silently, siteOf(G), sourceAt(0, 0, hs), receptorAt(dp, 0, hr));
        const [direct] = paths;
        const divergenceDb = 20 * Math.log10(Math.hypot(dp, hs - hr)) + 11;
        for (const [band, bandHz] of BANDS_HZ.entries()) {
          const leftDb =
            100 - (direct?.levelDb[bandHz] ?? Number.NaN) - divergenceDb - (direct?.airDb[bandHz] ?? Number.NaN);
          expect(Math.abs(leftDb - limit(band, hs, hr, G))).toBeLessThanOrEqual((90 * (hs + hr)) / dp + 0.001);
        }
      }),
      { numRuns: 200, seed: 79 },
    );
  });
  test("a screen takes at most 10 lg 3 over its top: weather bends sound over it", () => {
    fc.assert(
      fc.property(number(4000, 9000), number(0.5, 3), number(0.5, 3), share, (dp, hs, hr, G) => {
        const R = receptorAt(dp, 0, hr);
        const { paths } = propagate(silently, siteOf(G, [wall(4, [20, -900], [20, 900])]), sourceAt(0, 0, hs), R);
        expect(paths[0]?.kind).toBe("over");
        for (const bandHz of BANDS_HZ)
          expect(paths[0]?.screenDb[bandHz]).toBeLessThanOrEqual(10 * Math.log10(3) + 0.01);
      }),
      { numRuns: 200, seed: 80 },
    );
  });
});

describe("an enclosure", () => {
  test("whose panels let all through and absorb nothing does nothing, over a floor as hard as concrete", () => {
    fc.assert(
      fc.property(
        number(5, 200),
        number(0.01, 10),
        number(1, 100),
        share,
        number(0.01, 0.05),
        (faceM2, openM2, floorM2, linedShare, hard) => {
          const lossDb = enclosureInsertionLoss(silently, {
            faces: [{ areaM2: faceM2, indexDb: perBand(() => 0) }],
            openings: [{ areaM2: openM2, silencerLossDb: undefined }],
            lining: { areaM2: linedShare * faceM2, absorption: perBand(() => 0) },
            unlined: perBand(() => 0),
            floor: { areaM2: floorM2, absorption: perBand(() => hard) },
            siteBuildDeductionDb: 3,
          });
          // [derived] R = 0 and S_E/R_i at least (5 + 0.01)/(100·0.05/0.95) = 0.95 above 0.7: the estimate by the room gives nothing.
          expect(Object.values(lossDb).every((loss) => loss === 0)).toBe(true);
        },
      ),
      { numRuns: 200, seed: 81 },
    );
  });
});
