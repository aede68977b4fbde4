import { describe, expect, test } from "vitest";
import { silently } from "../../compute/equations/working.ts";
import { highestBesideDba } from "../../compute/hearing/beside.ts";
import { withWalls } from "../../compute/hearing/walls.ts";
import type { ZoneEdges } from "../../compute/hearing/zone.ts";
import { zoneOf } from "../../compute/hearing/zone.ts";
import { zoneReach, zoneSumDba } from "../../compute/hearing/zone-distance.ts";
import { distanceToMachineM, machineLevelDba } from "../../compute/hearing/zone-machine.ts";
import { machine } from "./machine.ts";

// [derived] design.md 7 and dossier 5: r = 10^((LWA − 7.98 − edge)/20) from outline and swing, hemispherical over hard ground.
// Halving ends within a millimetre, on the outer side.
const EDGES: ZoneEdges = { levelDba: 82, peak: { valueDbc: 137, comparator: "at-or-above", uncertaintyDb: 3 } };
const zone = (one: ReturnType<typeof machine>, others: readonly ReturnType<typeof machine>[] = [], edges = EDGES) =>
  zoneOf(silently, one, [one, ...others], edges);
function expectDistance(found: ReturnType<typeof zone>, handM: number) {
  if (found.kind !== "distance") throw new Error(`the zone is ${found.kind}`);
  expect(found.distanceM - handM).toBeGreaterThanOrEqual(-1e-6);
  expect(found.distanceM - handM).toBeLessThanOrEqual(0.001 + 1e-6);
}

describe("a lone machine", () => {
  test("of 110 dB(A) reaches 85 dB(A) at 7.1 m and 80 dB(A) at 12.6 m", () => {
    // [derived] dossier 5, z-lwa110.
    expectDistance(zone(machine("a"), [], { ...EDGES, levelDba: 85 }), 7.094308);
    expectDistance(zone(machine("a"), [], { ...EDGES, levelDba: 80 }), 12.615663);
  });
  test("reaches as far from a long outline and from its swing", () => {
    const long = machine("a", 0, {
      outline: [
        { xM: -6, yM: -1 },
        { xM: 6, yM: -1 },
        { xM: 6, yM: 1 },
        { xM: -6, yM: 1 },
      ],
    });
    expectDistance(zone(long), 10.020977);
    expectDistance(zone(machine("a", 0, { swingM: 9 })), 10.020977);
  });
  test("has no zone if 1 m outside it stays below the edge; at the edge it has", () => {
    // 89.9 − 7.9818 = 81.918; 90 gives 82.018 and 1.0021 m.
    expect(zone(machine("a", 0, { powerDba: 89.9 }))).toEqual({ kind: "none", machine: "a" });
    expectDistance(zone(machine("a", 0, { powerDba: 90 })), 1.002098);
  });
  test("is near its field within twice its largest dimension", () => {
    const near = (largestDimensionM: number) => {
      const found = zone(machine("a", 0, { largestDimensionM }));
      return found.kind === "distance" && found.nearField;
    };
    expect([near(5), near(5.02)]).toEqual([false, true]);
  });
  test("keeps its distance when it stands elsewhere and turned", () => {
    const turned = machine("a", 700, {
      outline: [
        { xM: 700, yM: -2 },
        { xM: 702, yM: 0 },
        { xM: 700, yM: 2 },
        { xM: 698, yM: 0 },
      ],
    });
    expectDistance(zone(turned), 10.020977);
  });
  test("is 102.018 dB(A) 1 m outside its outline, and never louder nearer", () => {
    expect(highestBesideDba(silently, machine("a"), [machine("a")])).toBeCloseTo(102.018, 3);
    for (const xM of [0, 1, 1.5, 2])
      expect(machineLevelDba(silently, machine("a"), { xM, yM: 0 })).toBeCloseTo(102.018, 3);
  });
});

describe("distance to a machine", () => {
  test("runs to outline or swing, whichever is nearer, and is 0 on both", () => {
    const crane = machine("a", 0, { swingM: 4 });
    expect(
      [
        { xM: 10, yM: 0 },
        { xM: 3, yM: 3 },
        { xM: 3, yM: 2 },
        { xM: 0, yM: 0 },
      ].map((place) => distanceToMachineM(crane, place)),
    ).toEqual([6, Math.sqrt(18) - 4, 0, 0]);
    expect(distanceToMachineM(machine("b"), { xM: 4, yM: 5 })).toBe(5);
  });
});

