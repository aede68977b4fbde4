import type { Project } from "../../compute/documents/types/project.gen.ts";
import type { Revision } from "../../compute/documents/types/revision.gen.ts";
import { dateText, listText, windowText } from "./dates.ts";
import { judgedLevel } from "./levels.ts";
import type { Page } from "./page.ts";
import { headOf, hrefTo } from "./page.ts";
import type { RevisionView } from "./revision-view.ts";
import { figureOf } from "./revision-view.ts";
import { sealSigns } from "./title-block.ts";
import type { Words } from "./words.ts";

/** A project as its revisions in force show it. */
export interface ProjectView {
  readonly project: Project;
  readonly text: (text: Readonly<Record<string, unknown>>) => string;
  /** Phases with a revision in force, in the order of their dates. */
  readonly phases: readonly { readonly view: RevisionView; readonly all: readonly Revision[] }[];
}

/** A project's page: what is going on, whom to call, how loud it gets where, and every revision. */
export function projectPage(words: Words, { project, text, phases }: ProjectView, asOf: string): Page {
  const file = `${project.id}/index.html`;
  return {
    file,
    template: "project",
    model: {
      head: headOf({
        file,
        words,
        title: text(project.title),
        description: words.say("project.description", { project: text(project.title), town: text(project.town) }),
        above: [],
        invented: project.invented,
      }),
      w: words.section("project-page"),
      town: text(project.town),
      who: words.say("project.who", { client: text(project.client), contractor: text(project.contractor) }),
      now: nowText(words, phases, asOf),
      checked: words.say("project.checked", {
        date: dateText(words, asOf),
        telephone: project.contacts[0]?.telephone ?? "",
      }),
      hours: project.hours.map((hours) => windowText(words, hours)),
      contacts: project.contacts.map((contact) => ({
        role: text(contact.role),
        telephone: contact.telephone,
        email: contact.email,
        hours: text(contact.hours),
      })),
      phases: phases.map(({ view }) => ({
        title: view.text(view.statement.title),
        href: hrefTo(file, `${view.folder}index.html`),
        dates: words.say("statement.dates", {
          from: dateText(words, view.statement.from),
          until: dateText(words, view.statement.until),
        }),
        what: view.text(view.statement.what),
      })),
      receptors: project.receptors.map((receptor) => ({
        name: text(receptor.name),
        phases: phases.map(({ view }) => receptorInPhase(view, file, receptor.id)),
      })),
      register: phases.flatMap(({ view, all }) => all.map((revision) => registerRow(words, view, revision, file))),
    },
  };
}

function nowText(words: Words, phases: ProjectView["phases"], asOf: string): string {
  const running = phases.filter(({ view: { statement } }) => statement.from <= asOf && asOf <= statement.until);
  if (running.length > 0) {
    const titles = running.map(({ view }) => view.text(view.statement.title));
    return words.say("project.now", { list: listText(words, titles) });
  }
  const next = phases.find(({ view: { statement } }) => statement.from > asOf);
  return next
    ? words.say("project.next", {
        title: next.view.text(next.view.statement.title),
        date: dateText(words, next.view.statement.from),
      })
    : words.say("project.over");
}

/** The judged level at a receptor in one phase that comes closest to its limit, or lies farthest over it. */
function receptorInPhase(view: RevisionView, file: string, receptor: string) {
  const periods = view.revision.periods.filter(({ point }) => point.startsWith(`${receptor}.`));
  const [first] = periods;
  const title = view.text(view.statement.title);
  const href = (anchor: string) => hrefTo(file, `${view.folder}index.html${anchor}`);
  if (!first) return { phase: title, text: view.words.say("project.receptor-none"), href: href("") };
  const margin = (key: string) => figureOf(view, key.replace(/^level\//, "exceedance/")).value;
  const decides = periods.reduce((kept, next) => (margin(kept.key) >= margin(next.key) ? kept : next), first);
  const { about, limit, standing, period, averaging } = judgedLevel(view, decides);
  return {
    phase: title,
    text: view.words.say("project.receptor-level", { about, limit, standing, period, averaging }),
    href: href(`#${receptor}`),
  };
}

function registerRow(words: Words, view: RevisionView, revision: Revision, file: string) {
  const own = { ...view, revision };
  return {
    phase: view.text(view.statement.title),
    number: String(revision.number),
    date: dateText(words, revision.issuedOn),
    seal: sealSigns(own),
    state: words.say(revision.number === view.revision.number ? "project.in-force" : "project.not-in-force"),
    href: hrefTo(file, `${revision.project}/${revision.phase}/r${revision.number}/index.html`),
  };
}
