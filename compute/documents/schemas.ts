import common from "../../schema/common.schema.json" with { type: "json" };
import dutySet from "../../schema/duty-set.schema.json" with { type: "json" };
import figures from "../../schema/figures.schema.json" with { type: "json" };
import limitSet from "../../schema/limit-set.schema.json" with { type: "json" };
import lining from "../../schema/lining.schema.json" with { type: "json" };
import panel from "../../schema/panel.schema.json" with { type: "json" };
import plant from "../../schema/plant.schema.json" with { type: "json" };
import project from "../../schema/project.schema.json" with { type: "json" };
import revision from "../../schema/revision.schema.json" with { type: "json" };
import silencer from "../../schema/silencer.schema.json" with { type: "json" };
import statement from "../../schema/statement.schema.json" with { type: "json" };
import wording from "../../schema/wording.schema.json" with { type: "json" };
import type { JsonSchema } from "./json-schema.ts";

const ALL = {
  common,
  "duty-set": dutySet,
  figures,
  "limit-set": limitSet,
  lining,
  panel,
  plant,
  project,
  revision,
  silencer,
  statement,
  wording,
};

/** Every kind of file the program reads or writes; the name of its schema. */
export type FileKind = Exclude<keyof typeof ALL, "common">;

/** Every kind of document an author writes. */
export type DocumentKind = Exclude<FileKind, "revision" | "figures">;

/** All schemas, and the shapes they share. */
export const schemas = ALL as unknown as Readonly<Record<keyof typeof ALL, JsonSchema>>;
