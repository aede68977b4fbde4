import { describe, expect, test } from "vitest";
import { crossedEdges } from "../../../compute/acoustics/obstacles/crossed-edges.ts";
import type { Obstacle } from "../../../compute/acoustics/obstacles/obstacle.ts";
import type { Way } from "../../../compute/acoustics/obstacles/way.ts";
import { waysBetween } from "../../../compute/acoustics/obstacles/ways-between.ts";
import type { Point } from "../../../compute/acoustics/site.ts";
import { block, wall as screen } from "../../helpers/site-of.ts";

// [derived] ISO 9613-2:1996, 7.4, fig. 5 and 6: lengths are read off the drawings below with Pythagoras. Unless stated the source
// is at (0, 0) and the receptor point at (40, 0), both 1.5 m up: the line runs east, so left is north.
const point = (xM: number, yM: number, heightM = 1.5, groundM = 0): Point => ({ at: { xM, yM }, groundM, heightM });
const S = point(0, 0);
const R = point(40, 0);
const waysPast = (obstacles: readonly Obstacle[], source = S, receptor = R) =>
  waysBetween(crossedEdges(obstacles, source.at, receptor.at), source, receptor).get(8000);
const found = (wall: Obstacle, source = S, receptor = R) => {
  const ways = waysPast([wall], source, receptor);
  if (!ways?.over || !ways.left || !ways.right) throw new Error("the screen is not crossed, or has no two sides");
  return { over: ways.over, left: ways.left, right: ways.right };
};
const lengths = ({ sourceToEdgeM, betweenEdgesM, edgeToReceptorM, alongEdgeM }: Way) => [
  sourceToEdgeM,
  betweenEdgesM,
  edgeToReceptorM,
  alongEdgeM,
];
const expectLengths = (path: Way, hand: readonly number[]) => {
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
    expect(waysPast([screen(3, [10, 1], [10, 20])])?.over).toBeUndefined();
    expect(waysPast([screen(3, [-10, -5], [-10, 5])])?.over).toBeUndefined();
    expect(waysPast([screen(3, [50, -5], [50, 5])])?.over).toBeUndefined();
  });
  test("has none when the line runs along it", () => {
    expect(waysPast([screen(3, [10, 0], [20, 0])])?.over).toBeUndefined();
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
  });
  test("crossed twice is bent over at both runs: 15 m apart, √27.25 before and √402.25 behind", () => {
    const paths = found(screen(3, [5, -9], [5, 9], [20, 9], [20, -9]));
    expectLengths(paths.over, [Math.sqrt(27.25), 15, Math.sqrt(402.25), 0]);
    expect(paths.over.edgeCount).toBe(2);
  });
  test("crossed at its corner is one crossing", () => {
    const paths = found(screen(3, [5, -9], [10, 0], [5, 9]));
    expectLengths(paths.left, [Math.sqrt(106), 0, Math.sqrt(1306), 0]);
    expectLengths(paths.right, [Math.sqrt(106), 0, Math.sqrt(1306), 0]);
  });
  test("crossed at its corner is one crossing whichever way the whole drawing is turned", () => {
    // Turned, both runs are still met at the corner, but a hair apart.
    for (const turn of [0.1, 0.7, 1.234, 2.5]) {
      const turned = (xM: number, yM: number) =>
        [3.3 + xM * Math.cos(turn) - yM * Math.sin(turn), 7.1 + xM * Math.sin(turn) + yM * Math.cos(turn)] as const;
      const wall = screen(3, turned(5, -9), turned(10, 0), turned(5, 9));
      const over = waysPast([wall], point(...turned(0, 0)), point(...turned(40, 0)))?.over;
      expect(over?.edgeCount).toBe(1);
    }
  });
});

