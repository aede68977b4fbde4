import type { DocumentSet } from "./document-set.ts";
import type { Project } from "./types/project.gen.ts";
import type { Statement } from "./types/statement.gen.ts";

/** A statement with its place; the project is missing if its own document has mistakes of shape. */
export interface PlacedStatement {
  readonly projectId: string;
  readonly phase: string;
  readonly file: string;
  readonly statement: Statement;
  readonly project: Project | undefined;
}

/** All statements whose shape is right, in the order of project and phase. */
export function statementsOf(set: DocumentSet): readonly PlacedStatement[] {
  return [...set.statement.valid].map(([name, { sheet: statement, file }]) => {
    const [projectId = "", phase = ""] = name.split("/");
    return { projectId, phase, file, statement, project: set.project.valid.get(projectId)?.sheet };
  });
}
