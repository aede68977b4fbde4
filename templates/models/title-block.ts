import { dateText } from "./dates.ts";
import type { RevisionView } from "./revision-view.ts";

/** Signs of a digest that are printed. */
const PRINTED_SIGNS = 12;

/** The title block of every sheet of a revision: label and value, in the order of a drawing office. */
export function titleBlock(view: RevisionView): readonly { readonly label: string; readonly value: string }[] {
  const { words, project, statement, revision, text } = view;
  const rows: readonly (readonly [string, string])[] = [
    ["project", text(project.title)],
    ["place", text(project.town)],
    ["phase", text(statement.title)],
    ["client", text(project.client)],
    ["contractor", text(project.contractor)],
    [
      "revision",
      words.say("block.revision-value", { number: revision.number, date: dateText(words, revision.issuedOn) }),
    ],
    ["seal", sealSigns(view)],
  ];
  return rows.map(([label, value]) => ({ label: words.say(`block.${label}`), value }));
}

/** First signs of a revision's digest, in groups of four. */
export function sealSigns(view: RevisionView): string {
  return view.revision.digest.slice(0, PRINTED_SIGNS).replace(/(.{4})(?=.)/g, "$1 ");
}

/** What stands over the page of a revision that is not the one in force. */
export type Banner = { readonly kind: "in-force" } | { readonly kind: "not-in-force"; readonly text: string };

export function banner(view: RevisionView): Banner {
  const { standing, words, revision } = view;
  switch (standing.kind) {
    case "in-force":
      return { kind: "in-force" };
    case "superseded":
      return {
        kind: "not-in-force",
        text: words.say("block.superseded", {
          number: revision.number,
          by: standing.by,
          date: dateText(words, standing.from),
        }),
      };
  }
}