describe("several obstacles", () => {
  const near = { ...screen(3, [5, -20], [5, 20]), id: "near" };
  const middle = { ...screen(3, [20, -20], [20, 20]), id: "middle" };
  const far = { ...screen(3, [35, -20], [35, 20]), id: "far" };
  test("two screens of one height are both bent over", () => {
    // [derived] √(5² + 1.5²), 15, √(20² + 1.5²).
    const over = waysPast([near, middle])?.over;
    expect(over?.obstacles).toEqual(["near", "middle"]);
    expectLengths(over as Way, [Math.sqrt(27.25), 15, Math.sqrt(402.25), 0]);
  });
  test("of three the pair with the longest way counts", () => {
    // [derived] near–far: √27.25 + 30 + √27.25 = 40.4403; near–middle and middle–far: √27.25 + 15 + √402.25 = 40.2763.
    const over = waysPast([near, middle, far])?.over;
    expect(over?.obstacles).toEqual(["near", "far"]);
    expectLengths(over as Way, [Math.sqrt(27.25), 30, Math.sqrt(27.25), 0]);
  });
  test("one below the string drawn over the others is left out", () => {
    // [derived] Over the near one at 3 m to the receptor point the string passes x = 20 at 3 − 1.5·15/35 = 2.357 m.
    const low = { ...screen(2.3, [20, -20], [20, 20]), id: "low" };
    expect(waysPast([near, low])?.over?.obstacles).toEqual(["near"]);
    expect(waysPast([near, { ...screen(2.4, [20, -20], [20, 20]), id: "low" }])?.over?.obstacles).toEqual([
      "near",
      "low",
    ]);
  });
  test("one above the line of sight decides, one below it does not", () => {
    const kerb = { ...screen(0.5, [5, -20], [5, 20]), id: "kerb" };
    expect(waysPast([kerb, middle])?.over?.obstacles).toEqual(["middle"]);
  });
  test("where sight passes above all of them the nearest to the line counts, with z below 0", () => {
    const over = waysPast([
      { ...screen(1, [20, -20], [20, 20]), id: "low" },
      { ...screen(1.4, [30, -20], [30, 20]), id: "higher" },
    ])?.over;
    expect(over?.obstacles).toEqual(["higher"]);
    expect(over?.sightBlocked).toBe(false);
  });
  test("the way round takes the corners of all that stand in sight", () => {
    // [derived] Left: near ends at (5, 20), middle at (20, 30): the string touches both.
    const wide = { ...screen(3, [20, -20], [20, 30]), id: "wide" };
    const left = waysPast([near, wide])?.left;
    expect(left?.obstacles).toEqual(["near", "wide"]);
    expectLengths(left as Way, [Math.sqrt(425), Math.sqrt(325), Math.sqrt(1300), 0]);
  });
});

describe("several in the line of sight", () => {
  const near = { ...screen(3, [5, -20], [5, 20]), id: "near" };
  const far = { ...screen(3, [35, -8], [35, 4]), id: "far" };
  test("are gone round one by one too, each time over all the others", () => {
    // [derived] Left of the near one: √(5² + 20²) and √(35² + 20²), over the far one √(35² + 1.5²) and √(5² + 1.5²); and so on.
    const ways = waysPast([near, far]);
    const named = ways?.mixed.map(({ obstacle, round, others }) => [obstacle.id, round.kind, others?.obstacles.join()]);
    expect(named).toEqual([
      ["near", "left", "far"],
      ["near", "right", "far"],
      ["far", "left", "near"],
      ["far", "right", "near"],
    ]);
    expectLengths(ways?.mixed[0]?.round as Way, [Math.sqrt(425), 0, Math.sqrt(1625), 0]);
    expectLengths(ways?.mixed[0]?.others as Way, [Math.sqrt(1227.25), 0, Math.sqrt(27.25), 0]);
    expectLengths(ways?.mixed[2]?.round as Way, [Math.sqrt(1241), 0, Math.sqrt(41), 0]);
    expectLengths(ways?.mixed[2]?.others as Way, [Math.sqrt(27.25), 0, Math.sqrt(1227.25), 0]);
  });
  test("of which only one counts are not: its ways round are those of all", () => {
    expect(waysPast([near])?.mixed).toEqual([]);
    expect(waysPast([near, { ...screen(1, [35, -8], [35, 4]), id: "kerb" }])?.mixed).toEqual([]);
  });
});

describe("a building", () => {
  test("5 m thick is bent over at both roof edges and round at both corners of each side", () => {
    const ways = waysPast([block(3, [10, -10], [15, -10], [15, 10], [10, 10])], S, point(45, 0));
    expectLengths(ways?.over as Way, [Math.sqrt(102.25), 5, Math.sqrt(902.25), 0]);
    expectLengths(ways?.left as Way, [Math.sqrt(200), 5, Math.sqrt(1000), 0]);
  });
  test.each([
    ["anticlockwise", block(6, [10, -20], [40, -20], [40, 4], [10, 4])],
    ["clockwise", block(6, [10, 4], [40, 4], [40, -20], [10, -20])],
  ])(
    "drawn %s and crossed at a corner, its edges not parallel, is bent over along the true shortest way",
    (_, body) => {
      // [derived] Edges x = 10 and y = 4 at 6 m: places (10, u) and (v, 4) that make the way shortest, found by dividing into thirds.
      const far = point(30, 9);
      const over = waysPast([body], S, far)?.over as Way;
      const lengthM = (u: number, v: number) =>
        Math.hypot(10, u, 4.5) + Math.hypot(v - 10, 4 - u) + Math.hypot(30 - v, 5, 4.5);
      const least = (length: (at: number) => number) => {
        let [low, high] = [-60, 60];
        while (high - low > 1e-9) {
          const third = (high - low) / 3;
          if (length(low + third) < length(high - third)) high -= third;
          else low += third;
        }
        return length((low + high) / 2);
      };
      const best = least((u) => least((v) => lengthM(u, v)));
      expect(over.sourceToEdgeM + over.betweenEdgesM + over.edgeToReceptorM).toBeCloseTo(best, 6);
      expect(over.alongEdgeM).toBe(0);
    },
  );
});

