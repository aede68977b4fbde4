import type { Activity, PlantItem } from "../../compute/documents/types/statement.gen.ts";
import { decimals, tenthDb, wholeDb } from "../../compute/figures/display.ts";
import { controlsPart } from "./controls.ts";
import { dateText, listText, windowText } from "./dates.ts";
import { earNotice, zoneTerm } from "./ear-notice.ts";
import type { JudgedLevel } from "./levels.ts";
import { judgedLevel } from "./levels.ts";
import type { Page } from "./page.ts";
import { headOf, hrefTo } from "./page.ts";
import type { RevisionView } from "./revision-view.ts";
import { figureOf, pointName, ruleOf } from "./revision-view.ts";
import { banner, titleBlock } from "./title-block.ts";
import { zoneRows } from "./zones.ts";

/** The method statement of one phase as issued. */
export function statementPage(view: RevisionView): Page {
  const file = `${view.folder}index.html`;
  const { words, project, statement, text } = view;
  const title = words.say("statement.title", { phase: text(statement.title), project: text(project.title) });
  return {
    file,
    template: "statement",
    model: {
      head: headOf({
        file,
        words,
        title,
        description: words.say("statement.description", {
          phase: text(statement.title),
          project: text(project.title),
          town: text(project.town),
        }),
        above: [{ text: text(project.title), file: `${project.id}/index.html` }],
        invented: statement.invented,
      }),
      w: words.section("statement-page"),
      banner: banner(view),
      block: titleBlock(view),
      notice: earNotice(view, file),
      work: {
        what: text(statement.what),
        why: text(statement.why),
        dates: words.say("statement.dates", {
          from: dateText(words, statement.from),
          until: dateText(words, statement.until),
        }),
        hours: project.hours.map((hours) => windowText(words, hours)),
      },
      answers: answers(view),
      receptors: project.receptors.map((receptor) => ({
        id: receptor.id,
        name: text(receptor.name),
        homes: homesText(view, receptor.homes),
        points: receptor.points.map((point) => ({
          name: text(point.name),
          workings: hrefTo(file, `${view.folder}workings/index.html#${receptor.id}.${point.id}`),
          levels: levelsAt(view, `${receptor.id}.${point.id}`),
        })),
      })),
      limitNote: limitNote(view),
      activities: statement.activities.map((activity) => activityPart(view, file, activity)),
      controls: controlsPart(view),
      zones: { term: zoneTerm(view), rows: zoneRows(view), edge: edgeText(view) },
      vibration: vibrationPart(view),
      offers: statement.offers.map((offer) => text(offer.text)),
      contacts: project.contacts.map((contact) => ({
        role: text(contact.role),
        telephone: contact.telephone,
        email: contact.email,
        hours: text(contact.hours),
      })),
      competence: text(statement.competence),
      approval: (["prepared", "checked", "approved"] as const).map((step) => ({
        step: words.say(`statement.${step}`),
        by: words.say("statement.signed", {
          role: text(statement.approval[step].role),
          organisation: text(statement.approval[step].organisation),
          date: dateText(words, statement.approval[step].date),
        }),
      })),
      links: {
        workings: hrefTo(file, `${view.folder}workings/index.html`),
        ear: hrefTo(file, `${view.folder}ear-protection/index.html`),
        csv: hrefTo(file, `${view.folder}figures.csv`),
        json: hrefTo(file, `${view.folder}figures.json`),
        sealed: hrefTo(file, `${project.id}/${statement.phase}/r${view.revision.number}/revision.json`),
        method: hrefTo(file, "calculation/index.html"),
      },
    },
  };
}

/** All judged levels at a receptor point. */
export function levelsAt(view: RevisionView, pointId: string): readonly JudgedLevel[] {
  return view.revision.periods.filter((period) => period.point === pointId).map((period) => judgedLevel(view, period));
}

