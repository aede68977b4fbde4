import type { Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import type { Level } from "../types/common.gen.ts";

type Words = readonly [pointer: string, expected: string, received: string, advice: string];

/** The emission of a plant sheet is a level that figures can be worked out from. */
export const emissionLevels: Rule = (set) =>
  [...set.plant.valid.values()].flatMap(({ sheet: { emission }, file }): readonly Mistake[] => {
    const misuses = [...metric(emission), ...quantity(emission), ...field(emission), ...weighting(emission)];
    return misuses.map(([pointer, ...words]) => mistakeAt(set.texts, file, `/emission${pointer}`, ...words));
  });

function metric({ metric: given }: Level): Words[] {
  if (given === "LAeq-running" || given === "LAeq-cycle") return [];
  const what =
    given === "LCpeak"
      ? "A peak says nothing about the average; enter it under peak."
      : "A maximum is no average: find a source that gives L_Aeq.";
  return [["/metric", '"LAeq-running" or "LAeq-cycle"', `"${given}"`, what]];
}

function quantity({ quantity: given }: Level): Words[] {
  if (given.kind === "work-station") {
    const advice = "A level at the operator's place holds the near field of the machine: enter it under workStation.";
    return [["/quantity/kind", '"sound-power" or "pressure-at-distance"', '"work-station"', advice]];
  }
  if (given.kind === "sound-power" || given.ground === "hard" || given.ground === "none") return [];
  const advice =
    "Sound power cannot be worked out from a level over such ground: find a source that states hard ground or sound power.";
  return [["/quantity/ground", '"hard" or "none"', `"${given.ground}"`, advice]];
}

function field({ field: given }: Level): Words[] {
  if (given === "free-field") return [];
  return [
    [
      "/field",
      '"free-field"',
      '"facade"',
      "A level in front of a facade holds its reflection: find a source that states a free field.",
    ],
  ];
}

function weighting(level: Level): Words[] {
  const { kind, weighting: given } = level;
  if (kind !== "single") {
    const advice = "Take the weighting off the bands, or enter them A-weighted.";
    return given === "C" ? [["/weighting", '"Z" or "A" for bands', '"C"', advice]] : [];
  }
  if (given !== "A")
    return [
      [
        "/weighting",
        '"A" for a single value',
        `"${given}"`,
        "Only an A-weighted value can borrow the shape of another machine.",
      ],
    ];
  if (level.shapeFrom !== undefined) return [];
  const advice = "Name the sheet of a like machine: without its shape one value cannot be spread over the bands.";
  return [["/shapeFrom", "the id of a plant sheet with octave bands", "nothing", advice]];
}
