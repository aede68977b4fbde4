import type { SealedEquation } from "../../compute/documents/types/revision.gen.ts";
import type { Typesetter } from "./math.ts";
import type { Words } from "./words.ts";

/** An equation as pages print it: once in symbols, with its source and how far that was checked. */
export function equationPart(words: Words, equation: SealedEquation, typesetter: Typesetter) {
  const { document, edition, clause, checked } = equation.source;
  return {
    id: equation.id,
    title: equation.title,
    symbols: typesetter.display(equation.tex),
    source: words.say("equations.source", { document, edition, clause, version: equation.version }),
    checked: words.say(`checked.${checked}`),
    inputs: Object.entries(equation.inputs).map(([name, input]) => ({
      symbol: typesetter.inline(input.symbol),
      name,
      unit: input.unit === "1" ? words.say("equations.no-unit") : input.unit,
    })),
  };
}
