import { describe, expect, test } from "vitest";
import { editedTexts, mistakeLines } from "./content-folder.ts";
import { type Case, expectMistake, PROJECT, STATEMENT } from "./expect-mistake.ts";

const RIG = "data-sheets/plant/rig.json";
const PUMP = "data-sheets/plant/pump.json";
const PLY = "data-sheets/panels/ply.json";
const CONSENT = "limits/consent.json";

/** Prints each case as a test: one mistake, its whole line. */
function each(cases: readonly Case[]): void {
  test.each(cases)("%s", (_title, edits, file, piece, line) => expectMistake(edits, file, piece, line));
}

test("the base has no mistake", () => {
  expect(mistakeLines(editedTexts([]))).toEqual([]);
});

describe("names and ids", () => {
  each([
    [
      "a sheet with another id than its file",
      [[PLY, "/id", "plywood"]],
      PLY,
      '"plywood"',
      '/id: expected "ply", the name of the file, received "plywood". Rename the file, or write its name here.',
    ],
    [
      "a project with another id than its folder",
      [[PROJECT, "/id", "south-quay"]],
      PROJECT,
      '"south-quay"',
      '/id: expected "north-quay", the name of the folder, received "south-quay". Rename the folder, or write its name here.',
    ],
    [
      "a statement of another project",
      [[STATEMENT, "/project", "south-quay"]],
      STATEMENT,
      '"south-quay"',
      '/project: expected "north-quay", the name of the folder, received "south-quay". Rename the folder, or write its name here.',
    ],
    [
      "a statement of another phase",
      [[STATEMENT, "/phase", "digging"]],
      STATEMENT,
      '"digging"',
      '/phase: expected "piling", the name of the folder, received "digging". Rename the folder, or write its name here.',
    ],
    [
      "words in another language than the file says",
      [["wording/en.json", "/language", "pl"]],
      "wording/en.json",
      '"pl"',
      '/language: expected "en", the name of the file, received "pl". Rename the file, or write its name here.',
    ],
    [
      "two things with one id",
      [[STATEMENT, "/controls/3/id", "rig-1"]],
      STATEMENT,
      '"rig-1",\n      "kind"',
      '/controls/3/id: expected an id that nothing else in this document has, received "rig-1", which /activities/0/plant/0 has too. Give one of the two another id.',
    ],
    [
      "a control with the id of an excavation",
      [[STATEMENT, "/controls/4/id", "pump-pit"]],
      STATEMENT,
      '"pump-pit"',
      '/controls/4/id: expected an id that no building or excavation of the project has, received "pump-pit". Give the control another id.',
    ],
    [
      "a period of one id with two shapes",
      [[CONSENT, "/rules/1/period/from", "08:00"]],
      CONSENT,
      '{\n        "id": "day",\n        "name": {\n          "en": "Day"\n        },\n        "days": [\n          "mon"\n        ],\n        "from": "08:00"',
      '/rules/1/period: expected mon 07:00-19:00, as the period "day" has above, received mon 08:00-19:00. Give one of the two periods another id.',
    ],
  ]);
});

