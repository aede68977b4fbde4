import { describe, expect, test } from "vitest";
import type { Page } from "../../templates/models/page.ts";
import type { Way } from "../helpers/site-key-paths.ts";
import { keyPaths, thinned, without } from "../helpers/site-key-paths.ts";
import { variedPages } from "../helpers/site-models.ts";
import { renderPage } from "../helpers/site-render.ts";

interface Instance {
  readonly page: Page;
  readonly way: Way;
}

const pages = variedPages().map((page) => ({ ...page, model: thinned(page.model) }));
const templates = [...new Set(pages.map(({ template }) => template))].sort();

/** One page for each key path of a template. */
function instances(template: string): ReadonlyMap<string, Instance> {
  const found = new Map<string, Instance>();
  for (const page of pages.filter((each) => each.template === template))
    for (const [path, way] of keyPaths(page.model)) if (!found.has(path)) found.set(path, { page, way });
  return found;
}

function throwsWithout({ page, way }: Instance): boolean {
  try {
    renderPage({ ...page, model: without(page.model, way) });
    return false;
  } catch {
    return true;
  }
}

describe("a key that is missing from a page model stops the build", () => {
  test("there are models of every page type", () => {
    expect(templates).toEqual(["calculation", "ear-protection", "home", "project", "sheet", "statement", "workings"]);
  });

  test.each(pages.map((page) => [`${page.template} ${page.file}`, page] as const))("%s renders whole", (_, page) => {
    expect(renderPage(page)).toMatch(/<\/html>\s*$/);
  });

  test.each(templates)("%s", (template) => {
    const all = instances(template);
    expect(all.size).toBeGreaterThan(20);
    // Words of the frame are one section for all page types: home has no way back, other pages no name of the site.
    const own = [...all].filter(([path]) => !path.startsWith("head.common."));
    const dead = own.filter(([, instance]) => !throwsWithout(instance)).map(([path]) => path);
    expect(dead).toEqual([]);
  });

  test("words of the frame are each printed on some page", () => {
    const words = new Set(templates.flatMap((template) => [...instances(template).keys()]));
    for (const path of [...words].filter((each) => each.startsWith("head.common.")))
      expect(
        templates.some((template) => throwsWithout(instances(template).get(path) as Instance)),
        path,
      ).toBe(true);
  });
});
