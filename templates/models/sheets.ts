import { BANDS_HZ } from "../../compute/acoustics/bands.ts";
import type { Level, Source } from "../../compute/documents/types/common.gen.ts";
import type { DutySet } from "../../compute/documents/types/duty-set.gen.ts";
import type { LimitSet } from "../../compute/documents/types/limit-set.gen.ts";
import type { Plant } from "../../compute/documents/types/plant.gen.ts";
import { decimals } from "../../compute/figures/display.ts";
import { dateText, windowText } from "./dates.ts";
import { sourceText } from "./documents.ts";
import { wholeOrTenth } from "./levels.ts";
import type { Page } from "./page.ts";
import { headOf } from "./page.ts";
import type { Words } from "./words.ts";
import { textIn } from "./words.ts";

/** What a sheet's page holds. */
interface Sheet {
  readonly file: string;
  readonly title: string;
  readonly invented: boolean;
  readonly facts: readonly (readonly [label: string, value: string])[];
  readonly tables: readonly Table[];
  readonly sources: readonly {
    readonly of: string;
    readonly text: string;
    readonly checked: string;
    readonly note: string;
  }[];
}

interface Table {
  readonly caption: string;
  readonly head: readonly string[];
  readonly rows: readonly { readonly label: string; readonly cells: readonly string[] }[];
}

/** The page of one data sheet, limit set or duty set. */
function sheetPage(words: Words, { file, title, invented, facts, tables, sources }: Sheet): Page {
  return {
    file,
    template: "sheet",
    model: {
      head: headOf({
        file,
        words,
        title,
        description: words.say("sheets.description", { title }),
        above: [],
        invented,
      }),
      w: words.section("sheet-page"),
      facts: facts.map(([label, value]) => ({ label, value })),
      tables,
      sources,
    },
  };
}

function sourceRow(words: Words, of: string, source: Source) {
  return {
    of,
    text: sourceText(words, source),
    checked: words.say(`checked.${source.checked}`),
    note: source.note ?? words.say("sources.no-note"),
  };
}

function octaveTable(words: Words, caption: string, label: string, bands: object, places: 1 | 2): Table {
  const values = bands as Readonly<Record<string, number>>;
  return {
    caption,
    head: [words.say("sheets.band"), ...BANDS_HZ.map((bandHz) => `${bandHz} Hz`)],
    rows: [{ label, cells: BANDS_HZ.map((bandHz) => decimals(values[String(bandHz)] ?? Number.NaN, places)) }],
  };
}

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

/** Page of a panel, lining or silencer. */
export function materialPage(
  words: Words,
  kind: "panels" | "linings" | "silencers",
  sheet: {
    readonly id: string;
    readonly invented: boolean;
    readonly name: Readonly<Record<string, unknown>>;
    readonly source: Source;
    readonly assumed63Hz?: Readonly<Record<string, unknown>>;
  },
  bands: object,
  facts: readonly (readonly [string, string])[] = [],
): Page {
  const assumed = sheet.assumed63Hz
    ? [[words.say("sheets.assumed"), textIn(sheet.assumed63Hz, words.language, "en")] as const]
    : [];
  return sheetPage(words, {
    file: `data-sheets/${kind}/${sheet.id}/index.html`,
    title: textIn(sheet.name, words.language, "en"),
    invented: sheet.invented,
    facts: [...facts, ...assumed],
    tables: [
      octaveTable(
        words,
        words.say(`sheets.${kind}-caption`),
        words.say(`sheets.${kind}-row`),
        bands,
        kind === "linings" ? 2 : 1,
      ),
    ],
    sources: [sourceRow(words, words.say(`sheets.${kind}-row`), sheet.source)],
  });
}