describe("references", () => {
  each([
    [
      "a plant sheet that is not there",
      [[STATEMENT, "/activities/0/plant/0/sheet", "rigg"]],
      STATEMENT,
      '"rigg"',
      '/activities/0/plant/0/sheet: expected the id of a plant sheet, received "rigg". Did you mean "rig"?',
    ],
    [
      "a plant sheet like none that is there",
      [[STATEMENT, "/activities/0/plant/0/sheet", "excavator"]],
      STATEMENT,
      '"excavator"',
      '/activities/0/plant/0/sheet: expected the id of a plant sheet, received "excavator". Known here: "big-rig", "pump" and "rig".',
    ],
    [
      "a panel of a screen",
      [[STATEMENT, "/controls/0/panel", "plyy"]],
      STATEMENT,
      '"plyy"',
      '/controls/0/panel: expected the id of a panel sheet, received "plyy". Did you mean "ply"?',
    ],
    [
      "a lining that faces a screen",
      [[STATEMENT, "/controls/0/facing/sheet", "wol"]],
      STATEMENT,
      '"wol"',
      '/controls/0/facing/sheet: expected the id of a lining sheet, received "wol". Did you mean "wool"?',
    ],
    [
      "a panel of an enclosure",
      [[STATEMENT, "/controls/1/faces/0/panel", "plyy"]],
      STATEMENT,
      '"plyy"',
      '/controls/1/faces/0/panel: expected the id of a panel sheet, received "plyy". Did you mean "ply"?',
    ],
    [
      "a silencer",
      [[STATEMENT, "/controls/1/openings/0/silencer", "luvre"]],
      STATEMENT,
      '"luvre"',
      '/controls/1/openings/0/silencer: expected the id of a silencer sheet, received "luvre". Did you mean "louvre"?',
    ],
    [
      "a lining",
      [[STATEMENT, "/controls/1/lining/sheet", "wol"]],
      STATEMENT,
      '"wol"',
      '/controls/1/lining/sheet: expected the id of a lining sheet, received "wol". Did you mean "wool"?',
    ],
    [
      "a floor",
      [[STATEMENT, "/controls/1/floor/sheet", "wol"]],
      STATEMENT,
      '"wol"',
      '/controls/1/floor/sheet: expected the id of a lining sheet, received "wol". Did you mean "wool"?',
    ],
    [
      "the sheet of what is not lined",
      [[STATEMENT, "/controls/1/unlinedSheet", "wol"]],
      STATEMENT,
      '"wol"',
      '/controls/1/unlinedSheet: expected the id of a lining sheet, received "wol". Did you mean "wool"?',
    ],
    [
      "plant that would run without a control",
      [[STATEMENT, "/controls/2/insteadOf", "bigrig"]],
      STATEMENT,
      '"bigrig"',
      '/controls/2/insteadOf: expected the id of a plant sheet, received "bigrig". Did you mean "big-rig"?',
    ],
    [
      "a limit set",
      [[PROJECT, "/limitSets/0", "consents"]],
      PROJECT,
      '"consents"',
      '/limitSets/0: expected the id of a limit set, received "consents". Did you mean "consent"?',
    ],
    [
      "a duty set where there is none at all",
      [
        ["duties/law.json", ""],
        [PROJECT, "/acknowledged", []],
      ],
      PROJECT,
      '"law"',
      '/dutySet: expected the id of a duty set, received "law". There is no duty set yet.',
    ],
    [
      "a building of a facade",
      [[PROJECT, "/receptors/0/points/0/position/building", "terace"]],
      PROJECT,
      '"terace"',
      '/receptors/0/points/0/position/building: expected the id of a building of this project, received "terace". Did you mean "terrace"?',
    ],
    [
      "a phase until which a building stands",
      [[PROJECT, "/buildings/1/standsUntil/phase", "pilling"]],
      PROJECT,
      '"pilling"',
      '/buildings/1/standsUntil/phase: expected the id of a phase of this project, received "pilling". Did you mean "piling"?',
    ],
    [
      "a phase from which an excavation is there",
      [[PROJECT, "/excavations/0/standsFrom/phase", "pilling"]],
      PROJECT,
      '"pilling"',
      '/excavations/0/standsFrom/phase: expected the id of a phase of this project, received "pilling". Did you mean "piling"?',
    ],
    [
      "a phase from which a bund stands",
      [[STATEMENT, "/controls/4/standsFrom", { kind: "phase", phase: "pilling" }]],
      STATEMENT,
      '"pilling"',
      '/controls/4/standsFrom/phase: expected the id of a phase of this project, received "pilling". Did you mean "piling"?',
    ],
    [
      "a phase from which a screen stands",
      [[STATEMENT, "/controls/0/standsFrom", { kind: "phase", phase: "pilling" }]],
      STATEMENT,
      '"pilling"',
      '/controls/0/standsFrom/phase: expected the id of a phase of this project, received "pilling". Did you mean "piling"?',
    ],
    [
      "plant that a control applies to",
      [[STATEMENT, "/controls/1/appliesTo/0", "pump-2"]],
      STATEMENT,
      '"pump-2"',
      '/controls/1/appliesTo/0: expected the id of a plant item of this statement, received "pump-2". Did you mean "pump-1"?',
    ],
    [
      "plant of a zone answer",
      [[STATEMENT, "/zoneAnswers/2/plant", "rig-2"]],
      STATEMENT,
      '"rig-2"',
      '/zoneAnswers/2/plant: expected the id of a plant item of this statement, received "rig-2". Did you mean "rig-1"?',
    ],
    [
      "a public way of a zone answer",
      [[STATEMENT, "/zoneAnswers/0/crosses/id", "quayroad"]],
      STATEMENT,
      '"quayroad"',
      '/zoneAnswers/0/crosses/id: expected the id of a public way of this project, received "quayroad". Did you mean "quay-road"?',
    ],
    [
      "a receptor of a zone answer",
      [[STATEMENT, "/zoneAnswers/1/crosses/id", "school"]],
      STATEMENT,
      '"school"',
      '/zoneAnswers/1/crosses/id: expected the id of a receptor of this project, received "school". Known here: "terrace-homes".',
    ],
    [
      "a sheet that lends its shape",
      [[PUMP, "/emission/shapeFrom", "rigg"]],
      PUMP,
      '"rigg"',
      '/emission/shapeFrom: expected the id of a plant sheet, received "rigg". Did you mean "rig"?',
    ],
    [
      "a sheet that has no shape to lend",
      [[PUMP, "/emission/shapeFrom", "pump"]],
      PUMP,
      '"pump",\n    "quantity"',
      '/emission/shapeFrom: expected a plant sheet with octave bands, received "pump", which has the kind "single". Name the sheet of a like machine with octave bands.',
    ],
    [
      "a kind of document that cannot be confirmed",
      [[PROJECT, "/confirmed/0/document", "plants/rig"]],
      PROJECT,
      '"plants/rig"',
      '/confirmed/0/document: expected a kind and an id such as "plant/crawler-crane", received "plants/rig". Kinds are "duty-set", "limit-set", "lining", "panel", "plant" and "silencer".',
    ],
    [
      "a document that is confirmed and not there",
      [[PROJECT, "/confirmed/0/document", "plant/rigg"]],
      PROJECT,
      '"plant/rigg"',
      '/confirmed/0/document: expected the id of a document, received "plant/rigg". Did you mean "plant/rig"?',
    ],
    [
      "a place that is confirmed and not there",
      [[PROJECT, "/confirmed/0/pointer", "/emission/sorce"]],
      PROJECT,
      '"/emission/sorce"',
      '/confirmed/0/pointer: expected the pointer of a source in plant/rig, received "/emission/sorce". Sources there: "/emission/source", "/workStation/source" and "/peak/source".',
    ],
    [
      "something acknowledged that is no source",
      [[PROJECT, "/acknowledged/0/pointer", "/mandatoryFrom"]],
      PROJECT,
      '"/mandatoryFrom"',
      '/acknowledged/0/pointer: expected the pointer of a source in duty-set/law, received "/mandatoryFrom". Sources there: "/mandatoryFrom/source", "/informationFrom/source" and "/source".',
    ],
  ]);

  test("a sheet with a mistake of its own is not called unknown", () => {
    const lines = mistakeLines(editedTexts([[RIG, "/swingM", -1]]));
    expect(lines).toHaveLength(1);
    expect(lines[0]).toContain("/swingM: expected a number from 0 to 100 m, received -1.");
  });
});

