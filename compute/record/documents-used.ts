import type { Source } from "../documents/types/common.gen.ts";
import type { SealedFigure } from "../documents/types/revision.gen.ts";
import type { StatementInputs } from "../statement/inputs.ts";

/** A place in a document that a figure rests on, with the source it names. */
export interface DocumentUse {
  /** `project`, `statement`, `plant/press-in-piler`, `limits/…` */
  readonly document: string;
  /** JSON pointer. */
  readonly pointer: string;
  /** Absent where the author is the source. */
  readonly source?: Source;
}

/**
 * Documents that a figure rests on: the statement's activities and controls, data sheets, the project's method and ground, and
 * the limit or duty set.
 */
export function documentsUsed(
  inputs: StatementInputs,
  figure: SealedFigure,
  activities: readonly string[],
): readonly DocumentUse[] {
  const { statement } = inputs;
  const isZone = figure.period === "shift";
  const used = statement.activities.flatMap((activity, index) =>
    activities.includes(activity.id) ? [{ activity, index }] : [],
  );
  const items = used.flatMap(({ activity }) => activity.plant.map((item) => item.id));
  const controls = statement.controls.flatMap((control, index) => {
    const acts =
      control.kind === "screen" ||
      control.kind === "bund" ||
      ("appliesTo" in control && control.appliesTo.some((id) => items.includes(id)));
    return acts && control.state.kind === "adopted" ? [{ control, index }] : [];
  });
  const named = [
    ...used.flatMap(({ activity }) => activity.plant.map((item) => `plant/${item.sheet}`)),
    ...controls.flatMap(({ control }) => sheetsOf(control)),
  ];
  const sheets = new Set([...named, ...named.flatMap((sheet) => lenderOf(inputs, sheet))]);
  return [
    ...used.map(({ index }) => ({ document: "statement", pointer: `/activities/${index}` })),
    ...controls.map(({ index }) => ({ document: "statement", pointer: `/controls/${index}` })),
    ...[...sheets].map((sheet) => sheetUse(inputs, sheet)),
    ...(isZone
      ? [dutyUse(inputs)]
      : [
          { document: "project", pointer: "/method" },
          { document: "project", pointer: "/ground" },
          ...receptorUse(inputs, figure),
          ...limitUse(inputs, figure),
        ]),
  ];
}

function sheetsOf(control: StatementInputs["statement"]["controls"][number]): readonly string[] {
  switch (control.kind) {
    case "screen":
      return [
        `panels/${control.panel}`,
        ...(control.facing.kind === "absorptive" ? [`linings/${control.facing.sheet}`] : []),
      ];
    case "quieter-plant":
      return [`plant/${control.insteadOf}`];
    case "enclosure":
      return [
        ...control.faces.map((face) => `panels/${face.panel}`),
        ...control.openings.flatMap((opening) => (opening.silencer ? [`silencers/${opening.silencer}`] : [])),
        `linings/${control.lining.sheet}`,
        `linings/${control.floor.sheet}`,
        ...(control.unlinedSheet ? [`linings/${control.unlinedSheet}`] : []),
      ];
    default:
      return [];
  }
}

/** The sheet whose octave shape a single level borrows. */
function lenderOf(inputs: StatementInputs, document: string): readonly string[] {
  const [kind, id = ""] = document.split("/");
  const emission = kind === "plant" ? inputs.plant[id]?.emission : undefined;
  return emission?.kind === "single" && emission.shapeFrom !== undefined ? [`plant/${emission.shapeFrom}`] : [];
}

function sheetUse(inputs: StatementInputs, document: string): DocumentUse {
  const [kind = "", id = ""] = document.split("/");
  if (kind === "plant") {
    const source = inputs.plant[id]?.emission.source;
    return { document, pointer: "/emission", ...(source ? { source } : {}) };
  }
  const sheet = (inputs[kind as "panels" | "linings" | "silencers"] as Readonly<Record<string, { source: Source }>>)[
    id
  ];
  return { document, pointer: "", ...(sheet ? { source: sheet.source } : {}) };
}

function receptorUse(inputs: StatementInputs, figure: SealedFigure): readonly DocumentUse[] {
  const [receptor, point] = figure.subject.split(".");
  const index = inputs.project.receptors.findIndex(({ id }) => id === receptor);
  const pointIndex = inputs.project.receptors[index]?.points.findIndex(({ id }) => id === point) ?? -1;
  return pointIndex < 0 ? [] : [{ document: "project", pointer: `/receptors/${index}/points/${pointIndex}` }];
}

function limitUse(inputs: StatementInputs, figure: SealedFigure): readonly DocumentUse[] {
  const [set = "", rule] = figure.period.split(".");
  const index = inputs.limits[set]?.rules.findIndex(({ id }) => id === rule) ?? -1;
  const source = inputs.limits[set]?.rules[index]?.source;
  return source ? [{ document: `limits/${set}`, pointer: `/rules/${index}`, source }] : [];
}

function dutyUse(inputs: StatementInputs): DocumentUse {
  const set = inputs.duties[inputs.project.dutySet];
  return {
    document: `duties/${inputs.project.dutySet}`,
    pointer: "/mandatoryFrom",
    ...(set ? { source: set.mandatoryFrom.source } : {}),
  };
}
