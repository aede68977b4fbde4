import type { Activity, Control, PlantItem } from "../../compute/documents/types/statement.gen.ts";
import { decimals, tenthDb, wholeDb } from "../../compute/figures/display.ts";
import { lineLengthM } from "../../compute/geometry/place.ts";
import { metricOf } from "../../compute/statement/limit-rules.ts";
import { dateText, windowText } from "./dates.ts";
import { earNotice, zoneTerm } from "./ear-notice.ts";
import type { JudgedLevel } from "./levels.ts";
import { judgedLevel } from "./levels.ts";
import type { Page } from "./page.ts";
import { headOf, hrefTo } from "./page.ts";
import type { RevisionView } from "./revision-view.ts";
import { figureOf, pointName } from "./revision-view.ts";
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
    return {
      text: view.words.say("statement.answer", { period, averaging, point, about, limit, standing }),
      over: level.over,
    };
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

function controlsPart(view: RevisionView) {
  const points = view.project.receptors.flatMap((receptor) =>
    receptor.points.map((point) => `${receptor.id}.${point.id}`),
  );
  return view.statement.controls.map((control) => ({
    id: control.id,
    name: view.text(control.name),
    kind: view.words.say(`statement.control-${control.kind}`),
    what: controlText(view, control),
    state: stateText(view, control),
    by: view.words.say("statement.control-by", {
      by: view.text(control.by),
      due: dateText(view.words, control.due),
      checkedBy: view.text(control.checkedBy),
    }),
    effect: effectPart(view, control, points),
  }));
}

function controlText(view: RevisionView, control: Control): string {
  const { words, text } = view;
  const sheetName = (sheets: Readonly<Record<string, { name: unknown }>>, id: string) =>
    text((sheets[id]?.name ?? {}) as Readonly<Record<string, unknown>>);
  switch (control.kind) {
    case "screen":
      return words.say("statement.screen-what", {
        height: decimals(control.heightM, 1),
        length: decimals(lineLengthM(control.line), 0),
        panel: sheetName(view.revision.inputs.panels, control.panel),
      });
    case "enclosure":
      return words.say(control.namedClosedOnNotice ? "statement.enclosure-named" : "statement.enclosure-what", {
        panels: control.faces.map((face) => sheetName(view.revision.inputs.panels, face.panel)).join(", "),
        deduction: decimals(control.siteBuildDeductionDb, 0),
      });
    case "quieter-plant":
      return words.say("statement.quieter-what", { other: sheetName(view.revision.inputs.plant, control.insteadOf) });
    case "running-time":
      return words.say("statement.running-what", { pct: decimals(control.insteadOfPct, 0) });
    case "practice":
      return text(control.measure);
  }
}

function stateText(view: RevisionView, control: Control): string {
  return control.state.kind === "rejected"
    ? view.words.say("statement.state-rejected", { reason: view.text(control.state.reason) })
    : view.words.say(`statement.state-${control.state.kind}`);
}

/** What a control is worth at each receptor point, at the rule that decides there; nothing for practice and for what is not adopted. */
function effectPart(view: RevisionView, control: Control, points: readonly string[]) {
  if (control.state.kind !== "adopted" || control.kind === "practice")
    return { kind: "none", text: view.words.say("statement.effect-none") };
  const quantity = control.kind === "running-time" ? "reduction" : "insertion-loss";
  const rows = points.flatMap((point) => {
    const decides = view.revision.governing.find((each) => each.point === point);
    if (!decides) return [];
    const { rule } = ruleFor(view, decides.rule);
    const key = [quantity, metricOf(rule), point, decides.rule, "phase", control.id].join("/");
    const found = view.revision.figures.find((figure) => figure.key === key);
    return found ? [{ key, point: pointName(view, point), db: tenthDb(found.value) }] : [];
  });
  return { kind: "worth", caption: view.words.say(`statement.effect-${quantity}`), rows };
}

function ruleFor(view: RevisionView, id: string) {
  const [set = "", name] = id.split(".");
  const rule = view.revision.inputs.limits[set]?.rules.find((each) => each.id === name);
  if (!rule) throw new Error(`the revision has no limit rule "${id}"`);
  return { rule };
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
