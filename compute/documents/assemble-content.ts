import type { Content, ProjectEntry } from "./content.ts";
import type { DocumentSet } from "./document-set.ts";
import { statementsOf } from "./statements-of.ts";

/** The content, once no document has a mistake. */
export function assembleContent(set: DocumentSet, method: ReadonlyMap<string, string>): Content {
  const projects = new Map<string, ProjectEntry>();
  for (const [id, { sheet: project, file }] of set.project.valid) {
    const own = statementsOf(set).filter((one) => one.projectId === id);
    projects.set(id, {
      project,
      file,
      statements: new Map(own.map((one) => [one.phase, { statement: one.statement, file: one.file }])),
    });
  }
  return {
    projects,
    plant: set.plant.valid,
    panels: set.panel.valid,
    linings: set.lining.valid,
    silencers: set.silencer.valid,
    limits: set["limit-set"].valid,
    duties: set["duty-set"].valid,
    wording: new Map([...set.wording.valid].map(([language, entry]) => [language, entry.sheet])),
    method,
    texts: set.texts,
  };
}
