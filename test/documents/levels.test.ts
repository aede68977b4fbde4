import { describe, expect, test } from "vitest";
import { editedTexts, mistakeLines } from "./content-folder.ts";
import { type Case, expectMistake, STATEMENT } from "./expect-mistake.ts";

const RIG = "data-sheets/plant/rig.json";
const BIG = "data-sheets/plant/big-rig.json";
const PUMP = "data-sheets/plant/pump.json";
const pressure = (ground: string) => ({ kind: "pressure-at-distance", distanceM: 10, ground });

function each(cases: readonly Case[]): void {
  test.each(cases)("%s", (_title, edits, file, piece, line) => expectMistake(edits, file, piece, line));
}

describe("emission levels refused by name", () => {
  each([
    [
      "a maximum",
      [[BIG, "/emission/metric", "LAFmax"]],
      BIG,
      '"LAFmax"',
      '/emission/metric: expected "LAeq-running" or "LAeq-cycle", received "LAFmax". A maximum is no average: find a source that gives L_Aeq.',
    ],
    [
      "the maximum of a drive-by",
      [[BIG, "/emission/metric", "drive-by-max"]],
      BIG,
      '"drive-by-max"',
      '/emission/metric: expected "LAeq-running" or "LAeq-cycle", received "drive-by-max". A maximum is no average: find a source that gives L_Aeq.',
    ],
    [
      "a peak",
      [[BIG, "/emission/metric", "LCpeak"]],
      BIG,
      '"LCpeak"',
      '/emission/metric: expected "LAeq-running" or "LAeq-cycle", received "LCpeak". A peak says nothing about the average; enter it under peak.',
    ],
    [
      "a level at the operator's place",
      [[BIG, "/emission/quantity", { kind: "work-station" }]],
      BIG,
      '"work-station"',
      '/emission/quantity/kind: expected "sound-power" or "pressure-at-distance", received "work-station". A level at the operator\'s place holds the near field of the machine: enter it under workStation.',
    ],
    [
      "pressure over unknown ground",
      [[BIG, "/emission/quantity", pressure("unknown")]],
      BIG,
      '"unknown"',
      '/emission/quantity/ground: expected "hard" or "none", received "unknown". Sound power cannot be worked out from a level over such ground: find a source that states hard ground or sound power.',
    ],
    [
      "pressure over soft ground",
      [[BIG, "/emission/quantity", pressure("soft")]],
      BIG,
      '"soft"',
      '/emission/quantity/ground: expected "hard" or "none", received "soft". Sound power cannot be worked out from a level over such ground: find a source that states hard ground or sound power.',
    ],
    [
      "a level in front of a facade",
      [[BIG, "/emission/field", "facade"]],
      BIG,
      '"facade"',
      '/emission/field: expected "free-field", received "facade". A level in front of a facade holds its reflection: find a source that states a free field.',
    ],
    [
      "one value without a shape",
      [[PUMP, "/emission/shapeFrom"]],
      PUMP,
      '{\n    "kind": "single"',
      "/emission/shapeFrom: expected the id of a plant sheet with octave bands, received nothing. Name the sheet of a like machine: without its shape one value cannot be spread over the bands.",
    ],
    [
      "one C-weighted value",
      [[PUMP, "/emission/weighting", "C"]],
      PUMP,
      '"C"',
      '/emission/weighting: expected "A" for a single value, received "C". Only an A-weighted value can borrow the shape of another machine.',
    ],
    [
      "C-weighted bands",
      [[BIG, "/emission/weighting", "C"]],
      BIG,
      '"C"',
      '/emission/weighting: expected "Z" or "A" for bands, received "C". Take the weighting off the bands, or enter them A-weighted.',
    ],
  ]);

  test.each([
    ["A-weighted bands", [[BIG, "/emission/weighting", "A"]]],
    ["pressure over hard ground", [[BIG, "/emission/quantity", pressure("hard")]]],
    ["pressure without any ground", [[BIG, "/emission/quantity", pressure("none")]]],
  ] as const)("taken: %s", (_title, edits) => {
    expect(mistakeLines(editedTexts(edits))).toEqual([]);
  });
});

