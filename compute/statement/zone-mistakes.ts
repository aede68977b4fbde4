import type { Mistake } from "../documents/mistake.ts";
import { mistakeAt } from "../documents/mistake-at.ts";
import type { ZoneAnswer } from "../documents/types/statement.gen.ts";
import { zoneMetres } from "../figures/display.ts";
import type { StatementInputs } from "./inputs.ts";
import type { Crossing } from "./zone-crossings.ts";
import type { EarProtection, ItemZone } from "./zones-of.ts";

/**
 * Zones that pass the boundary, a public way or a receptor without an answer, and answers to what does not happen.
 *
 * @param texts       file texts, for places
 * @param file        file of the statement
 * @param inputs      documents of the statement
 * @param protection  zones as worked out
 */
export function zoneMistakes(
  texts: ReadonlyMap<string, string>,
  file: string,
  inputs: StatementInputs,
  protection: EarProtection,
): readonly Mistake[] {
  const answers = inputs.statement.zoneAnswers;
  const unanswered = protection.zones.flatMap((zone) =>
    zone.crossings
      .filter((crossing) => !answers.some((answer) => answer.plant === zone.item && isSame(answer, crossing)))
      .map((crossing) => unansweredMistake(texts, file, inputs, zone, crossing)),
  );
  const idle = answers.flatMap((answer, index) => {
    const zone = protection.zones.find(({ item }) => item === answer.plant);
    if (!zone || zone.crossings.some((crossing) => isSame(answer, crossing))) return [];
    const expected = `an answer for something that the ear-protection zone of "${answer.plant}" passes`;
    return [
      mistakeAt(
        texts,
        file,
        `/zoneAnswers/${index}`,
        expected,
        describe(answer.crosses),
        "The zone does not reach it; remove the answer.",
      ),
    ];
  });
  return [...unanswered, ...idle];
}

function unansweredMistake(
  texts: ReadonlyMap<string, string>,
  file: string,
  inputs: StatementInputs,
  { activity, item, zone }: ItemZone,
  crossing: Crossing,
): Mistake {
  const activityIndex = inputs.statement.activities.findIndex(({ id }) => id === activity);
  const itemIndex = inputs.statement.activities[activityIndex]?.plant.findIndex(({ id }) => id === item) ?? -1;
  const reach = zone.kind === "distance" ? ` (${zoneMetres(zone.distanceM)} m round it)` : "";
  return mistakeAt(
    texts,
    file,
    `/activities/${activityIndex}/plant/${itemIndex}`,
    `an entry in zoneAnswers for "${item}", whose ear-protection zone${reach} passes ${describe(crossing)}`,
    "none",
    "Name what keeps people out or lowers the level there.",
  );
}

function isSame({ crosses }: ZoneAnswer, crossing: Crossing): boolean {
  return (
    crosses.kind === crossing.kind && ("id" in crosses ? crosses.id : "") === ("id" in crossing ? crossing.id : "")
  );
}

function describe(crossing: Crossing): string {
  switch (crossing.kind) {
    case "boundary":
      return "the site boundary";
    case "public-way":
      return `the public way "${crossing.id}"`;
    case "receptor":
      return `the receptor "${crossing.id}"`;
  }
}
