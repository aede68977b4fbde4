import type { Rule } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { walkValues } from "../walk-values.ts";

/** No two things of one document have one id. */
export const uniqueIds: Rule = (set) => {
  const documents = [set.project, set.statement, set["limit-set"]].flatMap((shelf) => [...shelf.valid.values()]);
  return documents.flatMap(({ sheet, file }) => doubled(set.texts, file, sheet));
};

function doubled(texts: ReadonlyMap<string, string>, file: string, document: unknown): Mistake[] {
  const first = new Map<string, string>();
  const found: Mistake[] = [];
  for (const { pointer, value, listed } of walkValues(document)) {
    const id = listed && typeof value === "object" ? (value as { id?: unknown } | null)?.id : undefined;
    if (typeof id !== "string") continue;
    const before = first.get(id);
    if (before === undefined) first.set(id, pointer);
    else {
      const received = `"${id}", which ${before} has too`;
      found.push(
        mistakeAt(
          texts,
          file,
          `${pointer}/id`,
          "an id that nothing else in this document has",
          received,
          "Give one of the two another id.",
        ),
      );
    }
  }
  return found;
}
