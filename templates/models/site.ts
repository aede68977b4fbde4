import type { LimitSet } from "../../compute/documents/types/limit-set.gen.ts";
import type { Revision } from "../../compute/documents/types/revision.gen.ts";
import type { Wording } from "../../compute/documents/types/wording.gen.ts";
import type { Equation } from "../../compute/equations/equation.ts";
import { equationIds, equationOf } from "../../compute/equations/registry.ts";
import { figuresCsv } from "../../compute/figures/figures-csv.ts";
import { figuresFile } from "../../compute/figures/figures-file.ts";
import type { IssuedPhase } from "../../compute/record/issued-revisions.ts";
import { calculationPage } from "./calculation.ts";
import { dutySetPage } from "./duty-set-sheet.ts";
import { earProtectionPage } from "./ear-protection.ts";
import { homePage } from "./home.ts";
import { limitSetPage } from "./limit-set-sheet.ts";
import { materialPage } from "./material-sheet.ts";
import type { Printed } from "./math.ts";
import { typesetterFor } from "./math.ts";
import type { Page } from "./page.ts";
import { plantPage } from "./plant-sheet.ts";
import type { ProjectView } from "./project.ts";
import { projectPage } from "./project.ts";
import type { RevisionView, Standing } from "./revision-view.ts";
import { revisionView } from "./revision-view.ts";
import { statementPage } from "./statement.ts";
import { textIn, wordsOf } from "./words.ts";
import { numberTex, workingsPage } from "./workings.ts";

/** Everything a site is made of. */
export interface Site {
  readonly pages: readonly Page[];
  /** Data files beside the pages. */
  readonly files: readonly { readonly file: string; readonly text: string }[];
  /** Classes that stand for the inline styles of typeset equations. */
  readonly equationCss: string;
}

export interface SiteParts {
  readonly phases: readonly IssuedPhase[];
  /** Today's words, for the pages that belong to no revision. */
  readonly wording: Wording;
  readonly method: ReadonlyMap<string, string>;
  /** Date of the site: it holds what was issued by then, the last of each phase being in force. */
  readonly asOf: string;
}

/** The pages and files of a site, from sealed revisions and nothing else but the words and prose of its living pages. */
export function siteOf({ phases: everIssued, wording, method, asOf }: SiteParts): Site {
  const words = wordsOf(wording);
  const phases = everIssued.map((phase) => ({
    ...phase,
    revisions: phase.revisions.filter(({ issuedOn }) => issuedOn <= asOf),
  }));
  const inForce = phases.flatMap((phase) => {
    const revision = phase.revisions.at(-1);
    return revision
      ? [
          {
            view: revisionView(revision, `${phase.project}/${phase.phase}/`, { kind: "in-force" }),
            all: phase.revisions,
          },
        ]
      : [];
  });
  const forEver = phases.flatMap(({ project, phase, revisions }) =>
    revisions.map((revision) =>
      revisionView(revision, `${project}/${phase}/r${revision.number}/`, standingOf(revision, revisions)),
    ),
  );
  const views = [...inForce.map(({ view }) => view), ...forEver];
  const projects = projectViews(inForce);
  const { css, typesetter } = typesetterFor(printedBy(forEver));
  return {
    pages: [
      homePage(words, projects, asOf),
      ...projects.map((project) => projectPage(words, project, asOf)),
      ...views.flatMap((view) => [statementPage(view), workingsPage(view, typesetter), earProtectionPage(view)]),
      ...sheetPages(words, forEver),
      calculationPage(words, method, typesetter),
    ],
    files: [
      ...views.flatMap((view) => [
        { file: `${view.folder}figures.json`, text: `${JSON.stringify(figuresFile(view.revision))}\n` },
        { file: `${view.folder}figures.csv`, text: figuresCsv(view.revision) },
      ]),
      ...forEver.map(({ folder, revision }) => ({
        file: `${folder}revision.json`,
        text: `${JSON.stringify(revision)}\n`,
      })),
    ],
    equationCss: css,
  };
}

function standingOf(revision: Revision, revisions: readonly Revision[]): Standing {
  const last = revisions.at(-1) ?? revision;
  return last === revision ? { kind: "in-force" } : { kind: "superseded", by: last.number, from: last.issuedOn };
}

/** Projects with a revision in force; the newest revision says what the project is. */
function projectViews(inForce: ProjectView["phases"]): readonly ProjectView[] {
  const ids = [...new Set(inForce.map(({ view }) => view.project.id))];
  return ids.map((id) => {
    const own = inForce.filter(({ view }) => view.project.id === id);
    const newest = own.reduce((kept, next) =>
      kept.view.revision.issuedOn >= next.view.revision.issuedOn ? kept : next,
    );
    const phases = [...own].sort((a, b) => (a.view.statement.from < b.view.statement.from ? -1 : 1));
    const { project } = newest.view;
    const [first = "en"] = project.languages;
    return { project, text: (text) => textIn(text, newest.view.words.language, first), phases };
  });
}

/** Every equation the site may print, with and without numbers, for the sheet of their styles. */
function* printedBy(views: readonly RevisionView[]): Iterable<Printed> {
  for (const id of equationIds) yield* printedOf(equationOf(id) as Equation);
  for (const view of views) {
    for (const equation of view.revision.equations) yield* printedOf(equation);
    for (const { steps } of view.revision.governing) {
      for (const step of steps) yield { tex: numberTex(view, step), isDisplay: true };
    }
  }
}

function* printedOf(equation: {
  readonly tex: string;
  readonly inputs: Readonly<Record<string, { readonly symbol: string }>>;
}): Iterable<Printed> {
  yield { tex: equation.tex, isDisplay: true };
  for (const { symbol } of Object.values(equation.inputs)) yield { tex: symbol, isDisplay: false };
}

/** Pages of all sheets that revisions rest on; of two versions of a sheet that of the newest revision in force stands. */
function sheetPages(words: ReturnType<typeof wordsOf>, views: readonly RevisionView[]): readonly Page[] {
  const rank = ({ revision, standing }: RevisionView) =>
    `${standing.kind === "in-force" ? 1 : 0} ${revision.issuedOn} ${revision.project}/${revision.phase}`;
  const newestLast = [...views].sort((a, b) => (rank(a) < rank(b) ? -1 : 1));
  const all = <T>(pick: (view: RevisionView) => Readonly<Record<string, T>>): readonly T[] =>
    Object.entries(Object.assign({}, ...newestLast.map(pick)) as Record<string, T>)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([, sheet]) => sheet);
  return [
    ...all(({ revision }) => revision.inputs.plant).map((sheet) => plantPage(words, sheet)),
    ...all(({ revision }) => revision.inputs.panels).map((sheet) =>
      materialPage(words, "panels", sheet, sheet.reductionIndexDb, [
        [words.say("sheets.density"), words.say("sheets.density-value", { value: sheet.surfaceDensityKgm2 })],
        [words.say("sheets.closed"), words.say(sheet.closed ? "sheets.yes" : "sheets.no")],
      ]),
    ),
    ...all(({ revision }) => revision.inputs.linings).map((sheet) =>
      materialPage(words, "linings", sheet, sheet.absorption),
    ),
    ...all(({ revision }) => revision.inputs.silencers).map((sheet) =>
      materialPage(words, "silencers", sheet, sheet.insertionLossDb),
    ),
    ...all<LimitSet>(({ revision }) => revision.inputs.limits).map((set) => limitSetPage(words, set)),
    ...all(({ revision }) => revision.inputs.duties).map((set) => dutySetPage(words, set)),
  ];
}
