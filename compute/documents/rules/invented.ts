import type { DocumentSet, Rule } from "../document-set.ts";
import { isFictionNumber } from "../fiction-number.ts";
import { isExampleDomain } from "../is-example-domain.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { statementsOf } from "../statements-of.ts";
import type { Project } from "../types/project.gen.ts";
import { usedSheets } from "../used-sheets.ts";
import { walkValues } from "../walk-values.ts";

const MARK_ADVICE = 'Only a project with "invented": true may use it.';

/** A project that does not bear the mark "invented" uses nothing invented; a statement bears the mark of its project. */
export const invented: Rule = (set) => [...sheets(set), ...statements(set), ...contacts(set)];

function isReal(set: DocumentSet, projectId: string): boolean {
  return set.project.valid.get(projectId)?.sheet.invented === false;
}

function sheets(set: DocumentSet): Mistake[] {
  return usedSheets(set).flatMap(({ reference, entry }) => {
    if (!isReal(set, reference.projectId)) return [];
    if (entry.sheet.invented) {
      const received = `"${reference.id}", which is invented or borrows an invented shape`;
      return [
        mistakeAt(
          set.texts,
          reference.file,
          reference.pointer,
          "a document that is not invented",
          received,
          MARK_ADVICE,
        ),
      ];
    }
    return [...walkValues(entry.sheet)].flatMap(({ pointer, value }) =>
      value === "invented" && pointer.endsWith("/checked")
        ? [
            mistakeAt(
              set.texts,
              entry.file,
              pointer,
              `a source that can be checked, as the project ${reference.projectId} uses it`,
              '"invented"',
              MARK_ADVICE,
            ),
          ]
        : [],
    );
  });
}

function statements(set: DocumentSet): Mistake[] {
  return statementsOf(set).flatMap(({ file, statement, project, projectId }) => {
    if (!project || statement.invented === project.invented) return [];
    const expected = `${project.invented}, as the project ${projectId} has`;
    return [
      mistakeAt(
        set.texts,
        file,
        "/invented",
        expected,
        String(statement.invented),
        "A statement bears the mark of its project.",
      ),
    ];
  });
}

function contacts(set: DocumentSet): Mistake[] {
  return [...set.project.valid.values()]
    .filter(({ sheet }) => !sheet.invented)
    .flatMap(({ sheet, file }) => ofProject(set, file, sheet));
}

function ofProject(set: DocumentSet, file: string, project: Project): Mistake[] {
  const found: Mistake[] = [];
  for (const [index, { telephone, email }] of project.contacts.entries()) {
    if (isFictionNumber(telephone)) {
      const expected = "a telephone number that reaches somebody";
      const advice = "It lies in a range set aside for fiction; if it is real, write it with its country code.";
      found.push(mistakeAt(set.texts, file, `/contacts/${index}/telephone`, expected, `"${telephone}"`, advice));
    }
    if (isExampleDomain(email.slice(email.lastIndexOf("@") + 1))) {
      found.push(
        mistakeAt(
          set.texts,
          file,
          `/contacts/${index}/email`,
          "an address that reaches somebody",
          `"${email}"`,
          "Its domain is kept for examples.",
        ),
      );
    }
  }
  if (project.publicUrl !== undefined && isExampleDomain(new URL(project.publicUrl).hostname)) {
    found.push(
      mistakeAt(
        set.texts,
        file,
        "/publicUrl",
        "an address on a domain of your own",
        `"${project.publicUrl}"`,
        "Its domain is kept for examples.",
      ),
    );
  }
  return found;
}
