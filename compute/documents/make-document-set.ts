import type { ContentFile } from "./content-files.ts";
import type { DocumentSet, Shelf } from "./document-set.ts";
import type { DocumentKind } from "./schemas.ts";

/**
 * The documents on their shelves.
 *
 * @param shaped  the documents that meet their schema, so that each has the type its kind says
 */
export function makeDocumentSet(
  texts: ReadonlyMap<string, string>,
  files: readonly ContentFile[],
  shaped: ReadonlyMap<ContentFile, unknown>,
): DocumentSet {
  const shelf = <T>(kind: DocumentKind): Shelf<T> => {
    const own = files
      .filter((file) => file.layout.kind === "document" && file.layout.document === kind)
      .sort((a, b) => (a.name < b.name ? -1 : 1));
    const valid = own
      .filter((file) => shaped.has(file))
      .map((file) => [file.name, { sheet: shaped.get(file) as T, file: file.file }] as const);
    return { valid: new Map(valid), names: new Set(own.map((file) => file.name)) };
  };
  return {
    texts,
    project: shelf("project"),
    statement: shelf("statement"),
    plant: shelf("plant"),
    panel: shelf("panel"),
    lining: shelf("lining"),
    silencer: shelf("silencer"),
    "limit-set": shelf("limit-set"),
    "duty-set": shelf("duty-set"),
    wording: shelf("wording"),
  };
}