/** Page of a limit set: every rule with its period, value, position and source. */
export function limitSetPage(words: Words, set: LimitSet): Page {
  const own = (text: Readonly<Record<string, unknown>>) => textIn(text, words.language, "en");
  return sheetPage(words, {
    file: `limits/${set.id}/index.html`,
    title: own(set.title),
    invented: set.invented,
    facts: [
      [words.say("sheets.edition"), set.edition],
      [words.say("sheets.issuer"), own(set.issuer)],
      [words.say("sheets.checked-on"), dateText(words, set.checkedOn)],
      [words.say("sheets.method"), words.say(`sheets.method-${set.prescribesMethod}`)],
      [words.say("sheets.force"), words.say("sheets.force-value")],
    ],
    tables: [
      {
        caption: words.say("sheets.rules-caption"),
        head: ["period", "hours", "uses", "value", "position"].map((key) => words.say(`sheets.rule-${key}`)),
        rows: set.rules.map((rule) => ({
          label: own(rule.period.name),
          cells: [
            windowText(words, rule.period),
            rule.uses.map((use) => words.say(`uses.${use}`)).join(", "),
            words.say(rule.averaging.kind === "worst" ? "sheets.value-worst" : "sheets.value-whole", {
              comparator: words.say(`sheets.comparator-${rule.comparator}`),
              value: wholeOrTenth(rule.valueDb),
              minutes: rule.averaging.kind === "worst" ? rule.averaging.minutes : "",
            }),
            rule.position.kind === "facade"
              ? words.say("sheets.position-facade", {
                  distance: decimals(rule.position.distanceM, 1),
                  term: decimals(rule.position.termDb, 1),
                })
              : words.say("sheets.position-free-field"),
          ],
        })),
      },
    ],
    sources: set.rules.map((rule) => sourceRow(words, own(rule.period.name), rule.source)),
  });
}

/** Page of a duty set: the values from which its duties hold. */
export function dutySetPage(words: Words, set: DutySet): Page {
  const own = (text: Readonly<Record<string, unknown>>) => textIn(text, words.language, "en");
  const valueRow = (name: string, from: DutySet["mandatoryFrom"]) => ({
    label: words.say(`sheets.duty-${name}`),
    cells: [
      from.levelDba === undefined
        ? words.say("sheets.none-in-law")
        : words.say("sheets.duty-level", {
            comparator: words.say(`sheets.comparator-${from.comparator ?? "at-or-above"}`),
            value: wholeOrTenth(from.levelDba),
          }),
      from.peakDbc === undefined
        ? words.say("sheets.none-in-law")
        : words.say("sheets.duty-peak", {
            comparator: words.say(`sheets.comparator-${from.peakComparator ?? "at-or-above"}`),
            value: wholeOrTenth(from.peakDbc),
          }),
    ],
  });
  return sheetPage(words, {
    file: `duties/${set.id}/index.html`,
    title: own(set.title),
    invented: set.invented,
    facts: [
      [words.say("sheets.edition"), set.edition],
      [words.say("sheets.checked-on"), dateText(words, set.checkedOn)],
      [words.say("sheets.zone-term"), own(set.zoneTerm)],
      [
        words.say("sheets.exchange"),
        set.exchange.kind === "equal-energy"
          ? words.say("sheets.equal-energy")
          : words.say("sheets.exchange-rate", { rate: decimals(set.exchange.rateDb, 0) }),
      ],
      [words.say("sheets.force"), words.say("sheets.force-value")],
    ],
    tables: [
      {
        caption: words.say("sheets.duty-caption"),
        head: ["what", "level", "peak"].map((key) => words.say(`sheets.duty-head-${key}`)),
        rows: [valueRow("mandatory", set.mandatoryFrom), valueRow("information", set.informationFrom)],
      },
    ],
    sources: [
      sourceRow(words, words.say("sheets.duty-mandatory"), set.mandatoryFrom.source),
      sourceRow(words, words.say("sheets.duty-information"), set.informationFrom.source),
      sourceRow(words, words.say("sheets.whole-set"), set.source),
    ],
  });
}
