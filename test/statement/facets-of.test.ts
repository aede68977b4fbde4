import { describe, expect, test } from "vitest";
import { imageIn } from "../../compute/acoustics/reflections/image.ts";
import type { Point } from "../../compute/acoustics/site.ts";
import { facetsOf } from "../../compute/statement/facets-of.ts";
import type { StatementInputs } from "../../compute/statement/inputs.ts";
import { sceneInputs, type Writable } from "../helpers/scene-inputs.ts";

type Alter = (inputs: Writable<StatementInputs>) => void;

/** Facets of the scene worked out by hand while the breaker works, its buildings and its screen in place. */
function facets(alter: Alter = () => undefined) {
  const inputs = sceneInputs((copy) => {
    for (const building of copy.project.buildings) building.walls = "flat";
    alter(copy);
  });
  const breaking = inputs.statement.activities.find(({ id }) => id === "breaking");
  if (!breaking) throw new Error("the scene breaks out");
  return facetsOf(inputs, inputs.statement.controls, breaking);
}
const point = (xM: number, yM: number): Point => ({ at: { xM, yM }, groundM: 3, heightM: 1 });
const reflects = (from: Point, to: Point, alter?: Alter) =>
  facets(alter)
    .filter((facet) => imageIn(facet, from, to) !== undefined)
    .map(({ owner, from: { yM }, to: end }) => [owner, yM, end.yM]);

describe("walls of a building", () => {
  // The sack store stands from (56, 6) to (64, 14); the images in its other walls lie inside it.
  const turned: Alter = ({ project }) => {
    for (const building of project.buildings) building.outline.reverse();
  };
  test("reflect outwards only, whichever way the outline is drawn", () => {
    for (const alter of [undefined, turned]) {
      expect(reflects(point(58, 20), point(62, 20), alter)).toEqual([
        ["sack-store", 14, 14],
        ["north-screen", 40, 40],
      ]);
      expect(reflects(point(58, 0), point(62, 0), alter)[0]).toEqual(["sack-store", 6, 6]);
    }
  });
  test("stand from the ground of the building to its roof", () => {
    const [low, high] = [facets().filter(({ owner }) => owner === "sack-store"), facets()].map((list) => list[0]);
    expect([low?.bottomM, low?.topM]).toEqual([3, 7]);
    // The houses stand on ground at 5 m.
    expect([high?.owner, high?.bottomM, high?.topM]).toEqual(["terrace-houses", 5, 13]);
  });
  test("reflect by their kind: ρ of Table 4 [memory]", () => {
    const of = (walls: "flat" | "with-windows" | "half-open" | "not-reflecting") =>
      facets(({ project }) => {
        for (const building of project.buildings) building.walls = walls;
      })[0]?.reflection[1000];
    expect([of("flat"), of("with-windows"), of("half-open"), of("not-reflecting")]).toEqual([1, 0.8, 0.4, 0]);
  });
  test("that do not stand throughout the activity do not reflect", () => {
    const gone = facets(({ project }) => {
      for (const building of project.buildings) building.standsUntil = { kind: "date", date: "2027-03-20" };
    });
    expect(gone.map(({ owner }) => owner)).toEqual(["north-screen"]);
  });
});

describe("screens", () => {
  test("reflect on both sides, as much as their lining leaves", () => {
    // [derived] 1 − α of the wool lining: 0.9, 0.75, 0.4, 0.15, 0.1, 0.1, 0.15, 0.2.
    const lined = facets(({ statement }) => {
      for (const control of statement.controls)
        if (control.kind === "screen") control.facing = { kind: "absorptive", sheet: "wool-lining" };
    }).find(({ owner }) => owner === "north-screen");
    expect(lined?.reflects).toBe("both-sides");
    const values = Object.values(lined?.reflection ?? {}).map((value) => Number(value.toFixed(6)));
    expect(values).toEqual([0.9, 0.75, 0.4, 0.15, 0.1, 0.1, 0.15, 0.2]);
    const hard = facets().find(({ owner }) => owner === "north-screen");
    expect(Object.values(hard?.reflection ?? {})).toEqual([1, 1, 1, 1, 1, 1, 1, 1]);
  });
});
