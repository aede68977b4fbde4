import { nearest } from "../documents/nearest.ts";
import type { Revision } from "../documents/types/revision.gen.ts";
import { equationOf } from "../equations/registry.ts";
import type { Step } from "../equations/working.ts";
import { tenthDb } from "../figures/display.ts";
import type { Explanation } from "../record/explain.ts";
import { explain as explainFigure } from "../record/explain.ts";
import { revisionsOf } from "../record/issued-revisions.ts";
import type { Command, Outcome } from "./command.ts";
import { usage } from "./command.ts";
import { readOptions } from "./options.ts";

export const explain: Command = {
  summary: "shows how one figure of a revision is made, down to its documents",
  help: `npm run -s explain -- <project>/<phase> [<figure key>] [--revision N] [--json] [--content DIR]

Works a figure of an issued revision out again and prints every equation with its inputs, then the documents they come from.
The terms are held against those stored in the revision. Without a key the revision's keys are listed.

  --revision N   number of the revision (the last)
  --json         one JSON object
  --content DIR  content folder (content)
`,
  run: (args) => {
    const parsed = readOptions(args, { revision: "string", json: "boolean", content: "string" });
    if (parsed.kind === "wrong") return usage("explain", parsed.problem);
    const [target = "", key, more] = parsed.rest;
    const [project, phase, none] = target.split("/");
    if (!project || !phase || none !== undefined || more !== undefined)
      return usage("explain", "expected <project>/<phase> and a figure key");
    const revisions = revisionsOf((parsed.options.content as string | undefined) ?? "content", project, phase);
    const asked = parsed.options.revision as string | undefined;
    const revision = asked === undefined ? revisions.at(-1) : revisions.find(({ number }) => String(number) === asked);
    if (!revision)
      return usage(
        "explain",
        `there is no revision ${asked === undefined ? "" : `${asked} `}of ${target}; issued: ${revisions.map(({ number }) => number).join(", ") || "none"}`,
      );
    if (key === undefined)
      return { code: 0, out: revision.figures.map((figure) => `${figure.key}\n`).join(""), err: "" };
    return explained(revision, key, parsed.options.json === true);
  },
};

function explained(revision: Revision, key: string, json: boolean): Outcome {
  const explanation = explainFigure(revision, key);
  if (!explanation) {
    const near = nearest(
      key,
      revision.figures.map((figure) => figure.key),
    );
    return usage("explain", `there is no figure ${key}${near ? `; did you mean ${near}?` : ""}`);
  }
  const text = json ? `${JSON.stringify(explanation)}\n` : plainText(explanation);
  const { value, figure, termDifferenceDb } = explanation;
  const meets = Math.abs(value - figure.value) <= 1e-9 && termDifferenceDb <= 0.0005 + 1e-9;
  return meets
    ? { code: 0, out: text, err: "" }
    : { code: 1, out: text, err: `${key}: what is worked out today differs from what was issued\n` };
}

function plainText({ figure, value, steps, documents, termDifferenceDb }: Explanation): string {
  const width = Math.max(0, ...steps.map((step) => step.at.join(" ").length));
  return [
    figure.key,
    `  issued ${figure.value} ${figure.unit}, worked out again ${value} ${figure.unit} (${tenthDb(value)})`,
    `  largest difference to the stored terms ${termDifferenceDb.toFixed(6)} dB`,
    "",
    ...steps.map((step) => stepLine(step, width)),
    "",
    ...documents.map(({ document, pointer, source }) => {
      const from = source ? `  ${source.document}, ${source.edition}, ${source.place}: ${source.checked}` : "";
      return `${document} ${pointer}${from}`;
    }),
    "",
  ].join("\n");
}

function stepLine(step: Step, width: number): string {
  const inputs = Object.entries(step.inputs).map(
    ([name, value]) => `${name}=${Array.isArray(value) ? value.map(short).join(",") : short(value as number)}`,
  );
  const title = equationOf(step.equation)?.title ?? step.equation;
  return `${step.at.join(" ").padEnd(width)}  ${step.term} = ${short(step.value)} ${step.unit === "1" ? "" : step.unit}  [${step.equation}, ${title}]  ${inputs.join(" ")}`;
}

/** Up to six decimals, trailing zeros gone: enough to redo a step by hand. */
function short(value: number): string {
  return String(Number(value.toFixed(6)));
}