describe("levels for the people on site", () => {
  each([
    [
      "sound power under workStation",
      [[RIG, "/workStation/quantity/kind", "sound-power"]],
      RIG,
      '"sound-power"\n    },\n    "metric": "LAeq-running",\n    "field": "free-field",\n    "kIncluded": false,\n    "uncertaintyDb": 3,\n    "operatingState": {\n      "en": "Working"\n    },\n    "character": {\n      "impulsive": false,\n      "tonal": false\n    },\n    "source": {\n      "document": "Example levels",\n      "edition": "2026",\n      "place": "row 1",\n      "checked": "invented"\n    },\n    "weighting": "A"',
      '/workStation/quantity/kind: expected "work-station", received "sound-power". Enter other levels under emission.',
    ],
    [
      "a maximum under workStation",
      [[RIG, "/workStation/metric", "LAFmax"]],
      RIG,
      '"LAFmax"',
      '/workStation/metric: expected "LAeq-running" or "LAeq-cycle", received "LAFmax". Exposure is worked out from an average; enter a peak under peak.',
    ],
    [
      "one Z-weighted value under workStation",
      [[RIG, "/workStation/weighting", "Z"]],
      RIG,
      '"Z"\n  },\n  "peak"',
      '/workStation/weighting: expected "A" for a single value, received "Z". Exposure is A-weighted.',
    ],
    [
      "an average under peak",
      [[RIG, "/peak/metric", "LAeq-running"]],
      RIG,
      '"LAeq-running",\n    "field": "free-field",\n    "kIncluded": false,\n    "uncertaintyDb": 3,\n    "operatingState": {\n      "en": "Working"\n    },\n    "character": {\n      "impulsive": false,\n      "tonal": false\n    },\n    "source": {\n      "document": "Example levels",\n      "edition": "2026",\n      "place": "row 1",\n      "checked": "invented"\n    },\n    "weighting": "C"',
      '/peak/metric: expected "LCpeak", received "LAeq-running". Peaks are compared as one C-weighted value.',
    ],
    [
      "an A-weighted peak",
      [[RIG, "/peak/weighting", "A"]],
      RIG,
      '"A"\n  }\n}',
      '/peak/weighting: expected "C", received "A". Peaks are compared as one C-weighted value.',
    ],
  ]);
});

describe("running times", () => {
  each([
    [
      "on-time below 100 % on a level that holds the cycle",
      [
        [RIG, "/emission/metric", "LAeq-cycle"],
        [STATEMENT, "/controls/3"],
      ],
      STATEMENT,
      '40,\n          "longestRunMin"',
      '/activities/0/plant/0/onTimePct: expected 100 % on "rig", whose level holds the work cycle, received 40 %. The level already holds the stops of the cycle: write 100, or use a sheet with the level while running.',
    ],
    [
      "a shorter running time on a level that holds the cycle",
      [
        [RIG, "/emission/metric", "LAeq-cycle"],
        [STATEMENT, "/activities/0/plant/0/onTimePct", 100],
      ],
      STATEMENT,
      '"rig-1"\n      ],\n      "insteadOfPct"',
      '/controls/3/appliesTo/0: expected an item with a level while running, received "rig-1", whose level holds the work cycle. Use a sheet with the level while running.',
    ],
    [
      "a running time that the control would lengthen",
      [[STATEMENT, "/controls/3/insteadOfPct", 30]],
      STATEMENT,
      '30\n    },\n    {\n      "id": "east-bund"',
      '/controls/3/insteadOfPct: expected more than the 40 % that "rig-1" runs with this control, received 30 %. Enter the on-time there would be without this control.',
    ],
    [
      "quieter plant instead of itself",
      [[STATEMENT, "/controls/2/insteadOf", "rig"]],
      STATEMENT,
      '"rig"\n    },\n    {\n      "id": "short-runs"',
      '/controls/2/insteadOf: expected a sheet other than that of "rig-1", received "rig". Name the plant that would run without this control.',
    ],
    [
      "quieter plant instead of a level that holds the cycle, with an on-time below 100 %",
      [[BIG, "/emission/metric", "LAeq-cycle"]],
      STATEMENT,
      '"big-rig"',
      '/controls/2/insteadOf: expected a sheet with the level while running, as "rig-1" runs 40 % of the time, received "big-rig", whose level holds the work cycle. Use another sheet for what would run without this control.',
    ],
  ]);
});
