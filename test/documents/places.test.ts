import { describe, expect, test } from "vitest";
import { editedTexts, mistakeLines } from "./content-folder.ts";
import { type Case, expectMistake, PROJECT, STATEMENT } from "./expect-mistake.ts";

const PLY = "data-sheets/panels/ply.json";
const at = (xM: number, yM: number) => ({ xM, yM });

function each(cases: readonly Case[]): void {
  test.each(cases)("%s", (_title, edits, file, piece, line) => expectMistake(edits, file, piece, line));
}

describe("lines and outlines", () => {
  each([
    [
      "a screen of no length",
      [
        [STATEMENT, "/controls/0/line", [at(10, 5), at(10.05, 5)]],
        [STATEMENT, "/controls/0/gaps", []],
      ],
      STATEMENT,
      '{\n          "xM": 10.05',
      "/controls/0/line/1: expected a point at least 0.1 m from the one it is joined to, received 0.050 m. Take one of the two points away, or move it.",
    ],
    [
      "a bund of no length",
      [[STATEMENT, "/controls/4/line", [at(75, 10), at(75, 10.05)]]],
      STATEMENT,
      '{\n          "xM": 75,\n          "yM": 10.05',
      "/controls/4/line/1: expected a point at least 0.1 m from the one it is joined to, received 0.050 m. Take one of the two points away, or move it.",
    ],
    [
      "an excavation like an hourglass",
      [[PROJECT, "/excavations/0/outline", [at(46, 26), at(54, 34), at(54, 26), at(46, 34)]]],
      PROJECT,
      '[\n        {\n          "xM": 46,',
      "/excavations/0/outline: expected an outline that does not cross itself, received edges 0 and 2 that cross or touch (edge 0 leaves corner 0). Put the corners in order around the outline.",
    ],
    [
      "a corner of the boundary twice, first and last",
      [[PROJECT, "/boundary/-", at(0, 0)]],
      PROJECT,
      '{\n      "xM": 0,\n      "yM": 0\n    }\n',
      "/boundary/4: expected a point at least 0.1 m from the one it is joined to, received 0.000 m. Take one of the two points away, or move it.",
    ],
    [
      "an outline like an hourglass",
      [[PROJECT, "/ground/areas/0/outline", [at(100, 0), at(120, 20), at(120, 0), at(100, 20)]]],
      PROJECT,
      '[\n          {\n            "xM": 100,',
      "/ground/areas/0/outline: expected an outline that does not cross itself, received edges 0 and 2 that cross or touch (edge 0 leaves corner 0). Put the corners in order around the outline.",
    ],
    [
      "an outline that runs back along itself",
      [[PROJECT, "/ground/areas/0/outline", [at(100, 0), at(120, 0), at(110, 0)]]],
      PROJECT,
      '[\n          {\n            "xM": 100,',
      "/ground/areas/0/outline: expected an outline that does not cross itself, received edges 0 and 1 that cross or touch (edge 0 leaves corner 0). Put the corners in order around the outline.",
    ],
  ]);
});