describe("walls", () => {
  // [derived] 110 dB(A) at edge 82: 10.021 m; with 1, 2, 3 walls × 10^(3/20): 14.155, 19.994, 28.243 m.
  const counted = (...wallsM: number[]) => withWalls([machine("a", 0, { wallsM })], 82)[0]?.walls;
  test("count when they are nearer than the edge, and the edge they move out counts again", () => {
    expect([counted(), counted(10.1), counted(9.9), counted(0)]).toEqual([0, 0, 1, 1]);
    expect([counted(9.9, 14.3), counted(9.9, 14.1), counted(14.1, 10.1)]).toEqual([1, 2, 0]);
    expect(counted(5, 14.1, 19.9, 28.3)).toBe(3);
  });
  test("each add 3 dB to the level and 41 % to the distance", () => {
    const walled = { ...machine("a"), walls: 2 };
    expect(machineLevelDba(silently, walled, { xM: 11, yM: 0 })).toBeCloseTo(110 - 7.9818 - 20 + 6, 4);
    expectDistance(zoneOf(silently, walled, [walled], EDGES), 19.994478);
  });
  test("of a quiet machine count only within the metre beside it", () => {
    const walls = (wallsM: number[]) => withWalls([machine("a", 0, { powerDba: 88, wallsM })], 82)[0]?.walls;
    expect([walls([0.9]), walls([1.1])]).toEqual([1, 0]);
  });
});

describe("two machines", () => {
  // [derived] Outlines 30 m apart on one line: the zone reaches farthest on it, where r solves
  // 10^((LWA1 − 7.98)/10)/r² + 10^((LWA2 − 7.98)/10)/(30 − r)² = 10^8.2.
  test("equally loud: 12.091 m each, not 10.021", () => {
    expectDistance(zone(machine("a"), [machine("b", 32)]), 12.090992);
    expectDistance(zone(machine("b", 32), [machine("a")]), 12.090992);
  });
  test("6 dB apart: 10.366 m and 5.504 m", () => {
    expectDistance(zone(machine("a"), [machine("b", 32, { powerDba: 104 })]), 10.365847);
    expectDistance(zone(machine("b", 32, { powerDba: 104 }), [machine("a")]), 5.504011);
  });
  test("are summed at a place: 110 dB(A) at 1 m and at 29 m are 102.0234 dB(A)", () => {
    const both = [machine("a"), machine("b", 32)];
    expect(zoneSumDba(silently, both, { xM: 2, yM: 0 })).toBeCloseTo(102.0234, 4);
    expect(highestBesideDba(silently, machine("a"), [machine("a"), machine("b", 32)])).toBeCloseTo(102.0234, 4);
  });
  test("together reach the edge where neither does alone", () => {
    // Each 80.0182 dB(A) at 1 m: alone no zone. Outlines 2 m apart: on the line midway between, where both are as near, the sum is
    // 83.0285 − 20 lg d, so 82 at d = 1.1257 m. That place is a corner of the contour: directions are looked at down to 0.05°, 2 mm.
    const quiet = (id: string, xM: number) => machine(id, xM, { powerDba: 88 });
    expect(zone(quiet("a", 0)).kind).toBe("none");
    const found = zone(quiet("a", 0), [quiet("b", 4)]);
    if (found.kind !== "distance") throw new Error(found.kind);
    expect(Math.abs(found.distanceM - 1.1257)).toBeLessThanOrEqual(0.002);
  });
  test("a quiet one inside the zone of a loud one has none of its own; far away it has none at all", () => {
    const quiet = (xM: number) => machine("quiet", xM, { powerDba: 70 });
    expect(zone(quiet(6), [machine("loud")])).toEqual({ kind: "inside-another", machine: "quiet" });
    expect(zone(quiet(60), [machine("loud")])).toEqual({ kind: "none", machine: "quiet" });
  });
  test("one that a louder one drowns is still marked as far as it needs by itself", () => {
    // [derived] 100 dB(A), edge 82: 10^((100 − 7.9818 − 82)/20) = 3.1694 m, though the loud one leads from its outline on.
    const found = zone(machine("drowned", 4, { powerDba: 100 }), [machine("loud", 0, { powerDba: 120 })]);
    if (found.kind !== "distance") throw new Error(found.kind);
    expect(Math.abs(found.distanceM - 3.1694)).toBeLessThanOrEqual(0.0015);
  });
  test("every place that meets the edge level lies inside the distance of one of them", () => {
    const pair = [machine("a"), machine("b", 9, { powerDba: 106 })];
    const reach = new Map(pair.map((one) => [one.id, zoneReach(one, pair, 82)?.distanceM ?? 0]));
    for (let xM = -15; xM <= 25; xM += 0.5) {
      for (let yM = -15; yM <= 15; yM += 0.5) {
        if (zoneSumDba(silently, pair, { xM, yM }) < 82) continue;
        const inside = pair.some((one) => distanceToMachineM(one, { xM, yM }) <= Math.ceil(reach.get(one.id) ?? 0));
        expect(inside, `${xM}, ${yM}`).toBe(true);
      }
    }
  });
});

