import type { Level, OctaveLevel, SingleLevel, Source } from "../../compute/documents/types/common.gen.ts";
import type { DutySet } from "../../compute/documents/types/duty-set.gen.ts";
import type { LimitSet } from "../../compute/documents/types/limit-set.gen.ts";
import type { Lining } from "../../compute/documents/types/lining.gen.ts";
import type { Panel } from "../../compute/documents/types/panel.gen.ts";
import type { Plant } from "../../compute/documents/types/plant.gen.ts";
import type { Project } from "../../compute/documents/types/project.gen.ts";
import type { Silencer } from "../../compute/documents/types/silencer.gen.ts";
import type { Statement } from "../../compute/documents/types/statement.gen.ts";
import type { Wording } from "../../compute/documents/types/wording.gen.ts";

const en = (words: string) => ({ en: words });
const source: Source = { document: "Example levels", edition: "2026", place: "row 1", checked: "invented" };
const bands = (value: number) => ({
  "63": value,
  "125": value,
  "250": value,
  "500": value,
  "1000": value,
  "2000": value,
  "4000": value,
  "8000": value,
});

const shared = {
  quantity: { kind: "sound-power" },
  metric: "LAeq-running",
  field: "free-field",
  kIncluded: false,
  uncertaintyDb: 3,
  operatingState: en("Working"),
  character: { impulsive: false, tonal: false },
  source,
} as const;
const octave: OctaveLevel = { kind: "octave", bandsDb: bands(95), ...shared, weighting: "Z" };
const single: SingleLevel = { kind: "single", valueDb: 98, shapeFrom: "rig", ...shared, weighting: "A" };
const operator: SingleLevel = {
  kind: "single",
  valueDb: 88,
  ...shared,
  weighting: "A",
  quantity: { kind: "work-station" },
};
const peak: SingleLevel = {
  kind: "single",
  valueDb: 120,
  ...shared,
  metric: "LCpeak",
  weighting: "C",
  quantity: { kind: "pressure-at-distance", distanceM: 10, ground: "hard" },
};

function plant(id: string, emission: Level): Plant {
  return {
    id,
    invented: true,
    name: en(`The ${id}`),
    emission,
    acousticCentreHeightM: 1.5,
    largestDimensionM: 6,
    outline: { lengthM: 6, widthM: 2.5 },
    swingM: 0,
  };
}
const project: Project = {
  id: "north-quay",
  invented: true,
  title: en("North Quay"),
  town: en("Merrow Haven"),
  client: en("Harbour board"),
  contractor: en("Main contractor"),
  languages: ["en"],
  timeZone: "Europe/London",
  publicUrl: "https://works.north-quay.example/",
  groundLevelM: 2,
  hours: [
    { days: ["mon", "tue", "wed", "thu", "fri"], from: "07:00", to: "19:00" },
    { days: ["sat"], from: "07:00", to: "13:00" },
  ],
  method: {
    kind: "iso-9613-2-1996",
    ground: "general",
    screenOverHardGround: "conservative",
    temperatureC: 10,
    humidityPct: 70,
    pressureKpa: 101.325,
    reflections: "first-order",
    c0Db: 0,
  },
  boundary: [
    { xM: 0, yM: 0 },
    { xM: 80, yM: 0 },
    { xM: 80, yM: 60 },
    { xM: 0, yM: 60 },
  ],
  publicWays: [
    {
      id: "quay-road",
      name: en("Quay Road"),
      line: [
        { xM: -50, yM: -20 },
        { xM: 150, yM: -20 },
      ],
      widthM: 8,
    },
  ],
  buildings: [
    {
      id: "terrace",
      name: en("Terrace"),
      outline: [
        { xM: 0, yM: -60 },
        { xM: 40, yM: -60 },
        { xM: 40, yM: -50 },
        { xM: 0, yM: -50 },
      ],
      heightM: 8,
      walls: "with-windows",
    },
    {
      id: "shed",
      name: en("Old shed"),
      outline: [
        { xM: 60, yM: 40 },
        { xM: 70, yM: 40 },
        { xM: 70, yM: 50 },
        { xM: 60, yM: 50 },
      ],
      heightM: 5,
      walls: "flat",
      standsUntil: { kind: "phase", phase: "piling" },
    },
  ],
  excavations: [
    {
      id: "pump-pit",
      name: en("Pump pit"),
      outline: [
        { xM: 46, yM: 26 },
        { xM: 54, yM: 26 },
        { xM: 54, yM: 34 },
        { xM: 46, yM: 34 },
      ],
      rimM: 2,
      standsFrom: { kind: "phase", phase: "piling" },
    },
  ],
  ground: {
    elsewhere: { groundFactor: 0, description: en("Paving") },
    areas: [
      {
        id: "green",
        outline: [
          { xM: 100, yM: 0 },
          { xM: 120, yM: 0 },
          { xM: 120, yM: 20 },
        ],
        groundFactor: 1,
        description: en("Grass"),
      },
    ],
  },
  receptors: [
    {
      id: "terrace-homes",
      name: en("Quay Road terrace"),
      use: "dwelling",
      homes: 12,
      points: [
        {
          id: "terrace-first-floor",
          name: en("First floor"),
          at: { xM: 20, yM: -49 },
          heightM: 4,
          position: { kind: "facade", building: "terrace", distanceM: 1 },
        },
      ],
    },
  ],
  limitSets: ["consent"],
  dutySet: "law",
  contacts: [
    {
      id: "site-office",
      role: en("Site office"),
      telephone: "01632 960123",
      email: "noise@north-quay.example",
      hours: en("Weekdays"),
      languages: ["en"],
    },
  ],
  confirmed: [
    {
      document: "plant/rig",
      pointer: "/emission/source",
      by: { role: en("Adviser"), organisation: en("Noise advisers") },
      against: { document: "Example levels", clause: "row 1" },
      date: "2026-11-02",
    },
  ],
  acknowledged: [
    {
      document: "duty-set/law",
      pointer: "/source",
      by: { role: en("Adviser"), organisation: en("Noise advisers") },
      reason: en("No copy at hand"),
      date: "2026-11-02",
    },
  ],
};

