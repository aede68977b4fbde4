import { describe, expect, test } from "vitest";
import { validator } from "../../compute/documents/validator.ts";
import { InputError } from "../../compute/equations/input-error.ts";
import { silently } from "../../compute/equations/working.ts";
import { figuresOf } from "../../compute/statement/figures-of.ts";
import type { StatementInputs } from "../../compute/statement/inputs.ts";
import { demo } from "../helpers/demo-revisions.ts";
import { type Leaf, leavesOf, setLeaf } from "../helpers/leaves.ts";

// Promise 1 of design.md turned round: every number of the documents moves a published number, or a reader is told why not.

/** Fields that no figure rests on, by document and path, and why. */
const DESCRIPTIVE: Readonly<Record<string, string>> = {
  "project/receptors/*/homes": "how many homes hear it; printed, and never part of a level",
  "project/receptors/*/points/*/position/distanceM":
    "says where the point is meant to be; the level is worked out at its coordinates",
  "project/buildings/*/heightM":
    "only checks that no plant and no point stands inside; no figure credits or charges a building's height",
  "statement/earProtection/entrances/*/at/xM": "where a notice hangs; drawn only",
  "statement/earProtection/entrances/*/at/yM": "where a notice hangs; drawn only",
  "limits/*/rules/*/position/distanceM": "says what the facade term is for; the term itself counts",
  "panels/*/surfaceDensityKgm2": "the data sheet's evidence; an enclosure counts with the reduction index",
  "duties/*/informationFrom/levelDba":
    "read where no mandatory notice stands; both phases of the demo have one (test/hearing/notice.test.ts)",
  "duties/*/informationFrom/peakDbc":
    "read where no mandatory notice stands; both phases of the demo have one (test/hearing/notice.test.ts)",
  "panels of screens/*/surfaceDensityKgm2": "decides whether a screen is heavy enough to be one (10 kg/m² or more)",
};
const BANDS = ["63", "125", "250", "500", "1000", "2000", "4000", "8000"];
const LENDER = "a sheet that only lends its octave shape: nothing else of it is used";
const THROUGH = "a closed screen of 10 kg/m² or more: what passes through it is left out (ISO 9613-2:1996, 7.4)";
const reasons = new Map<string, string>([
  ...Object.entries(DESCRIPTIVE),
  ...BANDS.map((band) => [`panels of screens/*/reductionIndexDb/${band}`, THROUGH] as const),
  ...[
    "emission/uncertaintyDb",
    "acousticCentreHeightM",
    "largestDimensionM",
    "outline/lengthM",
    "outline/widthM",
    "swingM",
  ].map((field) => [`lending plant/*/${field}`, LENDER] as const),
]);

/** Amounts a field is altered by, until one of them moves something. */
const AMOUNTS = [0.01, -0.01, 2, -2];
/** Fields that only decide a yes or no, such as whether a zone passes the boundary: altered by enough to turn it. */
const DECIDING: Readonly<Record<string, readonly number[]>> = {
  "project/boundary/*/xM": [80, -180, -80],
  "project/boundary/*/yM": [5, -40, 20],
  "project/publicWays/*/line/*/xM": [220, -220],
  "project/publicWays/*/line/*/yM": [-20, 20, -60],
  "project/publicWays/*/widthM": [40],
  "project/buildings/*/outline/*/xM": [-20, -60, 60],
  "project/buildings/*/outline/*/yM": [-80, -40],
  "plant/*/peak/valueDb": [5, 20],
  "plant/*/peak/quantity/distanceM": [10, 60],
  "duties/*/mandatoryFrom/peakDbc": [-5, -20],
};

const KINDS = {
  plant: "plant",
  panels: "panel",
  linings: "lining",
  silencers: "silencer",
  limits: "limit-set",
  duties: "duty-set",
} as const;

