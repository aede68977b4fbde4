import type { Equation, InputSpec } from "../../compute/equations/equation.ts";
import { rangeText } from "../../compute/equations/equation.ts";
import { equationIds, equationOf } from "../../compute/equations/registry.ts";
import { sealedEquation } from "../../compute/record/sealed-equation.ts";
import { equationPart } from "./equation-part.ts";
import { markdown } from "./markdown.ts";
import type { Typesetter } from "./math.ts";
import type { Page } from "./page.ts";
import { headOf } from "./page.ts";
import type { Words } from "./words.ts";

/** How levels are calculated: the prose of content/method/ and every equation with its source and ranges. */
export function calculationPage(words: Words, method: ReadonlyMap<string, string>, typesetter: Typesetter): Page {
  const file = "calculation/index.html";
  return {
    file,
    template: "calculation",
    model: {
      head: headOf({
        file,
        words,
        title: words.say("calculation.title"),
        description: words.say("calculation.description"),
        above: [],
        invented: false,
      }),
      w: words.section("calculation-page"),
      chapters: [...method]
        .filter(([name]) => name !== "changes")
        .map(([name, text]) => ({ id: name, html: markdown(text) })),
      changes: markdown(method.get("changes") ?? ""),
      equations: equationIds.map((id) => {
        const found = equationOf(id) as Equation;
        const { inputs, ...part } = equationPart(words, sealedEquation(id), typesetter);
        const ranges = Object.values(found.inputs as Readonly<Record<string, InputSpec>>).map(rangeText);
        return { ...part, inputs: inputs.map((input, index) => ({ ...input, range: ranges[index] ?? "" })) };
      }),
    },
  };
}