const control = {
  state: { kind: "adopted" },
  by: en("Main contractor"),
  due: "2027-03-01",
  checkedBy: en("Foreman"),
} as const;

const statement: Statement = {
  project: "north-quay",
  phase: "piling",
  invented: true,
  title: en("Piling"),
  what: en("Piles are driven"),
  why: en("Nothing else holds the quay"),
  from: "2027-03-01",
  until: "2027-04-30",
  shiftH: 10,
  activities: [
    {
      id: "driving",
      title: en("Driving"),
      what: en("Driving piles"),
      from: "2027-03-08",
      until: "2027-04-16",
      windows: [{ id: "driving-weekdays", days: ["mon", "tue", "wed", "thu", "fri"], from: "08:00", to: "18:00" }],
      runTogether: { kind: "may" },
      plant: [
        {
          id: "rig-1",
          sheet: "rig",
          name: en("Rig"),
          at: { xM: 30, yM: 20 },
          bearingDeg: 0,
          onTimePct: 40,
          longestRunMin: 10,
          shortestStopMin: 5,
          setting: { kind: "open" },
        },
        {
          id: "pump-1",
          sheet: "pump",
          name: en("Pump"),
          at: { xM: 50, yM: 30 },
          bearingDeg: 90,
          onTimePct: 100,
          setting: { kind: "trench", name: en("Pump pit") },
        },
      ],
    },
  ],
  controls: [
    {
      id: "south-screen",
      kind: "screen",
      name: en("South screen"),
      ...control,
      line: [
        { xM: 10, yM: 5 },
        { xM: 50, yM: 5 },
      ],
      heightM: 3,
      panel: "ply",
      standsFrom: { kind: "date", date: "2027-03-01" },
      siteBuildDeductionDb: 5,
      gaps: [{ id: "under-the-panels", areaM2: 0.4 }],
      facing: { kind: "absorptive", sheet: "wool" },
    },
    {
      id: "pump-house",
      kind: "enclosure",
      name: en("Pump house"),
      ...control,
      appliesTo: ["pump-1"],
      faces: [{ id: "walls", panel: "ply", areaM2: 20 }],
      openings: [{ id: "air-intake", areaM2: 0.5, silencer: "louvre" }],
      lining: { sheet: "wool", areaM2: 16 },
      floor: { sheet: "wool", areaM2: 6 },
      unlinedSheet: "wool",
      siteBuildDeductionDb: 5,
      namedClosedOnNotice: false,
    },
    {
      id: "small-rig",
      kind: "quieter-plant",
      name: en("Small rig"),
      ...control,
      appliesTo: ["rig-1"],
      insteadOf: "big-rig",
    },
    {
      id: "short-runs",
      kind: "running-time",
      name: en("Short runs"),
      ...control,
      appliesTo: ["rig-1"],
      insteadOfPct: 80,
    },
    {
      id: "east-bund",
      kind: "bund",
      name: en("East bund"),
      ...control,
      line: [
        { xM: 75, yM: 10 },
        { xM: 75, yM: 35 },
      ],
      heightM: 2,
      standsFrom: { kind: "date", date: "2027-03-01" },
    },
    { id: "radio", kind: "practice", name: en("Radios"), ...control, measure: en("Signals by radio, no horns") },
  ],
  zoneAnswers: [
    {
      plant: "rig-1",
      crosses: { kind: "public-way", id: "quay-road" },
      answer: { kind: "kept-out", how: en("Barrier") },
    },
    {
      plant: "rig-1",
      crosses: { kind: "receptor", id: "terrace-homes" },
      answer: { kind: "lowered", how: en("Screen") },
    },
    { plant: "rig-1", crosses: { kind: "boundary" }, answer: { kind: "kept-out", how: en("Fence") } },
  ],
  earProtection: {
    issuedAt: en("Site office"),
    protectorType: en("Ear muffs"),
    askRole: en("Foreman"),
    emergencySignal: en("Flashing light"),
    entrances: [{ id: "gate", name: en("Gate"), at: { xM: 40, yM: 0 } }],
  },
  vibration: { kind: "not-expected", why: en("Far from buildings") },
  offers: [{ id: "respite", text: en("Quiet hour at noon") }],
  competence: en("Member of a professional body"),
  approval: {
    prepared: { role: en("Adviser"), organisation: en("Noise advisers"), date: "2026-11-02" },
    checked: { role: en("Engineer"), organisation: en("Main contractor"), date: "2026-11-03" },
    approved: { role: en("Director"), organisation: en("Main contractor"), date: "2026-11-04" },
  },
};

