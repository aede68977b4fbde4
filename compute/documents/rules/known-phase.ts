import type { DocumentSet } from "../document-set.ts";
import type { Mistake } from "../mistake.ts";
import type { Stands } from "../types/common.gen.ts";
import { unknownId } from "./unknown-id.ts";

/** A mistake if something stands from or until a phase that the project does not have. */
export function knownPhase(
  set: DocumentSet,
  projectId: string,
  file: string,
  pointer: string,
  stands: Stands | undefined,
): readonly Mistake[] {
  if (stands?.kind !== "phase") return [];
  const own = [...set.statement.names]
    .filter((name) => name.startsWith(`${projectId}/`))
    .map((name) => name.slice(projectId.length + 1));
  return unknownId(set.texts, file, `${pointer}/phase`, stands.phase, own, "phase of this project");
}
