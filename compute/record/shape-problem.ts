import { validator } from "../documents/validator.ts";

/**
 * What is wrong with the shape of a file that the tool itself writes; nothing if it is right.
 *
 * @param kind   which of the two files
 * @param value  the parsed file
 */
export function shapeProblem(kind: "revision" | "figures", value: unknown): string | undefined {
  const check = validator(kind);
  if (check(value)) return undefined;
  const [first] = check.errors ?? [];
  return `${first?.instancePath || "/"} ${first?.message ?? "has the wrong shape"}`;
}
