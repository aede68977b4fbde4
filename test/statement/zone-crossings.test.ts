import { describe, expect, test } from "vitest";
import type { Zone } from "../../compute/hearing/zone.ts";
import { zoneCrossings } from "../../compute/statement/zone-crossings.ts";
import { machine } from "../hearing/machine.ts";
import { sceneInputs } from "../helpers/scene-inputs.ts";

// [derived] A machine 2 m square at (50, 0): x 49 to 51. Site 30 to 60, north and south far off; a way 4 m wide along x = 70, a
// receptor point at (91, 0). Distances from the outline: boundary 9 m (east) and 19 m (west), way 17 m, point 40 m.
const project = sceneInputs((inputs) => {
  const at = (xM: number, yM: number) => ({ xM, yM });
  inputs.project.boundary = [at(30, -500), at(60, -500), at(60, 500), at(30, 500)];
  inputs.project.publicWays = [{ id: "lane", name: { en: "Lane" }, line: [at(70, -300), at(70, 300)], widthM: 4 }];
  inputs.project.receptors = inputs.project.receptors.slice(0, 1);
  for (const { points } of inputs.project.receptors) for (const point of points) point.at = at(91, 0);
}).project;
const RECEPTOR = project.receptors[0]?.id;
const passed = (zone: Zone, changes: Parameters<typeof machine>[2] = {}) =>
  zoneCrossings(project, machine("a", 50, changes), zone).map((each) =>
    "id" in each ? `${each.kind} ${each.id}` : each.kind,
  );
const distance = (distanceM: number): Zone => ({
  kind: "distance",
  machine: "a",
  distanceM,
  at: { xM: 0, yM: 0 },
  nearField: false,
  by: "level",
});

describe("what a zone passes", () => {
  test("is what lies nearer than the whole metres it is marked at", () => {
    expect(passed(distance(9))).toEqual([]);
    expect(passed(distance(9.01))).toEqual(["boundary"]);
    expect(passed(distance(17))).toEqual(["boundary"]);
    expect(passed(distance(17.2))).toEqual(["boundary", "public-way lane"]);
    expect(passed(distance(40))).toEqual(["boundary", "public-way lane"]);
    expect(passed(distance(40.5))).toEqual(["boundary", "public-way lane", `receptor ${RECEPTOR}`]);
  });
  test("is measured from the swing where that is nearer", () => {
    // Swing 5 m: boundary 5 m, way 13 m.
    expect(passed(distance(5), { swingM: 5 })).toEqual([]);
    expect(passed(distance(6), { swingM: 5 })).toEqual(["boundary"]);
    expect(passed(distance(14), { swingM: 5 })).toEqual(["boundary", "public-way lane"]);
  });
  test("holds a boundary that runs under the machine", () => {
    const at = (xM: number, yM: number) => ({ xM, yM });
    const split = { ...project, boundary: [at(50, -500), at(60, -500), at(60, 500), at(50, 500)] };
    expect(zoneCrossings(split, machine("a", 50), distance(1))).toEqual([{ kind: "boundary" }]);
  });
  test("is looked for by level where the peak is not known", () => {
    expect(passed({ kind: "peak-not-known", machine: "a", leastM: 9.5 })).toEqual(["boundary"]);
    expect(passed({ kind: "peak-not-known", machine: "a", leastM: undefined })).toEqual([]);
  });
  test("is nothing for a zone without a distance", () => {
    for (const kind of ["inside-another", "whole-space", "none"] as const)
      expect(passed({ kind, machine: "a" })).toEqual([]);
  });
});
