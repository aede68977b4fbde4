import type { Rule } from "../document-set.ts";
import { references, type SheetKind } from "../references.ts";
import { unknownId } from "./unknown-id.ts";

const WHAT: Readonly<Record<SheetKind, string>> = {
  plant: "plant sheet",
  panel: "panel sheet",
  lining: "lining sheet",
  silencer: "silencer sheet",
  "limit-set": "limit set",
  "duty-set": "duty set",
};

/** Every sheet, limit set and duty set that a project or a statement names is there. */
export const knownSheets: Rule = (set) =>
  references(set).flatMap(({ file, pointer, kind, id }) =>
    unknownId(set.texts, file, pointer, id, set[kind].names, WHAT[kind]),
  );
