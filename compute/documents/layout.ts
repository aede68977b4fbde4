import type { DocumentKind } from "./schemas.ts";

/** What may stand at a place of the content folder. */
export type Layout =
  | { readonly kind: "document"; readonly document: DocumentKind }
  | { readonly kind: "prose" }
  /** Belongs there, and is read by another part. */
  | { readonly kind: "unread" }
  | Folder;

export interface Folder {
  readonly kind: "folder";
  readonly named: Readonly<Record<string, Layout>>;
  /** A file that has to be there. */
  readonly required?: string;
  /** Folders of any other name. */
  readonly folders?: Folder;
  /** Files of any other name with this ending. */
  readonly files?: { readonly ending: ".json" | ".md"; readonly layout: Layout };
}

const sheets = (document: DocumentKind): Folder => ({
  kind: "folder",
  named: {},
  files: { ending: ".json", layout: { kind: "document", document } },
});

const PHASE: Folder = {
  kind: "folder",
  named: {
    "statement.json": { kind: "document", document: "statement" },
    "standing.json": { kind: "unread" },
    issued: { kind: "unread" },
  },
  required: "statement.json",
};
const PROJECT: Folder = {
  kind: "folder",
  named: { "project.json": { kind: "document", document: "project" }, measured: { kind: "unread" } },
  required: "project.json",
  folders: PHASE,
};

/** The folders of content and what each of them holds. */
export const layout: Folder = {
  kind: "folder",
  named: {
    projects: { kind: "folder", named: {}, folders: PROJECT },
    "data-sheets": {
      kind: "folder",
      named: {
        plant: sheets("plant"),
        panels: sheets("panel"),
        linings: sheets("lining"),
        silencers: sheets("silencer"),
      },
    },
    limits: sheets("limit-set"),
    duties: sheets("duty-set"),
    wording: sheets("wording"),
    method: { kind: "folder", named: {}, files: { ending: ".md", layout: { kind: "prose" } } },
  },
};
