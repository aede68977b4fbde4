import type { Source } from "../../compute/documents/types/common.gen.ts";
import { hrefTo } from "./page.ts";
import type { RevisionView } from "./revision-view.ts";
import type { Words } from "./words.ts";

/** Where a number in a document is known from, in words. */
export function sourceText(words: Words, source: Source): string {
  return words.say("sources.source", { document: source.document, edition: source.edition, place: source.place });
}

/** Every document of a revision with its source and how far it was checked. */
export function documentRows(view: RevisionView, file: string) {
  const { inputs } = view.revision;
  const { words, text } = view;
  const sheets = (["plant", "panels", "linings", "silencers"] as const).flatMap((kind) =>
    Object.entries(inputs[kind]).map(([id, sheet]) => {
      const source: Source = "emission" in sheet ? sheet.emission.source : sheet.source;
      return row(
        view,
        text(sheet.name),
        words.say(`sources.${kind}`),
        hrefTo(file, `data-sheets/${kind}/${id}/index.html`),
        source,
      );
    }),
  );
  const limits = Object.entries(inputs.limits).flatMap(([id, set]) =>
    set.rules
      .slice(0, 1)
      .map((rule) =>
        row(view, text(set.title), words.say("sources.limits"), hrefTo(file, `limits/${id}/index.html`), rule.source),
      ),
  );
  const duties = Object.entries(inputs.duties).map(([id, set]) =>
    row(view, text(set.title), words.say("sources.duties"), hrefTo(file, `duties/${id}/index.html`), set.source),
  );
  return [...sheets, ...limits, ...duties];
}

function row(view: RevisionView, name: string, kind: string, href: string, source: Source) {
  return {
    name,
    kind,
    href,
    source: sourceText(view.words, source),
    checked: view.words.say(`checked.${source.checked}`),
  };
}
