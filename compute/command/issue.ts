import { readFileSync } from "node:fs";
import path from "node:path";
import { mistakeText } from "../documents/mistake-text.ts";
import { nearest } from "../documents/nearest.ts";
import { digestOf } from "../record/digest.ts";
import { revisionsOf } from "../record/issued-revisions.ts";
import { makeRevision } from "../record/make-revision.ts";
import { writeRevision } from "../record/write-revision.ts";
import type { Command, Outcome, Place } from "./command.ts";
import { usage } from "./command.ts";
import { dateOption } from "./date-option.ts";
import type { Checked, Draft } from "./load-valid.ts";
import { loadValid } from "./load-valid.ts";
import { readOptions } from "./options.ts";

export const issue: Command = {
  summary: "issues the draft of a phase as its next revision",
  help: `npm run issue -- <project>/<phase> [--as-of YYYY-MM-DD] [--content DIR]

Works the draft out and writes it, with every document, word and equation it rests on, to
content/projects/<project>/<phase>/issued/<n>.json. The file is never changed afterwards.

  --as-of DATE   date of issue (today in the project's time zone)
  --content DIR  content folder (content)
`,
  run: (args, place) => {
    const parsed = readOptions(args, { "as-of": "string", content: "string" });
    if (parsed.kind === "wrong") return usage("issue", parsed.problem);
    const [target, more] = parsed.rest;
    if (!target || more !== undefined) return usage("issue", "expected one <project>/<phase>");
    const content = (parsed.options.content as string | undefined) ?? "content";
    const checked = loadValid(content);
    if (checked.kind === "invalid")
      return { code: 1, out: "", err: checked.mistakes.map((mistake) => `${mistakeText(mistake)}\n`).join("") };
    const draft = checked.drafts.find(({ project, phase }) => `${project}/${phase}` === target);
    return draft
      ? issueDraft(content, draft, checked, place, parsed.options["as-of"] as string | undefined)
      : unknownPhase(target, checked);
  },
};

function issueDraft(
  content: string,
  draft: Draft,
  checked: Checked & { kind: "valid" },
  place: Place,
  asOf: string | undefined,
): Outcome {
  const issuedOn = dateOption(asOf, draft.inputs.project.timeZone);
  if (issuedOn.kind === "wrong") return usage("issue", issuedOn.problem);
  const earlier = revisionsOf(content, draft.project, draft.phase);
  const last = earlier.at(-1);
  const name = `${draft.project}/${draft.phase}`;
  if (last && digestOf(last.inputs) === digestOf(draft.inputs)) {
    return {
      code: 1,
      out: "",
      err: `${name}: expected a draft that differs from revision ${last.number}, received the same documents. Nothing was issued.\n`,
    };
  }
  if (last && last.issuedOn > issuedOn.date) {
    return {
      code: 1,
      out: "",
      err: `${name}: expected a date of issue from ${last.issuedOn} on, the date of revision ${last.number}, received ${issuedOn.date}. Check the clock or --as-of.\n`,
    };
  }
  const toolVersion = (JSON.parse(readFileSync(path.join(place.root, "package.json"), "utf8")) as { version: string })
    .version;
  const revision = makeRevision(draft.inputs, Object.fromEntries(checked.content.wording), {
    number: earlier.length + 1,
    issuedOn: issuedOn.date,
    toolVersion,
  });
  const file = writeRevision(content, revision);
  return {
    code: 0,
    out: `${name}: revision ${revision.number} issued on ${issuedOn.date}, digest ${revision.digest.slice(0, 12)}, ${file}\n`,
    err: "",
  };
}

function unknownPhase(target: string, checked: Checked & { kind: "valid" }): Outcome {
  const known = checked.drafts.map(({ project, phase }) => `${project}/${phase}`);
  const near = nearest(target, known);
  return usage(
    "issue",
    `there is no statement ${target}; ${near ? `did you mean ${near}?` : `known: ${known.join(", ")}`}`,
  );
}
