import type { Wording } from "../../compute/documents/types/wording.gen.ts";

/** The words of one language; a missing word or a missing part of a sentence throws. */
export interface Words {
  readonly language: string;
  /** All words of a section, for templates to print as they stand. */
  readonly section: (name: string) => Readonly<Record<string, string>>;
  /** A word or sentence `section.key`, its `{parts}` filled in. */
  readonly say: (key: string, parts?: Readonly<Record<string, string | number>>) => string;
}

/** A word that pages need and a wording does not have; for the author of the wording to mend. */
export class WordError extends Error {
  override readonly name = "WordError";

  constructor(file: string, what: string) {
    super(`${file}: expected ${what}, received nothing. Write every word that pages print.`);
  }
}

/** The words of a wording document; `file` is where they are kept, for messages. */
export function wordsOf(wording: Wording, file = `content/wording/${wording.language}.json`): Words {
  const section = (name: string) => {
    const found = wording.sections[name];
    if (!found) throw new WordError(file, `the section "${name}"`);
    return found;
  };
  const word = (key: string) => {
    const [name = "", ...rest] = key.split(".");
    const found = section(name)[rest.join(".")];
    if (found === undefined) throw new WordError(file, `the word "${key}"`);
    return found;
  };
  return {
    language: wording.language,
    section,
    say: (key, parts = {}) =>
      word(key).replace(/\{(\w+)\}/g, (_whole, name: string) => {
        const part = parts[name];
        if (part === undefined) throw new Error(`"${key}" in ${wording.language}: nothing is given for {${name}}`);
        return String(part);
      }),
  };
}

/** An author's text in a language, or in the project's first where there is none. */
export function textIn(text: Readonly<Record<string, unknown>>, language: string, first: string): string {
  const found = text[language] ?? text[first] ?? Object.values(text)[0];
  if (typeof found !== "string") throw new Error(`a text has no language (${JSON.stringify(text)})`);
  return found;
}
