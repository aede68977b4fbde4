/** A value that holds no other, with the way to it. */
export interface Leaf {
  readonly path: readonly (string | number)[];
  readonly value: string | number | boolean | null;
}

/** Every leaf of a JSON value, in order. */
export function leavesOf(value: unknown, path: Leaf["path"] = []): readonly Leaf[] {
  if (Array.isArray(value)) return value.flatMap((each, index) => leavesOf(each, [...path, index]));
  if (typeof value === "object" && value !== null)
    return Object.entries(value).flatMap(([key, each]) => leavesOf(each, [...path, key]));
  return [{ path, value: value as Leaf["value"] }];
}

/** Puts a value in the place of a leaf, in the document itself. */
export function setLeaf(document: unknown, path: Leaf["path"], value: unknown): void {
  const holder = path.slice(0, -1).reduce((at, key) => (at as Record<string | number, unknown>)[key], document);
  (holder as Record<string | number, unknown>)[path.at(-1) as string | number] = value;
}

/** The way to a leaf with a star for every place in a list: leaves of one kind share it. */
export function kindOf({ path }: Leaf): string {
  return path.map((step) => (typeof step === "number" ? "*" : step)).join("/");
}

/** The value of a leaf with one character, digit or truth changed. */
export function changedLeaf({ value }: Leaf): Leaf["value"] {
  if (typeof value === "string") return `${value.slice(0, -1)}${value.endsWith("x") ? "y" : "x"}`;
  if (typeof value === "number") return value + (Math.abs(value) < 1e6 ? 1 : Math.abs(value) / 2);
  return value === null ? false : !value;
}
