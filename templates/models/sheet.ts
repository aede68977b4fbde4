import { BANDS_HZ } from "../../compute/acoustics/bands.ts";
import type { Source } from "../../compute/documents/types/common.gen.ts";
import { decimals } from "../../compute/figures/display.ts";
import { sourceText } from "./documents.ts";
import type { Page } from "./page.ts";
import { headOf } from "./page.ts";
import type { Words } from "./words.ts";

/** What a sheet's page holds. */
export interface Sheet {
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

export interface Table {
  readonly caption: string;
  readonly head: readonly string[];
  readonly rows: readonly { readonly label: string; readonly cells: readonly string[] }[];
}

/** The page of one data sheet, limit set or duty set. */
export function sheetPage(words: Words, { file, title, invented, facts, tables, sources }: Sheet): Page {
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

/** Where one of the values is known from. */
export function sourceRow(words: Words, of: string, source: Source) {
  return {
    of,
    text: sourceText(words, source),
    checked: words.say(`checked.${source.checked}`),
    note: source.note ?? words.say("sources.no-note"),
  };
}

/** A table of one row with a column per octave band. */
export function octaveTable(words: Words, caption: string, label: string, bands: object, places: 1 | 2): Table {
  const values = bands as Readonly<Record<string, number>>;
  return {
    caption,
    head: [words.say("sheets.band"), ...BANDS_HZ.map((bandHz) => `${bandHz} Hz`)],
    rows: [{ label, cells: BANDS_HZ.map((bandHz) => decimals(values[String(bandHz)] ?? Number.NaN, places)) }],
  };
}
