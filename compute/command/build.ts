import { siteOf } from "../../templates/models/site.ts";
import { mistakeText } from "../documents/mistake-text.ts";
import { issuedRevisions } from "../record/issued-revisions.ts";
import type { Command, Outcome, Place } from "./command.ts";
import { usage } from "./command.ts";
import { dateOption } from "./date-option.ts";
import { freshFolder, mendSwap } from "./fresh-folder.ts";
import type { Checked } from "./load-valid.ts";
import { loadValid } from "./load-valid.ts";
import { readOptions } from "./options.ts";
import { outputProblems } from "./output-problems.ts";
import { progressOn } from "./progress.ts";
import { writeSite } from "./write-site.ts";

export const build: Command = {
  summary: "makes the site of all issued revisions",
  help: `npm run build -- [--as-of YYYY-MM-DD] [--content DIR] [--out DIR]

Validates the content and works every draft out, then makes the site of the issued revisions, from their sealed files alone. The
site is made in a folder of its own and takes the place of the last one only when it is whole and has passed its checks; after any
mistake the last site stays.

  --as-of DATE   date that decides which revision is in force (today in the first project's time zone)
  --content DIR  content folder (content)
  --out DIR      folder of the site (_site)
`,
  run: (args, place) => {
    const parsed = readOptions(args, { "as-of": "string", content: "string", out: "string" });
    if (parsed.kind === "wrong") return usage("build", parsed.problem);
    if (parsed.rest.length > 0) return usage("build", `expected no further words, received ${parsed.rest.join(" ")}`);
    const { options } = parsed;
    return buildSite(
      {
        content: (options.content as string | undefined) ?? "content",
        out: (options.out as string | undefined) ?? "_site",
        asOf: options["as-of"] as string | undefined,
      },
      place,
    );
  },
};

interface BuildOptions {
  readonly content: string;
  readonly out: string;
  readonly asOf: string | undefined;
}

/** Makes the site; nothing is written before content, record and models are whole. */
export async function buildSite({ content, out, asOf }: BuildOptions, place: Place): Promise<Outcome> {
  mendSwap(out);
  const progress = progressOn();
  progress.tell("checking the content");
  const checked = loadValid(content);
  if (checked.kind === "invalid") {
    progress.done();
    const lines = checked.mistakes.map((mistake) => `${mistakeText(mistake)}\n`).join("");
    return { code: 1, out: "", err: `${lines}Nothing was written; the last site stays.\n` };
  }
  const date = dateOption(asOf, firstTimeZone(checked));
  if (date.kind === "wrong") return usage("build", date.problem);
  const wording = checked.content.wording.get("en");
  if (!wording)
    return {
      code: 1,
      out: "",
      err: `${content}/wording: expected en.json, received nothing. Write the words of the site.\n`,
    };
  const site = siteOf({ phases: issuedRevisions(content), wording, method: checked.content.method, asOf: date.date });
  const fresh = freshFolder(out);
  progress.tell(`writing ${site.pages.length} pages`);
  try {
    await writeSite(site, fresh.folder, place);
    const problems = outputProblems(fresh.folder);
    if (problems.length > 0) {
      fresh.drop();
      return { code: 1, out: "", err: `${problems.map((problem) => `${problem}\n`).join("")}The last site stays.\n` };
    }
    fresh.swapIn();
  } catch (error) {
    fresh.drop();
    throw error;
  } finally {
    progress.done();
  }
  return { code: 0, out: `${site.pages.length} pages in ${out}, as of ${date.date}\n`, err: "" };
}

function firstTimeZone(checked: Checked & { kind: "valid" }): string {
  const [first] = checked.content.projects.values();
  return first?.project.timeZone ?? "UTC";
}