/** Per period of the limits: where it is loudest and how that stands to its limit. */
function answers(view: RevisionView): readonly { readonly text: string; readonly over: string }[] {
  const margin = (key: string) => figureOf(view, key.replace(/^level\//, "exceedance/")).value;
  const rules = [...new Set(view.revision.periods.map(({ rule }) => rule))];
  return rules.map((rule) => {
    const worst = view.revision.periods
      .filter((period) => period.rule === rule)
      .reduce((kept, next) => (margin(kept.key) >= margin(next.key) ? kept : next));
    const level = judgedLevel(view, worst);
    const { about, limit, standing, averaging, period } = level;
    const point = pointName(view, worst.point);
    const uses = ruleOf(view, rule).rule.uses.map((use) => view.words.say(`uses.${use}`));
    const parts = { uses: listText(view.words, uses), period, averaging, point, about, limit, standing };
    return { text: view.words.say("statement.answer", parts), over: level.over };
  });
}

function homesText(view: RevisionView, homes: number | string): string {
  if (homes === "fewer-than-5") return view.words.say("statement.homes-few");
  return homes === 0 ? view.words.say("statement.homes-none") : view.words.say("statement.homes", { homes });
}

function limitNote(view: RevisionView): readonly string[] {
  return Object.values(view.revision.inputs.limits).map((set) =>
    view.words.say("statement.limit-note", {
      title: view.text(set.title),
      edition: set.edition,
      issuer: view.text(set.issuer),
      date: dateText(view.words, set.checkedOn),
    }),
  );
}

function activityPart(view: RevisionView, file: string, activity: Activity) {
  const { words, text } = view;
  return {
    id: activity.id,
    title: text(activity.title),
    what: text(activity.what),
    dates: words.say("statement.dates", {
      from: dateText(words, activity.from),
      until: dateText(words, activity.until),
    }),
    windows: activity.windows.map((window) => windowText(words, window)),
    outside: activity.outsideHours
      ? { kind: "outside", text: words.say("statement.outside", { reason: text(activity.outsideHours) }) }
      : { kind: "inside" },
    together:
      activity.runTogether.kind === "may"
        ? words.say("statement.together-may")
        : words.say("statement.together-cannot", { why: text(activity.runTogether.why) }),
    plant: activity.plant.map((item) => plantRow(view, file, item)),
  };
}

function plantRow(view: RevisionView, file: string, item: PlantItem) {
  const { words, text } = view;
  const sheet = view.revision.inputs.plant[item.sheet];
  if (!sheet) throw new Error(`the revision has no plant sheet "${item.sheet}"`);
  return {
    name: text(item.name),
    sheet: text(sheet.name),
    href: hrefTo(file, `data-sheets/plant/${item.sheet}/index.html`),
    onTime: words.say("statement.on-time", { pct: decimals(item.onTimePct, 0) }),
    run:
      item.longestRunMin === undefined || item.shortestStopMin === undefined
        ? words.say("statement.run-not-stated")
        : words.say("statement.run", { run: item.longestRunMin, stop: item.shortestStopMin }),
    checked: words.say(`checked.${sheet.emission.source.checked}`),
  };
}

function edgeText(view: RevisionView): string {
  const { edgeDba, shift } = view.revision.earProtection;
  return view.words.say("zones.edge", {
    level: tenthDb(edgeDba),
    shift: decimals(shift.shiftH, 1),
    uncertainty: wholeDb(shift.uncertaintyDb),
  });
}

function vibrationPart(view: RevisionView): readonly string[] {
  const { vibration } = view.statement;
  const { words, text } = view;
  if (vibration.kind === "not-expected")
    return [words.say("statement.vibration-not-expected", { why: text(vibration.why) })];
  return [
    words.say("statement.vibration-documents", { documents: text(vibration.documents) }),
    words.say("statement.vibration-criteria", { criteria: text(vibration.criteria) }),
    text(vibration.warnings),
  ];
}
