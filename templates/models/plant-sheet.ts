import type { Level } from "../../compute/documents/types/common.gen.ts";
import type { Plant } from "../../compute/documents/types/plant.gen.ts";
import { decimals } from "../../compute/figures/display.ts";
import type { Page } from "./page.ts";
import { octaveTable, sheetPage, sourceRow } from "./sheet.ts";
import type { Words } from "./words.ts";
import { textIn } from "./words.ts";

/** Page of a plant data sheet. */
export function plantPage(words: Words, sheet: Plant): Page {
  const title = textIn(sheet.name, words.language, "en");
  const levels = [
    ["emission", sheet.emission],
    ["work-station", sheet.workStation],
    ["peak", sheet.peak],
  ] as const;
  const given = levels.flatMap(([name, level]) => (level ? [{ of: words.say(`sheets.${name}`), level }] : []));
  return sheetPage(words, {
    file: `data-sheets/plant/${sheet.id}/index.html`,
    title,
    invented: sheet.invented,
    facts: [
      ...given.map(({ of, level }) => [of, levelText(words, level)] as const),
      [
        words.say("sheets.size"),
        words.say("sheets.size-value", {
          length: decimals(sheet.outline.lengthM, 1),
          width: decimals(sheet.outline.widthM, 1),
          swing: decimals(sheet.swingM, 1),
          largest: decimals(sheet.largestDimensionM, 1),
        }),
      ],
      [words.say("sheets.centre"), words.say("sheets.metres", { value: decimals(sheet.acousticCentreHeightM, 1) })],
    ],
    tables: given.flatMap(({ of, level }) =>
      level.kind === "octave"
        ? [
            octaveTable(
              words,
              words.say("sheets.bands-caption", { of }),
              words.say("sheets.level-row", { weighting: level.weighting }),
              level.bandsDb,
              1,
            ),
          ]
        : [],
    ),
    sources: given.map(({ of, level }) => sourceRow(words, of, level.source)),
  });
}

function levelText(words: Words, level: Level): string {
  const { quantity } = level;
  const what = words.say(`sheets.quantity-${quantity.kind}`, {
    distance: quantity.kind === "pressure-at-distance" ? decimals(quantity.distanceM, 1) : "",
    ground: quantity.kind === "pressure-at-distance" ? words.say(`sheets.ground-${quantity.ground}`) : "",
  });
  const value =
    level.kind === "single"
      ? words.say("sheets.single", { value: decimals(level.valueDb, 1), weighting: level.weighting })
      : words.say(`sheets.${level.kind}`);
  const character = level.character.impulsive ? "impulsive" : level.character.tonal ? "tonal" : "plain";
  return words.say("sheets.level", {
    value,
    what,
    metric: words.say(`sheets.metric-${level.metric}`),
    state: textIn(level.operatingState, words.language, "en"),
    uncertainty: decimals(level.uncertaintyDb, 1),
    character: words.say(`sheets.character-${character}`),
    k: words.say(level.kIncluded ? "sheets.k-included" : "sheets.k-not-included"),
    shape:
      level.kind === "single" && level.shapeFrom
        ? words.say("sheets.shape", { sheet: level.shapeFrom })
        : words.say("sheets.no-shape"),
  });
}
