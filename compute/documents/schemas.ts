import common from "../../schema/common.schema.json" with { type: "json" };
import dutySet from "../../schema/duty-set.schema.json" with { type: "json" };
import limitSet from "../../schema/limit-set.schema.json" with { type: "json" };
import lining from "../../schema/lining.schema.json" with { type: "json" };
import panel from "../../schema/panel.schema.json" with { type: "json" };
import plant from "../../schema/plant.schema.json" with { type: "json" };
import project from "../../schema/project.schema.json" with { type: "json" };
import silencer from "../../schema/silencer.schema.json" with { type: "json" };
import statement from "../../schema/statement.schema.json" with { type: "json" };
import wording from "../../schema/wording.schema.json" with { type: "json" };
import type { JsonSchema } from "./json-schema.ts";

const ALL = {
  common,
  "duty-set": dutySet,
  "limit-set": limitSet,
  lining,
  panel,
  plant,
  project,
  silencer,
  statement,
  wording,
};

/** Every kind of document an author writes; the name of its schema. */
export type DocumentKind = Exclude<keyof typeof ALL, "common">;

/** The schemas of what authors write, and the shapes they share. */
export const schemas: Readonly<Record<DocumentKind | "common", JsonSchema>> = ALL as unknown as Readonly<
  Record<DocumentKind | "common", JsonSchema>
>;
