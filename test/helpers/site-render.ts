import nunjucks from "nunjucks";
import type { Page } from "../../templates/models/page.ts";
import { strict } from "../../templates/models/strict.ts";

const environment = new nunjucks.Environment(new nunjucks.FileSystemLoader("."), {
  throwOnUndefined: true,
  autoescape: true,
});

/** A page's HTML as the build writes it: the model as it stands in the plan, read strictly by the template. */
export function renderPage({ file, template, model }: Page): string {
  const planned = JSON.parse(JSON.stringify(model)) as Page["model"];
  return environment.render(`templates/pages/${template}.njk`, { m: strict(planned, file) });
}
