import { describe, expect, test } from "vitest";
import type { ScreenPath } from "../../compute/acoustics/screen-paths.ts";
import { screenPaths } from "../../compute/acoustics/screen-paths.ts";
import type { Point, Screen } from "../../compute/acoustics/site.ts";

// [derived] ISO 9613-2:1996, 7.4, fig. 5 and 6: lengths are read off the drawings below with Pythagoras. Unless stated the source
// is at (0, 0) and the receptor point at (40, 0), both 1.5 m up: the line runs east, so left is north.
const point = (xM: number, yM: number, heightM = 1.5, groundM = 0): Point => ({ at: { xM, yM }, groundM, heightM });
const screen = (topM: number, ...line: readonly (readonly [number, number])[]): Screen => ({
  id: "wall",
  topM,
  line: line.map(([xM, yM]) => ({ xM, yM })),
});
const S = point(0, 0);
const R = point(40, 0);
const found = (wall: Screen, source = S, receptor = R) => {
  const paths = screenPaths(wall, source, receptor);
  if (!paths) throw new Error("the screen is not crossed");
  const [left, right] = paths.around;
  if (!left || !right) throw new Error("there are not two ways round");
  return { ...paths, left, right };
};
const lengths = ({ sourceToEdgeM, betweenEdgesM, edgeToReceptorM, alongEdgeM }: ScreenPath) => [
  sourceToEdgeM,
  betweenEdgesM,
  edgeToReceptorM,
  alongEdgeM,
];
const expectLengths = (path: ScreenPath, hand: readonly number[]) => {
  for (const [index, value] of lengths(path).entries()) expect(value).toBeCloseTo(hand[index] ?? Number.NaN, 9);
};

describe("a straight screen square to the line, 10 m from the source, 20 m long, top at 3 m", () => {
  const paths = found(screen(3, [10, -10], [10, 10]));
  test("over its top: √(10² + 1.5²) and √(30² + 1.5²), nothing along the edge", () => {
    expectLengths(paths.over, [Math.sqrt(102.25), 0, Math.sqrt(902.25), 0]);
    expect(paths.over.sightBlocked).toBe(true);
  });
  test("round each end in plan: √200 and √1000", () => {
    expectLengths(paths.left, [Math.sqrt(200), 0, Math.sqrt(1000), 0]);
    expectLengths(paths.right, [Math.sqrt(200), 0, Math.sqrt(1000), 0]);
  });
  test("its extent square to the line is its length", () => {
    expect(paths.extentM).toBeCloseTo(20, 12);
  });
});

describe("left and right", () => {
  // [derived] North end 5 m off the line, south end 12 m.
  const north = [Math.sqrt(125), 0, Math.sqrt(925), 0];
  const south = [Math.sqrt(244), 0, Math.sqrt(1044), 0];
  test("are seen from the source, whichever way the line is drawn", () => {
    for (const wall of [screen(3, [10, -12], [10, 5]), screen(3, [10, 5], [10, -12])]) {
      expectLengths(found(wall).left, north);
      expectLengths(found(wall).right, south);
    }
  });
  test("change places when source and receptor point do", () => {
    const wall = screen(3, [10, -12], [10, 5]);
    const back = found(wall, R, S);
    expectLengths(back.left, [Math.sqrt(1044), 0, Math.sqrt(244), 0]);
    expectLengths(back.right, [Math.sqrt(925), 0, Math.sqrt(125), 0]);
  });
});

describe("a screen at 45° to the line", () => {
  // [derived] Line through (10, 0) along (1, 1)/√2: source 10/√2 and receptor point 30/√2 from it, 40/√2 along it.
  const paths = found(screen(3, [0, -10], [20, 10]));
  test("has a component along its edge", () => {
    expectLengths(paths.over, [Math.sqrt(50 + 2.25), 0, Math.sqrt(450 + 2.25), 40 / Math.SQRT2]);
  });
  test("extends 20 m square to the line, less than its length", () => {
    expect(paths.extentM).toBeCloseTo(20, 12);
  });
});