describe("two edges close together, all but parallel", () => {
  test.each([
    // [derived] 10 m off and 4 m high, the second edge turned by 1/100 000 or 1/1000 about a place 50 m aside, so 0.1005 or 0.15 m
    // behind the first on the line: √(10² + 2.5²) + 0.1005 + √(29.8995² + 2.5²), √(10² + 2.5²) + 0.15 + √(29.85² + 2.5²); what the
    // turn saves by going a little aside is of the second order.
    [0.001, 40.4121],
    [0.1, 40.4123],
  ])("%d m out of parallel over 100 m: the true shortest way", (asideM, wayM) => {
    const first = { ...screen(4, [10, -50], [10, 50]), id: "first" };
    const second = { ...screen(4, [10.1, -50], [10.1 + asideM, 50]), id: "second" };
    const over = waysPast([first, second])?.over as Way;
    expect(over.sourceToEdgeM + over.betweenEdgesM + over.edgeToReceptorM).toBeCloseTo(wayM, 4);
  });
});

describe("a sloping edge", () => {
  test("is measured square to its slope", () => {
    // [derived] Edge from (10, −10, 2) to (10, 10, 4): direction (0, 20, 2)/√404. Source (0, 0, 1.5) to the edge's foot (10, −10, 2):
    // (−10, 10, −0.5), along it (200 − 1)/√404, square √(200.25 − 199²/404); receptor (30, 10, −0.5) likewise √(1000.25 − 199²/404).
    const sloping: Obstacle = {
      ...screen(3, [10, -10], [10, 10]),
      edges: [
        [
          { xM: 10, yM: -10, levelM: 2 },
          { xM: 10, yM: 10, levelM: 4 },
        ],
      ],
    };
    const { over } = found(sloping);
    expectLengths(over, [Math.sqrt(200.25 - 199 ** 2 / 404), 0, Math.sqrt(1000.25 - 199 ** 2 / 404), 0]);
  });
});

describe("the rim of an excavation", () => {
  test("screens what stands below it and has no way round", () => {
    // [derived] Source 1.5 m over a floor at −5 m, rim at 0 m 10 m away: (10, 3.5), then (30, 1.5).
    const rim: Obstacle = { ...screen(0, [10, -50], [10, 50]), kind: "excavation", corners: [] };
    const ways = waysPast([rim], point(0, 0, 1.5, -5), R);
    expectLengths(ways?.over as Way, [Math.sqrt(100 + 12.25), 0, Math.sqrt(900 + 2.25), 0]);
    expect([ways?.left, ways?.right]).toEqual([undefined, undefined]);
  });
  test("is nothing at all between two ends outside it, where sight passes above", () => {
    const pit: Obstacle = { ...block(0, [15, -10], [25, -10], [25, 10], [15, 10]), kind: "excavation", corners: [] };
    expect(waysPast([pit])?.over).toBeUndefined();
    expect(waysPast([pit], point(20, 0))?.over?.sightBlocked).toBe(false);
  });
  test("is passed by what goes round a screen behind it", () => {
    const rim: Obstacle = { ...screen(0, [5, -50], [5, 50]), id: "rim", kind: "excavation", corners: [] };
    const low = point(0, 0, 1.5, -3);
    const ways = waysPast([rim, screen(4, [20, -4], [20, 4])], low);
    // [derived] Round: 2·√(20² + 4²) in plan, 3 m along the vertical edge; over the rim: (5, 1.5), then (35, 1.5).
    expectLengths(ways?.left as Way, [Math.sqrt(416), 0, Math.sqrt(416), 3]);
    expectLengths(ways?.rims as Way, [Math.sqrt(27.25), 0, Math.sqrt(1227.25), 0]);
  });
});
