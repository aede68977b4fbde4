import type { Source } from "../../compute/documents/types/common.gen.ts";
import type { Page } from "./page.ts";
import { octaveTable, sheetPage, sourceRow } from "./sheet.ts";
import type { Words } from "./words.ts";
import { textIn } from "./words.ts";

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