describe("dates and times", () => {
  each([
    [
      "a phase that ends before it begins",
      [
        [STATEMENT, "/until", "2027-02-28"],
        [STATEMENT, "/activities/0/from", "2027-03-01"],
        [STATEMENT, "/activities/0/until", "2027-03-01"],
      ],
      STATEMENT,
      '"2027-02-28"',
      "/until: expected 2027-03-01 or later, received 2027-02-28. The phase cannot end before it begins.",
    ],
    [
      "an activity before the phase",
      [[STATEMENT, "/activities/0/from", "2027-02-28"]],
      STATEMENT,
      '"2027-02-28"',
      "/activities/0/from: expected 2027-03-01 or later, received 2027-02-28. Keep the activity within the dates of the phase, or move those.",
    ],
    [
      "an activity after the phase",
      [[STATEMENT, "/activities/0/until", "2027-05-01"]],
      STATEMENT,
      '"2027-05-01"',
      "/activities/0/until: expected 2027-04-30 or earlier, received 2027-05-01. Keep the activity within the dates of the phase, or move those.",
    ],
    [
      "an activity that ends before it begins",
      [[STATEMENT, "/activities/0/until", "2027-03-07"]],
      STATEMENT,
      '"2027-03-07"',
      "/activities/0/until: expected 2027-03-08 or later, received 2027-03-07. The activity cannot end before it begins.",
    ],
    [
      "a statement checked before it was prepared",
      [[STATEMENT, "/approval/checked/date", "2026-11-01"]],
      STATEMENT,
      '"2026-11-01"',
      "/approval/checked/date: expected 2026-11-02 or later, received 2026-11-01. A statement is checked after it was prepared.",
    ],
    [
      "a statement approved before it was checked",
      [
        [STATEMENT, "/approval/approved/date", "2026-11-02"],
        [STATEMENT, "/approval/prepared/date", "2026-11-01"],
      ],
      STATEMENT,
      '"2026-11-02"',
      "/approval/approved/date: expected 2026-11-03 or later, received 2026-11-02. A statement is approved after it was checked.",
    ],
    [
      "a screen struck before it is put up",
      [[STATEMENT, "/controls/0/standsUntil", { kind: "date", date: "2027-02-01" }]],
      STATEMENT,
      '{\n        "kind": "date",\n        "date": "2027-02-01"',
      "/controls/0/standsUntil: expected a day from 2027-03-01 on, received 2027-02-01. Nothing can be taken down before it is put up.",
    ],
    [
      "a building taken down, by phase, before it is put up",
      [[PROJECT, "/buildings/1/standsFrom", { kind: "date", date: "2027-05-01" }]],
      PROJECT,
      '{\n        "kind": "phase",\n        "phase": "piling"\n      },\n      "standsFrom"',
      "/buildings/1/standsUntil: expected a day from 2027-05-01 on, received 2027-04-30. Nothing can be taken down before it is put up.",
    ],
    [
      "an excavation filled before it is dug",
      [[PROJECT, "/excavations/0/standsUntil", { kind: "date", date: "2027-02-01" }]],
      PROJECT,
      '{\n        "kind": "date",\n        "date": "2027-02-01"',
      "/excavations/0/standsUntil: expected a day from 2027-03-01 on, received 2027-02-01. Nothing can be taken down before it is put up.",
    ],
    [
      "a bund taken away before it is heaped up",
      [[STATEMENT, "/controls/4/standsUntil", { kind: "date", date: "2027-02-01" }]],
      STATEMENT,
      '{\n        "kind": "date",\n        "date": "2027-02-01"',
      "/controls/4/standsUntil: expected a day from 2027-03-01 on, received 2027-02-01. Nothing can be taken down before it is put up.",
    ],
    [
      "a window without length",
      [
        [STATEMENT, "/activities/0/windows/0/to", "08:00"],
        [STATEMENT, "/activities/0/outsideHours", { en: "Tide" }],
      ],
      STATEMENT,
      '"08:00"\n',
      '/activities/0/windows/0/to: expected an end other than the start 08:00, received "08:00". For a whole day write 00:00 and 24:00.',
    ],
    [
      "hours without length",
      [[PROJECT, "/hours/1/to", "07:00"]],
      PROJECT,
      '"07:00"\n',
      '/hours/1/to: expected an end other than the start 07:00, received "07:00". For a whole day write 00:00 and 24:00.',
    ],
    [
      "a period without length",
      [
        [CONSENT, "/rules/0/period/to", "07:00"],
        [CONSENT, "/rules/1"],
      ],
      CONSENT,
      '"07:00"\n',
      '/rules/0/period/to: expected an end other than the start 07:00, received "07:00". For a whole day write 00:00 and 24:00.',
    ],
    [
      "a window outside the hours",
      [[STATEMENT, "/activities/0/windows/0/to", "20:00"]],
      STATEMENT,
      '{\n          "id": "driving-weekdays"',
      "/activities/0/windows/0: expected a window within the hours of the project, received mon 19:00, which is outside. Move the window, or give the activity outsideHours with the reason.",
    ],
    [
      "a window on a day without hours",
      [[STATEMENT, "/activities/0/windows/0/days", ["fri", "sun"]]],
      STATEMENT,
      '{\n          "id": "driving-weekdays"',
      "/activities/0/windows/0: expected a window within the hours of the project, received sun 08:00, which is outside. Move the window, or give the activity outsideHours with the reason.",
    ],
    [
      "two windows that overlap",
      [[STATEMENT, "/activities/0/windows/-", { id: "afternoons", days: ["wed"], from: "17:30", to: "18:30" }]],
      STATEMENT,
      '{\n          "id": "afternoons"',
      '/activities/0/windows/1: expected windows of one activity that do not overlap, received wed 17:30 in the window "driving-weekdays" too. Make one window of the two, or move one.',
    ],
    [
      "a time zone that is not there",
      [[PROJECT, "/timeZone", "Europe/Londn"]],
      PROJECT,
      '"Europe/Londn"',
      '/timeZone: expected a time zone of the IANA list such as "Europe/London", received "Europe/Londn". Did you mean "Europe/London"?',
    ],
    [
      "an offset for a time zone",
      [[PROJECT, "/timeZone", "+01:00"]],
      PROJECT,
      '"+01:00"',
      '/timeZone: expected a time zone of the IANA list such as "Europe/London", received "+01:00". Offsets will not do: they leave summer time out.',
    ],
  ]);

  test("a window past midnight is within hours past midnight, and the reason excuses one that is not", () => {
    const night = [
      STATEMENT,
      "/activities/0/windows/0",
      { id: "nights", days: ["sun"], from: "22:00", to: "05:00" },
    ] as const;
    expect(
      mistakeLines(editedTexts([night, [PROJECT, "/hours/-", { days: ["sun"], from: "21:00", to: "06:00" }]])),
    ).toEqual([]);
    expect(
      mistakeLines(
        editedTexts([night, [STATEMENT, "/activities/0/outsideHours", { en: "Railway closed at night only" }]]),
      ),
    ).toEqual([]);
    expect(mistakeLines(editedTexts([night]))).toHaveLength(1);
  });
});