const limits: LimitSet = {
  id: "consent",
  invented: true,
  title: en("Consent"),
  edition: "2026-11",
  issuer: en("Town council"),
  checkedOn: "2026-11-02",
  prescribesMethod: "none",
  rules: [
    {
      id: "day-rule",
      kind: "fixed-value",
      period: { id: "day", name: en("Day"), days: ["mon"], from: "07:00", to: "19:00" },
      uses: ["dwelling"],
      metric: "LAeq",
      averaging: { kind: "whole-period" },
      valueDb: 70,
      comparator: "above",
      compares: "site-alone",
      position: { kind: "facade", distanceM: 1, termDb: 3 },
      source,
    },
    {
      id: "worst-rule",
      kind: "fixed-value",
      period: { id: "day", name: en("Day"), days: ["mon"], from: "07:00", to: "19:00" },
      uses: ["dwelling"],
      metric: "LAeq",
      averaging: { kind: "worst", minutes: 15 },
      valueDb: 80,
      comparator: "above",
      compares: "site-alone",
      position: { kind: "free-field" },
      source,
    },
  ],
};

const duties: DutySet = {
  id: "law",
  invented: true,
  title: en("Law"),
  edition: "2026",
  checkedOn: "2026-11-02",
  exchange: { kind: "equal-energy" },
  mandatoryFrom: { levelDba: 85, comparator: "at-or-above", peakDbc: 137, peakComparator: "at-or-above", source },
  informationFrom: { levelDba: 80, comparator: "at-or-above", source },
  zoneTerm: en("Zone"),
  source,
};

const panel: Panel = {
  id: "ply",
  invented: true,
  name: en("Plywood"),
  surfaceDensityKgm2: 10,
  closed: true,
  reductionIndexDb: bands(20),
  source,
};
const lining: Lining = { id: "wool", invented: true, name: en("Wool"), absorption: bands(0.8), source };
const silencer: Silencer = { id: "louvre", invented: true, name: en("Louvre"), insertionLossDb: bands(10), source };
const wording: Wording = { language: "en", sections: { home: { title: "Quiet hours" } } };

/** A small content folder without a mistake: documents by path. */
export const baseContent: Readonly<Record<string, unknown>> = {
  "projects/north-quay/project.json": project,
  "projects/north-quay/piling/statement.json": statement,
  "data-sheets/plant/rig.json": { ...plant("rig", octave), workStation: operator, peak },
  "data-sheets/plant/big-rig.json": plant("big-rig", octave),
  "data-sheets/plant/pump.json": plant("pump", single),
  "data-sheets/panels/ply.json": panel,
  "data-sheets/linings/wool.json": lining,
  "data-sheets/silencers/louvre.json": silencer,
  "limits/consent.json": limits,
  "duties/law.json": duties,
  "wording/en.json": wording,
};