describe("heights", () => {
  test("the way round an end is as long along the vertical edge as the two ends differ in level", () => {
    // [derived] Source 1 m over ground at 2 m, receptor point 4 m over ground at 5 m: 6 m.
    const paths = found(screen(10, [10, -10], [10, 10]), point(0, 0, 1, 2), point(40, 0, 4, 5));
    expect(paths.left.alongEdgeM).toBe(6);
    expectLengths(paths.over, [Math.sqrt(100 + 49), 0, Math.sqrt(900 + 1), 0]);
  });
  test("the sight line is met when it passes below the top edge or on it, not above", () => {
    // [derived] Line from level 1 to level 9: at a quarter of the way, where the screen stands, 3 m.
    const blocked = (topM: number) => found(screen(topM, [10, -10], [10, 10]), S, point(40, 0, 7.5)).over.sightBlocked;
    expect([blocked(3.01), blocked(3), blocked(2.99)]).toEqual([true, true, false]);
  });
});

describe("a screen beside the line", () => {
  test("has no paths", () => {
    expect(screenPaths(screen(3, [10, 1], [10, 20]), S, R)).toBeUndefined();
    expect(screenPaths(screen(3, [-10, -5], [-10, 5]), S, R)).toBeUndefined();
    expect(screenPaths(screen(3, [50, -5], [50, 5]), S, R)).toBeUndefined();
  });
  test("has none when the line runs along it", () => {
    expect(screenPaths(screen(3, [10, 0], [20, 0]), S, R)).toBeUndefined();
  });
  test("is met where its end touches the line", () => {
    const paths = found(screen(3, [10, 0], [10, 20]));
    expectLengths(paths.right, [10, 0, 30, 0]);
    expectLengths(paths.left, [Math.sqrt(500), 0, Math.sqrt(1300), 0]);
  });
});

describe("a bent screen", () => {
  test("is passed over on the run that the line crosses", () => {
    // [derived] The second run, square to the line at x = 20.
    const paths = found(screen(3, [10, 8], [20, 8], [20, -8]));
    expectLengths(paths.over, [Math.sqrt(402.25), 0, Math.sqrt(402.25), 0]);
    expectLengths(paths.right, [Math.sqrt(464), 0, Math.sqrt(464), 0]);
  });
  test("is rounded past both corners by a taut line, the stretch between counted apart", () => {
    // [derived] (10, 5) and (20, 5): √125, 10, √425.
    const paths = found(screen(3, [10, -5], [10, 5], [20, 5]));
    expectLengths(paths.left, [Math.sqrt(125), 10, Math.sqrt(425), 0]);
    expectLengths(paths.right, [Math.sqrt(125), 0, Math.sqrt(925), 0]);
  });
  test("is rounded straight to its end where the inner corner lies inside the taut line", () => {
    // [derived] From (0, 0) to the end (20, 8) the line is steeper than to the corner (10, 2).
    const paths = found(screen(3, [10, -5], [10, 2], [20, 8]));
    expectLengths(paths.left, [Math.sqrt(464), 0, Math.sqrt(464), 0]);
  });
  test("whose end curls back behind the corner is rounded at the corner", () => {
    // [derived] The end (15, 3) lies inside the line from (10, 8) to (40, 0).
    const paths = found(screen(3, [10, -5], [10, 8], [15, 3]));
    expectLengths(paths.left, [Math.sqrt(164), 0, Math.sqrt(964), 0]);
  });
  test("that wraps round the source is rounded backwards first", () => {
    // [derived] From (0, 0) back to (−5, 5), along 15 m to (10, 5), then √(30² + 5²).
    const paths = found(screen(3, [-5, 5], [10, 5], [10, -5], [-5, -5]));
    expectLengths(paths.left, [Math.sqrt(50), 15, Math.sqrt(925), 0]);
    expectLengths(paths.right, [Math.sqrt(50), 15, Math.sqrt(925), 0]);
    expect(paths.extentM).toBeCloseTo(10, 12);
  });
  test("crossed twice counts where the way over is longest", () => {
    // [derived] Runs at x = 5 and x = 20, same top: the nearer one makes the larger detour.
    const paths = found(screen(3, [5, -9], [5, 9], [20, 9], [20, -9]));
    expectLengths(paths.over, [Math.sqrt(27.25), 0, Math.sqrt(1227.25), 0]);
  });
  test("crossed at its corner is one crossing", () => {
    const paths = found(screen(3, [5, -9], [10, 0], [5, 9]));
    expectLengths(paths.left, [Math.sqrt(106), 0, Math.sqrt(1306), 0]);
    expectLengths(paths.right, [Math.sqrt(106), 0, Math.sqrt(1306), 0]);
  });
});
