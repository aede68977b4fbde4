// Wiring only: the launcher has validated, computed and made every page model before this file is read.
// `STILLBOARD_PLAN` names the plan: a list of pages and the module that holds their models.
import { readFileSync } from "node:fs";

export default async function (config) {
  const file = process.env.STILLBOARD_PLAN;
  if (!file) throw new Error("start the build with: npm run build");
  const { bundle, pages, models, output } = JSON.parse(readFileSync(file, "utf8"));
  const { strict } = await import(bundle);

  config.setQuietMode(true);
  config.setTemplateFormats(["njk"]);
  config.ignores.add("templates/pages/**");
  config.ignores.add("templates/parts/**");
  config.setNunjucksEnvironmentOptions({ throwOnUndefined: true, autoescape: true });
  config.addGlobalData("pages", pages);
  config.addFilter("model", (page) => strict(models[page], page));
  return { dir: { input: "templates", includes: "parts", output }, htmlTemplateEngine: "njk" };
}