describe("languages", () => {
  each([
    [
      "words that are missing in the first language",
      [[STATEMENT, "/what", { pl: "Wbijanie pali" }]],
      STATEMENT,
      '{\n    "pl"',
      '/what: expected words in "en", the first language of the project north-quay, received "pl" only. Add them; the first language is complete.',
    ],
    [
      "words of a sheet that are missing in the first language",
      [[PLY, "/name", { pl: "Sklejka", de: "Sperrholz" }]],
      PLY,
      '{\n    "pl"',
      '/name: expected words in "en", the first language of the project north-quay, received "pl" and "de" only. Add them; the first language is complete.',
    ],
    [
      "a language of the project that is none",
      [[PROJECT, "/languages/-", "xq"]],
      PROJECT,
      '"xq"',
      '/languages/1: expected a language code of ISO 639, received "xq". Codes have two or three small letters, then perhaps a hyphen and a country: "pl", "en-AU".',
    ],
    [
      "words in a language that is none",
      [[PROJECT, "/title/xq", "?"]],
      PROJECT,
      '"xq"',
      '/title/xq: expected a language code of ISO 639, received "xq". Codes have two or three small letters, then perhaps a hyphen and a country: "pl", "en-AU".',
    ],
  ]);
});

describe("what may not be mixed with what is real", () => {
  const real = [
    [PROJECT, "/invented", false],
    [STATEMENT, "/invented", false],
    [PROJECT, "/publicUrl"],
    [PROJECT, "/contacts/0/telephone", "+44 1632 555 123"],
    [PROJECT, "/contacts/0/email", "noise@harbour.gov.uk"],
    ...["data-sheets/plant/rig.json", "data-sheets/plant/big-rig.json", PUMP].flatMap((file) => [
      [file, "/invented", false] as const,
      [file, "/emission/source/checked", "read"] as const,
    ]),
    [RIG, "/workStation"],
    [RIG, "/peak"],
    ...[PLY, "data-sheets/linings/wool.json", "data-sheets/silencers/louvre.json", "duties/law.json"].flatMap(
      (file) => [[file, "/invented", false] as const, [file, "/source/checked", "read"] as const],
    ),
    ["duties/law.json", "/mandatoryFrom/source/checked", "read"],
    ["duties/law.json", "/informationFrom/source/checked", "read"],
    [CONSENT, "/invented", false],
    [CONSENT, "/rules/0/source/checked", "read"],
    [CONSENT, "/rules/1/source/checked", "read"],
  ] as const;

  test("a project without anything invented has no mistake", () => {
    expect(mistakeLines(editedTexts(real))).toEqual([]);
  });

  each([
    [
      "an invented plant sheet",
      [...real, ["data-sheets/plant/big-rig.json", "/invented", true]],
      STATEMENT,
      '"big-rig"',
      '/controls/2/insteadOf: expected a document that is not invented, received "big-rig", which is invented or borrows an invented shape. Only a project with "invented": true may use it.',
    ],
    [
      "an invented limit set",
      [...real, [CONSENT, "/invented", true]],
      PROJECT,
      '"consent"',
      '/limitSets/0: expected a document that is not invented, received "consent", which is invented or borrows an invented shape. Only a project with "invented": true may use it.',
    ],
    [
      "an invented duty set",
      [...real, ["duties/law.json", "/invented", true]],
      PROJECT,
      '"law"',
      '/dutySet: expected a document that is not invented, received "law", which is invented or borrows an invented shape. Only a project with "invented": true may use it.',
    ],
    [
      "an invented source in a sheet that does not say so",
      [...real, [PLY, "/source/checked", "invented"]],
      PLY,
      '"invented"\n',
      '/source/checked: expected a source that can be checked, as the project north-quay uses it, received "invented". Only a project with "invented": true may use it.',
    ],
    [
      "a statement that bears the mark when its project does not",
      [...real, [STATEMENT, "/invented", true]],
      STATEMENT,
      'true,\n  "title"',
      "/invented: expected false, as the project north-quay has, received true. A statement bears the mark of its project.",
    ],
    [
      "a statement that lacks the mark of its project",
      [[STATEMENT, "/invented", false]],
      STATEMENT,
      'false,\n  "title"',
      "/invented: expected true, as the project north-quay has, received false. A statement bears the mark of its project.",
    ],
    [
      "a telephone number of fiction",
      [...real, [PROJECT, "/contacts/0/telephone", "01632 960123"]],
      PROJECT,
      '"01632 960123"',
      '/contacts/0/telephone: expected a telephone number that reaches somebody, received "01632 960123". It lies in a range set aside for fiction; if it is real, write it with its country code.',
    ],
    [
      "an e-mail address at an example domain",
      [...real, [PROJECT, "/contacts/0/email", "noise@example.org"]],
      PROJECT,
      '"noise@example.org"',
      '/contacts/0/email: expected an address that reaches somebody, received "noise@example.org". Its domain is kept for examples.',
    ],
    [
      "an address of the site at an example domain",
      [...real, [PROJECT, "/publicUrl", "https://quay.test/works/"]],
      PROJECT,
      '"https://quay.test/works/"',
      '/publicUrl: expected an address on a domain of your own, received "https://quay.test/works/". Its domain is kept for examples.',
    ],
  ]);
});
