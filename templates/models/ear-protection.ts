import { dateText } from "./dates.ts";
import { earNotice, reasonText, zoneTerm } from "./ear-notice.ts";
import type { Page } from "./page.ts";
import { headOf } from "./page.ts";
import type { RevisionView } from "./revision-view.ts";
import { banner, titleBlock } from "./title-block.ts";
import { zoneRows } from "./zones.ts";

/** The ear-protection notice of a revision: one sheet for everyone working on or visiting the site. */
export function earProtectionPage(view: RevisionView): Page {
  const file = `${view.folder}ear-protection/index.html`;
  const { words, project, statement, text, revision } = view;
  const set = revision.inputs.duties[revision.earProtection.dutySet];
  if (!set) throw new Error(`the revision has no duty set "${revision.earProtection.dutySet}"`);
  const { earProtection } = statement;
  return {
    file,
    template: "ear-protection",
    model: {
      head: headOf({
        file,
        words,
        title: words.say("ear.title", { phase: text(statement.title) }),
        description: words.say("ear.description", { phase: text(statement.title), project: text(project.title) }),
        above: [
          { text: text(project.title), file: `${project.id}/index.html` },
          { text: text(statement.title), file: `${view.folder}index.html` },
        ],
        invented: statement.invented,
      }),
      w: words.section("ear-page"),
      banner: banner(view),
      block: titleBlock(view),
      notice: earNotice(view, file),
      reason: reasonText(view),
      term: zoneTerm(view),
      zones: zoneRows(view),
      entrances: earProtection.entrances.map((entrance) => text(entrance.name)),
      facts: [
        ["issued-at", text(earProtection.issuedAt)],
        ["type", text(earProtection.protectorType)],
        ["ask", text(earProtection.askRole)],
        ["emergency", text(earProtection.emergencySignal)],
        ["until", words.say("ear.until", { date: dateText(words, statement.until) })],
        [
          "duty",
          words.say("ear.duty", { title: text(set.title), edition: set.edition, date: dateText(words, set.checkedOn) }),
        ],
      ].map(([key = "", value = ""]) => ({ label: words.say(`ear.${key}-label`), value })),
      cautions: Object.values(words.section("ear-cautions")),
    },
  };
}
