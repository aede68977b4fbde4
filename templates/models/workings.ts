import { BANDS_HZ } from "../../compute/acoustics/bands.ts";
import type {
  SealedEquation,
  SealedGoverning,
  SealedPeriod,
  SealedStep,
} from "../../compute/documents/types/revision.gen.ts";
import { numberLine } from "../../compute/equations/tex/number-line.ts";
import { decimals, tenthDb } from "../../compute/figures/display.ts";
import { dateText } from "./dates.ts";
import { documentRows } from "./documents.ts";
import { earNotice } from "./ear-notice.ts";
import { equationPart } from "./equation-part.ts";
import type { Typesetter } from "./math.ts";
import type { Page } from "./page.ts";
import { headOf, hrefTo } from "./page.ts";
import { pathName } from "./path-name.ts";
import type { RevisionView } from "./revision-view.ts";
import { itemOf, pointName, ruleOf } from "./revision-view.ts";
import { levelsAt } from "./statement.ts";
import { termTable } from "./term-table.ts";
import { banner, titleBlock } from "./title-block.ts";
import { zoneRows } from "./zones.ts";

/** How every figure of a revision is made: terms, equations and documents. */
export function workingsPage(view: RevisionView, typesetter: Typesetter): Page {
  const file = `${view.folder}workings/index.html`;
  const { words, project, statement, text, revision } = view;
  return {
    file,
    template: "workings",
    model: {
      head: headOf({
        file,
        words,
        title: words.say("workings.title", { phase: text(statement.title) }),
        description: words.say("workings.description", { phase: text(statement.title), project: text(project.title) }),
        above: [
          { text: text(project.title), file: `${project.id}/index.html` },
          { text: text(statement.title), file: `${view.folder}index.html` },
        ],
        invented: statement.invented,
      }),
      w: words.section("workings-page"),
      banner: banner(view),
      block: titleBlock(view),
      notice: earNotice(view, file),
      method: methodLines(view),
      bands: BANDS_HZ.map(String),
      points: project.receptors.flatMap((receptor) =>
        receptor.points.map((point) => pointPart(view, `${receptor.id}.${point.id}`, typesetter)),
      ),
      zones: zoneRows(view),
      figures: revision.figures.map(({ key, value, unit }) => ({ key, value: String(value), unit })),
      equations: revision.equations.map((equation) => equationPart(words, equation, typesetter)),
      documents: documentRows(view, file),
      links: {
        csv: hrefTo(file, `${view.folder}figures.csv`),
        json: hrefTo(file, `${view.folder}figures.json`),
        method: hrefTo(file, "calculation/index.html"),
      },
    },
  };
}

function methodLines(view: RevisionView): readonly string[] {
  const { method, ground } = view.project;
  const { words, text } = view;
  return [
    words.say("workings.edition"),
    words.say("workings.air", {
      temperature: decimals(method.temperatureC, 0),
      humidity: decimals(method.humidityPct, 0),
      pressure: decimals(method.pressureKpa, 3),
    }),
    words.say(`workings.ground-method-${method.ground}`, {
      elsewhere: `${text(ground.elsewhere.description)} G = ${decimals(ground.elsewhere.groundFactor, 2)}`,
      areas: ground.areas.map((area) => `${text(area.description)} G = ${decimals(area.groundFactor, 2)}`).join("; "),
    }),
    words.say(`workings.screen-${method.screenOverHardGround}`),
    words.say("workings.one-screen"),
    words.say(`workings.reflections-${method.reflections}`),
    words.say("workings.met", { c0: decimals(method.c0Db, 1) }),
    words.say("workings.bands"),
  ];
}

