import { describe, expect, test } from "vitest";
import { editedTexts, mistakeLines } from "./content-folder.ts";
import { type Case, expectMistake, PROJECT, STATEMENT } from "./expect-mistake.ts";

const PLANT = "data-sheets/plant/rig.json";

const CASES: readonly Case[] = [
  [
    "a field that is not known",
    [[PROJECT, "/nickname", "Quay"]],
    PROJECT,
    '"nickname"',
    '/nickname: expected a field of this object, received "nickname". Fields here: "id", "invented", "title", "town", "client", "contractor", "languages", "timeZone", "publicUrl", "groundLevelM", "hours", "method", "boundary", "publicWays", "buildings", "excavations", "ground", "receptors", "limitSets", "dutySet", "contacts", "confirmed" and "acknowledged".',
  ],
  [
    "a mistyped field is one mistake, although the right one is missing",
    [
      [STATEMENT, "/activities/0/plant/0/onTimePct"],
      [STATEMENT, "/activities/0/plant/0/ontimePct", 40],
    ],
    STATEMENT,
    '"ontimePct"',
    '/activities/0/plant/0/ontimePct: expected a field of this object, received "ontimePct". Did you mean "onTimePct"?',
  ],
  [
    "a number out of range, with its unit and what it is",
    [[STATEMENT, "/activities/0/plant/0/onTimePct", 140]],
    STATEMENT,
    "140",
    "/activities/0/plant/0/onTimePct: expected a number above 0 and up to 100 %, received 140. Give: share of the activity's own working window in which it runs at its stated level.",
  ],
  [
    "zero where it must be above zero",
    [[STATEMENT, "/shiftH", 0]],
    STATEMENT,
    '0,\n  "activities"',
    "/shiftH: expected a number above 0 and up to 24 h, received 0. Give: length of the shift of the people on site.",
  ],
  [
    "a number below its least",
    [[PROJECT, "/method/humidityPct", -5]],
    PROJECT,
    "-5,",
    "/method/humidityPct: expected a number from 10 to 100 %, received -5. Give: relative humidity for air absorption.",
  ],
  [
    "text for a number",
    [[STATEMENT, "/controls/0/heightM", "3 m"]],
    STATEMENT,
    '"3 m"',
    '/controls/0/heightM: expected a number above 0 and up to 500 m, received "3 m". Give: height above the ground here.',
  ],
  [
    "null for a number",
    [[PROJECT, "/groundLevelM", null]],
    PROJECT,
    "null",
    "/groundLevelM: expected a number from -500 to 9000 m, received null. Give: ground level wherever no other is given, metres above the project's own datum.",
  ],
  [
    "text for true or false",
    [[PROJECT, "/invented", "yes"]],
    PROJECT,
    '"yes"',
    '/invented: expected true or false, received "yes". Give: true for a made-up example: every page and sheet made from it says so.',
  ],
  [
    "a list for an object",
    [[PROJECT, "/ground", []]],
    PROJECT,
    '[],\n  "receptors"',
    "/ground: expected an object, received an empty list. Give: the ground sound passes over.",
  ],
  [
    "an object for a list",
    [[PROJECT, "/hours", {}]],
    PROJECT,
    '{},\n  "method"',
    "/hours: expected a list of at least 1, received an empty object. Give: permitted working hours.",
  ],
  [
    "a missing field stands at the object that misses it",
    [[STATEMENT, "/vibration"]],
    STATEMENT,
    '{\n  "project"',
    '/vibration: expected an object of the kind "not-expected" or "expected", received nothing. Give: whether vibration is expected; it is not computed.',
  ],
  [
    "a missing field inside a variant",
    [[STATEMENT, "/controls/0/panel"]],
    STATEMENT,
    '{\n      "id": "south-screen"',
    '/controls/0/panel: expected text such as "north-quay", received nothing. Give: id of the panel sheet it is made of.',
  ],
  [
    "one of two fields that go together",
    [[STATEMENT, "/activities/0/plant/0/shortestStopMin"]],
    STATEMENT,
    '{\n          "id": "rig-1"',
    '/activities/0/plant/0/shortestStopMin: expected a number above 0 and up to 1440 min beside "longestRunMin", received nothing. Give: shortest stop between two runs.',
  ],
  [
    "a mistyped word of a list",
    [[PROJECT, "/receptors/0/use", "dweling"]],
    PROJECT,
    '"dweling"',
    '/receptors/0/use: expected "dwelling", "school", "hospital", "worship", "office", "industry" or "outdoor", received "dweling". Did you mean "dwelling"?',
  ],
  [
    "a word that is like none of a list",
    [[PROJECT, "/receptors/0/use", "xyz"]],
    PROJECT,
    '"xyz"',
    '/receptors/0/use: expected "dwelling", "school", "hospital", "worship", "office", "industry" or "outdoor", received "xyz". Give: what it is used as.',
  ],
  [
    "a mistyped kind",
    [[STATEMENT, "/controls/0/kind", "scren"]],
    STATEMENT,
    '"scren"',
    '/controls/0/kind: expected "screen", "bund", "enclosure", "quieter-plant", "running-time" or "practice", received "scren". Did you mean "screen"?',
  ],
  [
    "a kind that is like none",
    [[PLANT, "/emission/quantity", { kind: "loudness" }]],
    PLANT,
    '"loudness"',
    '/emission/quantity/kind: expected "sound-power", "pressure-at-distance" or "work-station", received "loudness". Known here: "pressure-at-distance", "sound-power" and "work-station".',
  ],
  [
    "a missing kind",
    [[STATEMENT, "/vibration/kind"]],
    STATEMENT,
    '{\n    "why"',
    '/vibration/kind: expected "not-expected" or "expected", received nothing. The kind says which fields follow.',
  ],
  [
    "an id with capital letters and spaces",
    [[PROJECT, "/receptors/0/id", "Quay Road"]],
    PROJECT,
    '"Quay Road",\n      "name"',
    '/receptors/0/id: expected text such as "north-quay", received "Quay Road". Give: id of the receptor.',
  ],
  [
    "a word that the site keeps",
    [
      [PROJECT, "/receptors/0/id", "board"],
      [STATEMENT, "/zoneAnswers/1"],
    ],
    PROJECT,
    '"board"',
    '/receptors/0/id: expected an id that the site does not keep for its own addresses, received "board". Kept are "near", "register", "measured", "issued", "workings", "changes", "board", "ear-protection", "briefing", "letter", "data-sheets", "calculation", "limits", "duties" and "assets", and r with a number.',
  ],
  [
    "the address of a revision",
    [[STATEMENT, "/offers/0/id", "r12"]],
    STATEMENT,
    '"r12"',
    '/offers/0/id: expected an id that the site does not keep for its own addresses, received "r12". Kept are "near", "register", "measured", "issued", "workings", "changes", "board", "ear-protection", "briefing", "letter", "data-sheets", "calculation", "limits", "duties" and "assets", and r with a number.',
  ],
  [
    "a time without its leading zero",
    [[STATEMENT, "/activities/0/windows/0/from", "8:00"]],
    STATEMENT,
    '"8:00"',
    '/activities/0/windows/0/from: expected text such as "07:00", received "8:00". Give: start of the window, 00:00 to 23:59.',
  ],
  [
    "24:00 as a start",
    [[STATEMENT, "/activities/0/windows/0/from", "24:00"]],
    STATEMENT,
    '"24:00"',
    '/activities/0/windows/0/from: expected text such as "07:00", received "24:00". Give: start of the window, 00:00 to 23:59.',
  ],
  [
    "a day that no calendar has",
    [[STATEMENT, "/until", "2027-02-30"]],
    STATEMENT,
    '"2027-02-30"',
    '/until: expected text such as "2027-03-01", received "2027-02-30". Give: last day of the phase.',
  ],
  [
    "an e-mail address without its sign",
    [[PROJECT, "/contacts/0/email", "noise.north-quay"]],
    PROJECT,
    '"noise.north-quay"',
    '/contacts/0/email: expected text such as "noise@saltpan.example", received "noise.north-quay". Give: E-mail address.',
  ],
  [
    "empty words",
    [[PROJECT, "/title/en", ""]],
    PROJECT,
    '""',
    '/title/en: expected text that is not empty, received "". Give: the words in that language.',
  ],
  [
    "words in no language",
    [[PROJECT, "/title", {}]],
    PROJECT,
    '{},\n  "town"',
    "/title: expected at least one entry, received an empty object. Give: name of the project.",
  ],
  [
    "words under a name that is no language code",
    [[PROJECT, "/title", { en: "North Quay", polish: "x" }]],
    PROJECT,
    '"polish"',
    '/title/polish: expected a name such as "en", received "polish". Give: language code, ISO 639 with an optional country.',
  ],
  [
    "a list that is too short",
    [[STATEMENT, "/controls/0/line/1"]],
    STATEMENT,
    '[\n        {\n          "xM": 10,\n          "yM": 5\n        }\n      ]',
    "/controls/0/line: expected a list of at least 2, received a list of 1. Give: where it stands.",
  ],
  [
    "an entry twice",
    [[PROJECT, "/limitSets", ["consent", "consent"]]],
    PROJECT,
    '"consent"\n',
    '/limitSets/1: expected each entry once, received "consent" twice. Take one of the two away.',
  ],
  [
    "a small number of homes",
    [[PROJECT, "/receptors/0/homes", 3]],
    PROJECT,
    '3,\n      "points"',
    '/receptors/0/homes: expected a whole number from 5 to 100000 or 0 or "fewer-than-5", received 3. Give: number of homes: 0, a whole number from 5, or "fewer-than-5"; small counts are never entered, as the files are public.',
  ],
  [
    "a level value without its comparator",
    [["duties/law.json", "/informationFrom/comparator"]],
    "duties/law.json",
    '{\n    "levelDba": 80',
    '/informationFrom/comparator: expected "above" or "at-or-above" beside "levelDba", received nothing. Give: whether the level itself counts as reached.',
  ],
  [
    "a worst stretch of more than an hour",
    [["limits/consent.json", "/rules/1/averaging/minutes", 90]],
    "limits/consent.json",
    "90",
    "/rules/1/averaging/minutes: expected a number above 0 and up to 60 min, received 90. Give: length of the stretch.",
  ],
  [
    "an absorption coefficient above 1",
    [["data-sheets/linings/wool.json", "/absorption/500", 1.2]],
    "data-sheets/linings/wool.json",
    "1.2",
    "/absorption/500: expected a number from 0 to 1, received 1.2. Give: absorption coefficient in the 500 Hz band.",
  ],
  [
    "a missing octave band",
    [["data-sheets/panels/ply.json", "/reductionIndexDb/63"]],
    "data-sheets/panels/ply.json",
    '{\n    "125"',
    "/reductionIndexDb/63: expected a number from 0 to 100 dB, received nothing. Give: reduction in the 63 Hz band.",
  ],
  [
    "a name of words that could reach into the program",
    [["wording/en.json", "/sections/home", JSON.parse('{"title": "x", "__proto__": "y"}')]],
    "wording/en.json",
    '"__proto__"',
    '/sections/home/__proto__: expected a name such as "quietHours", received "__proto__". Give: name of a section or of words in it: letters, digits, dots, hyphens and underscores, starting with a letter.',
  ],
];

describe("one wrong value is one line", () => {
  test.each(CASES)("%s", (_title, edits, file, piece, line) => {
    expectMistake(edits, file, piece, line);
  });
});

test("a number too great for a number", () => {
  const texts = editedTexts([]);
  const text = (texts[STATEMENT] ?? "").replace('"shiftH": 10', '"shiftH": 1e999');
  expect(mistakeLines({ ...texts, [STATEMENT]: text })).toEqual([
    `${STATEMENT}:16:13 /shiftH: expected a number above 0 and up to 24 h, received Infinity. Give: length of the shift of the people on site.`,
  ]);
});

test("all mistakes of all files come at once, by file and line", () => {
  const texts = editedTexts([
    [PROJECT, "/groundLevelM", "two"],
    [PROJECT, "/dutySet", 5],
    ["duties/law.json", "/edition", 2026],
    [STATEMENT, "/shiftH", -1],
  ]);
  expect(mistakeLines(texts).map((line) => line.split(":")[0])).toEqual([
    "duties/law.json",
    STATEMENT,
    PROJECT,
    PROJECT,
  ]);
});
