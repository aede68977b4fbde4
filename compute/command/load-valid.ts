import type { Content } from "../documents/content.ts";
import { loadContent } from "../documents/load-content.ts";
import type { Mistake } from "../documents/mistake.ts";
import { mistakeAt } from "../documents/mistake-at.ts";
import { sortMistakes } from "../documents/sort-mistakes.ts";
import { InputError, show } from "../equations/input-error.ts";
import { silently } from "../equations/working.ts";
import type { StatementFigures } from "../statement/figures-of.ts";
import { figuresOf } from "../statement/figures-of.ts";
import type { StatementInputs } from "../statement/inputs.ts";
import { inputsOf } from "../statement/inputs-of.ts";
import { zoneMistakes } from "../statement/zone-mistakes.ts";

/** A draft with its figures. */
export interface Draft {
  readonly project: string;
  readonly phase: string;
  readonly inputs: StatementInputs;
  readonly figures: StatementFigures;
}

export type Checked =
  | { readonly kind: "valid"; readonly content: Content; readonly drafts: readonly Draft[] }
  | { readonly kind: "invalid"; readonly mistakes: readonly Mistake[] };

/** Content that is valid as documents and as scenes: every draft worked out, every zone answered. */
export function loadValid(folder: string): Checked {
  const loaded = loadContent(folder);
  if (loaded.kind === "invalid") return loaded;
  const { content } = loaded;
  const results = [...content.projects.values()].flatMap((project) =>
    [...project.statements].map(([phase, { file }]) => {
      const inputs = inputsOf(content, project, phase);
      return draft(content, project.project.id, phase, file, inputs);
    }),
  );
  const mistakes = [...languagesWithoutWords(content), ...results.flatMap((result) => result.mistakes)];
  if (mistakes.length > 0) return { kind: "invalid", mistakes: sortMistakes(mistakes) };
  return { kind: "valid", content, drafts: results.flatMap((result) => result.draft ?? []) };
}

function draft(
  content: Content,
  project: string,
  phase: string,
  file: string,
  inputs: StatementInputs,
): { readonly draft?: Draft; readonly mistakes: readonly Mistake[] } {
  try {
    const figures = figuresOf(silently, inputs);
    return {
      draft: { project, phase, inputs, figures },
      mistakes: zoneMistakes(content.texts, file, inputs, figures.earProtection),
    };
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    const expected = `${error.field} within the range of its equation, ${error.expected}`;
    return { mistakes: [mistakeAt(content.texts, file, "", expected, show(error.received), error.advice)] };
  }
}

/** A project is published in its languages, so each needs the words that pages print. */
function languagesWithoutWords(content: Content): readonly Mistake[] {
  return [...content.projects.values()].flatMap(({ project, file }) =>
    project.languages.flatMap((language, index) => {
      if (content.wording.has(language)) return [];
      const expected = `a language whose words are in content/wording: ${[...content.wording.keys()].map(show).join(", ") || "none yet"}`;
      const advice = `Write content/wording/${language}.json, or take the language out.`;
      return [mistakeAt(content.texts, file, `/languages/${index}`, expected, show(language), advice)];
    }),
  );
}
