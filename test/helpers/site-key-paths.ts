/** Where a key stands in a model: the keys and list indexes on the way to it. */
export type Way = readonly (string | number)[];

/**
 * Every distinct key path of a model with one way to it: places in lists count as one, variants by their kind as several.
 * `points[].governing<steps>.lead` is one path however many points there are.
 */
export function keyPaths(model: unknown): ReadonlyMap<string, Way> {
  const found = new Map<string, Way>();
  walk(model, "", [], found);
  return found;
}

function walk(value: unknown, path: string, way: Way, found: Map<string, Way>): void {
  if (Array.isArray(value)) {
    for (const [index, part] of value.entries()) walk(part, `${path}[]`, [...way, index], found);
  } else if (typeof value === "object" && value !== null) {
    const { kind } = value as { readonly kind?: unknown };
    const here = typeof kind === "string" ? `${path}<${kind}>` : path;
    for (const [key, part] of Object.entries(value)) {
      const inner = here === "" ? key : `${here}.${key}`;
      if (!found.has(inner)) found.set(inner, [...way, key]);
      walk(part, inner, [...way, key], found);
    }
  }
}

/** Leaves of each list only what adds a key path, so that a page of many tables renders at once; the paths stay the same. */
export function thinned<T>(model: T): T {
  return thin(structuredClone(model)) as T;
}

function thin(value: unknown): unknown {
  if (Array.isArray(value)) {
    const known = new Set<string>();
    return value.map(thin).filter((part, index) => {
      const paths = [...keyPaths([part]).keys()];
      const adds = index === 0 || paths.some((path) => !known.has(path));
      for (const path of paths) known.add(path);
      return adds;
    });
  }
  if (typeof value !== "object" || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([key, part]) => [key, thin(part)]));
}

/** A copy of a model without one key. */
export function without<T>(model: T, way: Way): T {
  const copy = structuredClone(model);
  const holder = way.slice(0, -1).reduce((held: unknown, step) => (held as Record<string, unknown>)[step], copy);
  delete (holder as Record<string, unknown>)[way.at(-1) as string];
  return copy;
}