describe("places of plant and receptors", () => {
  each([
    [
      "plant inside a building",
      [[STATEMENT, "/activities/0/plant/1/at", at(65, 45)]],
      STATEMENT,
      '{\n            "xM": 65,',
      '/activities/0/plant/1/at: expected a place outside the buildings that stand while the activity runs, received a place inside "shed". Move it, give its groundM if it stands on the roof, or say when the building is taken down.',
    ],
    [
      "plant in a screen",
      [[STATEMENT, "/activities/0/plant/1/at", at(30, 5.06)]],
      STATEMENT,
      '{\n            "xM": 30,\n            "yM": 5.06',
      '/activities/0/plant/1/at: expected a place more than 0.1 m from every screen, received 0.060 m from "south-screen". Move the machine or the screen.',
    ],
    [
      "plant on a bund",
      [[STATEMENT, "/activities/0/plant/1/at", at(75.05, 30)]],
      STATEMENT,
      '{\n            "xM": 75.05,',
      '/activities/0/plant/1/at: expected a place more than 0.1 m from every bund, received 0.050 m from "east-bund". Move the machine or the bund.',
    ],
    [
      "a receptor point inside a building",
      [[PROJECT, "/receptors/0/points/0/at", at(20, -51)]],
      PROJECT,
      '{\n            "xM": 20,',
      '/receptors/0/points/0/at: expected a place outside every building, received a place inside "terrace". Put it in front of the facade, for instance 1 m.',
    ],
    [
      "a receptor point in a screen",
      [[STATEMENT, "/controls/0/line", [at(10, -49), at(50, -49)]]],
      STATEMENT,
      '[\n        {\n          "xM": 10,',
      '/controls/0/line: expected a line more than 0.1 m from every receptor point, received 0.000 m from "terrace-first-floor". Move the screen or the receptor point.',
    ],
    [
      "a receptor point on a bund",
      [[STATEMENT, "/controls/4/line", [at(15, -49), at(50, -49)]]],
      STATEMENT,
      '[\n        {\n          "xM": 15,',
      '/controls/4/line: expected a line more than 0.1 m from every receptor point, received 0.000 m from "terrace-first-floor". Move the bund or the receptor point.',
    ],
  ]);

  test("plant may stand on a roof, and where a building is gone before the activity ends", () => {
    const inShed = [STATEMENT, "/activities/0/plant/1/at", at(65, 45)] as const;
    expect(mistakeLines(editedTexts([inShed, [STATEMENT, "/activities/0/plant/1/groundM", 7]]))).toEqual([]);
    const gone = [PROJECT, "/buildings/1/standsUntil", { kind: "date", date: "2027-03-07" }] as const;
    expect(mistakeLines(editedTexts([inShed, gone]))).toEqual([]);
  });
});

describe("screens and enclosures", () => {
  each([
    [
      "a screen that is too light",
      [[PLY, "/surfaceDensityKgm2", 9.5]],
      STATEMENT,
      '"ply",\n      "standsFrom"',
      '/controls/0/panel: expected a closed panel of at least 10 kg/m² (ISO 9613-2:1996, 7.4), received "ply" with 9.5 kg/m². It may not count as a screen: choose another panel.',
    ],
    [
      "a screen with gaps",
      [[PLY, "/closed", false]],
      STATEMENT,
      '"ply",\n      "standsFrom"',
      '/controls/0/panel: expected a closed panel of at least 10 kg/m² (ISO 9613-2:1996, 7.4), received "ply", which is not closed. It may not count as a screen: choose another panel.',
    ],
    [
      // [derived] 40 m of 3 m: 120 m²
      "a screen that is all gap",
      [[STATEMENT, "/controls/0/gaps/0/areaM2", 120]],
      STATEMENT,
      '[\n        {\n          "id": "under-the-panels"',
      "/controls/0/gaps: expected gaps of less than the 120.0 m² of the face, received 120.0 m² of gaps. Enter the area of the openings under and between the panels.",
    ],
    [
      // [derived] 1.25 / (20 + 1.25) = 5.88 %
      "a partial enclosure",
      [[STATEMENT, "/controls/1/openings/0/areaM2", 1.25]],
      STATEMENT,
      '[\n        {\n          "id": "air-intake"',
      "/controls/1/openings: expected openings of at most 5 % of faces and openings, received 5.9 % (1.25 of 21.25 m²). That is a partial enclosure, which this version does not compute: close more of it, or enter a screen.",
    ],
    [
      "a lining larger than the faces",
      [[STATEMENT, "/controls/1/lining/areaM2", 24]],
      STATEMENT,
      "24",
      "/controls/1/lining/areaM2: expected a lined area of at most the 20 m² of the faces, received 24 m². Enter the area inside the faces that is lined.",
    ],
  ]);

  test("openings of exactly 5 % are a full enclosure", () => {
    // [derived] 1 / (19 + 1) = 5 %
    const edits = [
      [STATEMENT, "/controls/1/faces/0/areaM2", 19],
      [STATEMENT, "/controls/1/openings/0/areaM2", 1],
    ] as const;
    expect(mistakeLines(editedTexts(edits))).toEqual([]);
  });
});