function pointPart(view: RevisionView, pointId: string, typesetter: Typesetter) {
  const { words, revision } = view;
  const decides = revision.governing.find(({ point }) => point === pointId);
  return {
    id: pointId,
    name: pointName(view, pointId),
    levels: levelsAt(view, pointId),
    sums: revision.periods.filter(({ point }) => point === pointId).map((period) => sumPart(view, period)),
    governing: decides
      ? governingPart(view, decides, typesetter)
      : { kind: "no-work", text: words.say("workings.no-work") },
    tables: revision.terms.filter(({ point }) => point === pointId).map((terms) => termTable(view, terms)),
  };
}

/** The parts of one period level: each item with its level while running, its share and what it gives. */
function sumPart(view: RevisionView, period: SealedPeriod) {
  const { words, text, revision } = view;
  const rows = period.activities.flatMap(({ id, windowH, shares }) =>
    shares.map(({ item, share, levelDba }) => {
      const terms = revision.terms.find(
        (each) => each.activity === id && each.item === item && each.point === period.point,
      );
      if (!terms) throw new Error(`${period.key}: there are no terms of ${id}/${item}`);
      return {
        item: text(itemOf(view, item).name),
        running: tenthDb(terms.levelDba / 1000),
        onTime: decimals(terms.onTimePct, 0),
        window: decimals(windowH, 2),
        share: decimals(100 * share, 1),
        gives: tenthDb(levelDba),
      };
    }),
  );
  const { set, rule } = ruleOf(view, period.rule);
  return {
    caption: words.say(rule.averaging.kind === "worst" ? "workings.sum-caption-worst" : "workings.sum-caption", {
      period: text(rule.period.name),
      limit: text(set.title),
      date: dateText(words, period.date),
      hours: decimals(period.periodH, 1),
      minutes: rule.averaging.kind === "worst" ? rule.averaging.minutes : "",
    }),
    rows,
    facade: words.say(period.facadeDb === 0 ? "workings.no-facade" : "workings.facade", {
      db: decimals(period.facadeDb, 1),
    }),
    result: words.say("workings.sum-result", { level: tenthDb(period.levelDba) }),
  };
}

function governingPart(view: RevisionView, decides: SealedGoverning, typesetter: Typesetter) {
  const { words, text } = view;
  const terms = view.revision.terms.find(
    (each) => each.activity === decides.activity && each.item === decides.item && each.point === decides.point,
  );
  const path = terms?.paths[decides.path];
  if (!path) throw new Error(`${decides.point}: the governing path is not in its term table`);
  return {
    kind: "steps",
    lead: words.say("workings.governing", {
      item: text(itemOf(view, decides.item).name),
      band: decides.bandHz,
      path: pathName(view, path),
    }),
    steps: decides.steps.map((step) => stepPart(view, step, typesetter)),
  };
}

function stepPart(view: RevisionView, step: SealedStep, typesetter: Typesetter) {
  const equation = sealed(view, step);
  const band = step.at.find((place) => place.startsWith("band:"))?.slice("band:".length);
  return {
    term: view.words.say(`terms.${step.term}`),
    band: band ? view.words.say("workings.at-band", { band }) : "",
    line: typesetter.display(numberTex(view, step)),
    equation: equation.id,
    source: view.words.say("workings.step-source", {
      document: equation.source.document,
      edition: equation.source.edition,
      clause: equation.source.clause,
    }),
  };
}

function sealed(view: RevisionView, step: SealedStep): SealedEquation {
  const found = view.revision.equations.find(({ id, version }) => id === step.equation && version === step.version);
  if (!found) throw new Error(`the revision has no equation ${step.equation}, version ${step.version}`);
  return found;
}

/** Number lines already made, by the sealed step they belong to: the pages in force and those of the revision share them. */
const lines = new WeakMap<SealedStep, string>();

/** TeX of the numbers of a step as the revision sealed it. */
export function numberTex(view: RevisionView, step: SealedStep): string {
  const equation = sealed(view, step) as unknown as Parameters<typeof numberLine>[0];
  const line = lines.get(step) ?? numberLine(equation, step.inputs);
  lines.set(step, line);
  return line;
}
