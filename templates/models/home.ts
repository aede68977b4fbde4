import { dateText } from "./dates.ts";
import type { Page } from "./page.ts";
import { headOf, hrefTo } from "./page.ts";
import type { ProjectView } from "./project.ts";
import type { Words } from "./words.ts";

/** The first page: every project with what is published for it. */
export function homePage(words: Words, projects: readonly ProjectView[], asOf: string): Page {
  const file = "index.html";
  return {
    file,
    template: "home",
    model: {
      head: headOf({
        file,
        words,
        title: words.say("home.title"),
        description: words.say("home.description"),
        above: [],
        invented: projects.every(({ project }) => project.invented),
      }),
      w: words.section("home-page"),
      checked: words.say("home.checked", { date: dateText(words, asOf) }),
      projects: projects.map(({ project, text, phases }) => ({
        title: text(project.title),
        href: hrefTo(file, `${project.id}/index.html`),
        town: text(project.town),
        phases: phases.map(({ view }) =>
          words.say("home.phase", {
            title: view.text(view.statement.title),
            from: dateText(words, view.statement.from),
            until: dateText(words, view.statement.until),
          }),
        ),
      })),
      method: hrefTo(file, "calculation/index.html"),
    },
  };
}