/** The part a document plays in a statement: a panel of a screen and one of an enclosure are not used alike. */
function roleOf({ statement }: StatementInputs, [group, id]: Leaf["path"]): string {
  const ofScreens = statement.controls.flatMap((control) => (control.kind === "screen" ? [control.panel] : []));
  const ofEnclosures = statement.controls.flatMap((control) =>
    control.kind === "enclosure" ? control.faces.map(({ panel }) => panel) : [],
  );
  if (group === "panels" && ofScreens.includes(`${id}`) && !ofEnclosures.includes(`${id}`)) return "panels of screens";
  const sheets = statement.activities.flatMap(({ plant }) => plant.map(({ sheet }) => sheet));
  const replaced = statement.controls.flatMap((control) =>
    control.kind === "quieter-plant" ? [control.insteadOf] : [],
  );
  if (group === "plant" && ![...sheets, ...replaced].includes(`${id}`)) return "lending plant";
  return `${group}`;
}

/** Document and path of a leaf, with a star for each id of a document and each place in a list. */
function fieldOf(inputs: StatementInputs, { path }: Leaf): string {
  const steps = path.map((step, index) =>
    typeof step === "number" || (index === 1 && `${path[0]}` in KINDS) ? "*" : step,
  );
  return [roleOf(inputs, path), ...steps.slice(1)].join("/");
}

function isValid(inputs: StatementInputs, { path: [group, id] }: Leaf): boolean {
  const documents = inputs as unknown as Readonly<Record<string, unknown>>;
  const document = documents[`${group}`];
  if (group === "project" || group === "statement") return validator(group)(document);
  return validator(KINDS[group as keyof typeof KINDS])((document as Readonly<Record<string, unknown>>)[`${id}`]);
}

/** All that a reader can see of a statement's numbers; nothing where the documents are refused. */
function published(inputs: StatementInputs): string | undefined {
  try {
    const { figures, earProtection } = figuresOf(silently, inputs);
    return JSON.stringify([figures.map(({ key, value }) => [key, value]), earProtection]);
  } catch (error) {
    if (error instanceof InputError) return undefined;
    throw error;
  }
}

/** Whether a leaf altered by one of the amounts moves a published number. */
function moves(inputs: StatementInputs, before: string | undefined, leaf: Leaf, amounts: readonly number[]): boolean {
  return amounts.some((amount) => {
    const altered = structuredClone(inputs);
    setLeaf(altered, leaf.path, (leaf.value as number) + amount);
    const after = isValid(altered, leaf) ? published(altered) : undefined;
    return after !== undefined && after !== before;
  });
}

// The smaller statement first: what moves there need not be tried in the other.
const drafts = [...demo().drafts].sort((a, b) => JSON.stringify(a.inputs).length - JSON.stringify(b.inputs).length);
const known = drafts.map(({ inputs }) => ({ inputs, before: published(inputs) }));
const fields = new Map<string, { inputs: StatementInputs; before: string | undefined; leaf: Leaf }[]>();
for (const { inputs, before } of known) {
  for (const leaf of leavesOf(inputs)) {
    if (typeof leaf.value !== "number") continue;
    const field = fieldOf(inputs, leaf);
    fields.set(field, [...(fields.get(field) ?? []), { inputs, before, leaf }]);
  }
}

describe("every numeric field of the demo", () => {
  test("is looked at", () => {
    expect(fields.size).toBeGreaterThan(100);
    expect([...reasons.keys()].filter((field) => !fields.has(field))).toEqual([]);
  });
  test("moves a figure or the ear protection, unless it only describes", () => {
    const dead = [...fields].filter(([field, places]) => {
      if (reasons.has(field)) return false;
      return !places.some(({ inputs, before, leaf }) => moves(inputs, before, leaf, DECIDING[field] ?? AMOUNTS));
    });
    expect(dead.map(([field]) => field)).toEqual([]);
  }, 120_000);
  test("that only describes moves nothing, or it is no longer on the list", () => {
    const live = [...fields].filter(([field, places]) => {
      const [place] = places;
      return reasons.has(field) && place !== undefined && moves(place.inputs, place.before, place.leaf, [1]);
    });
    expect(live.map(([field]) => field)).toEqual([]);
  }, 60_000);
});