describe("between walls and under a slab", () => {
  test("there is no distance: the whole space", () => {
    expect(zone(machine("a", 0, { open: false }))).toEqual({ kind: "whole-space", machine: "a" });
  });
  test("a machine that is quiet beside and has no peak has none there either", () => {
    expect(zone(machine("a", 0, { open: false, powerDba: 80 })).kind).toBe("none");
  });
});

describe("peaks", () => {
  const quiet = (changes: Parameters<typeof machine>[2]) => machine("a", 0, { powerDba: 80, ...changes });
  test("impulsive plant without peak data: not known; what it reaches by level alone is kept for checking", () => {
    const found = zone(machine("a", 0, { impulsive: true }));
    if (found.kind !== "peak-not-known") throw new Error(found.kind);
    expect((found.leastM ?? 0) - 10.020977).toBeLessThanOrEqual(0.001);
    expect(zone(quiet({ impulsive: true }))).toEqual({ kind: "peak-not-known", machine: "a", leastM: undefined });
    expect(zone(machine("a", 0, { impulsive: true, open: false }))).toEqual({
      kind: "peak-not-known",
      machine: "a",
      leastM: undefined,
    });
  });
  test("120 dB(C) at 10 m is 140 at 1 m: marked to where 137 − 3 is reached, 1.995 m", () => {
    const found = zone(quiet({ peak: { levelDbc: 120, distanceM: 10 } }));
    expect(found).toMatchObject({ kind: "distance", by: "peak" });
    expect(found.kind === "distance" && found.distanceM).toBeCloseTo(1.995262, 6);
  });
  test("the larger of the two distances stands", () => {
    const found = zone(machine("a", 0, { peak: { levelDbc: 120, distanceM: 10 } }));
    expect(found).toMatchObject({ kind: "distance", by: "level" });
    expectDistance(found, 10.020977);
  });
  test("at the value itself the comparator decides; below it there is no zone, whatever U", () => {
    const at = (levelDbc: number, comparator: "above" | "at-or-above") =>
      zone(quiet({ peak: { levelDbc, distanceM: 1 } }), [], {
        levelDba: 82,
        peak: { valueDbc: 137, comparator, uncertaintyDb: 3 },
      }).kind;
    expect([at(137, "at-or-above"), at(137, "above"), at(137.1, "above"), at(136.9, "at-or-above")]).toEqual([
      "distance",
      "none",
      "distance",
      "none",
    ]);
  });
  test("a duty set without a peak value makes no zone of them", () => {
    expect(zone(quiet({ peak: { levelDbc: 150, distanceM: 1 } }), [], { levelDba: 82, peak: undefined }).kind).toBe(
      "none",
    );
  });
  test("in a trench they make the whole space the zone", () => {
    expect(zone(quiet({ open: false, peak: { levelDbc: 140, distanceM: 1 } })).kind).toBe("whole-space");
  });
});

describe("a work station", () => {
  test("at the edge level makes a zone of the least distance, 1 m, where the level beside does not", () => {
    const zoneAt = (workStationDba: number) => zone(machine("a", 0, { powerDba: 80, workStationDba }));
    expect(zoneAt(82)).toMatchObject({ kind: "distance", distanceM: 1, by: "level" });
    expect(zoneAt(81.9).kind).toBe("none");
  });
});
