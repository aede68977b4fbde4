import type { DocumentSet, Rule } from "../document-set.ts";
import { isText } from "../is-text.ts";
import type { Mistake } from "../mistake.ts";
import { mistakeAt } from "../mistake-at.ts";
import { pointerTo } from "../pointer-to.ts";
import { walkValues } from "../walk-values.ts";

const known = new Intl.DisplayNames(["en"], { type: "language", fallback: "none" });

/** Every language code is one of ISO 639. */
export const languages: Rule = (set) => {
  const kinds = ["project", "statement", "plant", "panel", "lining", "silencer", "limit-set", "duty-set"] as const;
  const documents = kinds.flatMap((kind) => [...set[kind].valid.values()]);
  return [
    ...documents.flatMap(({ sheet, file }) =>
      [...walkValues(sheet)].flatMap(({ pointer, value }) => inValue(set, file, pointer, value)),
    ),
    ...[...set.wording.valid.values()].flatMap(({ sheet, file }) =>
      unknownCode(set, file, "/language", sheet.language),
    ),
  ];
};

function inValue(set: DocumentSet, file: string, pointer: string, value: unknown): Mistake[] {
  if (isText(value))
    return Object.keys(value).flatMap((code) => unknownCode(set, file, pointerTo(pointer, code), code, "name"));
  if (!pointer.endsWith("/languages") || !Array.isArray(value)) return [];
  return value.flatMap((code: string, index) => unknownCode(set, file, pointerTo(pointer, index), code));
}

function unknownCode(set: DocumentSet, file: string, pointer: string, code: string, place?: "name"): Mistake[] {
  if (known.of(code) !== undefined) return [];
  const advice = 'Codes have two or three small letters, then perhaps a hyphen and a country: "pl", "en-AU".';
  return [mistakeAt(set.texts, file, pointer, "a language code of ISO 639", `"${code}"`, advice, place)];
}
