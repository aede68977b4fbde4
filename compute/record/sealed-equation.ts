import type { SealedEquation } from "../documents/types/revision.gen.ts";
import type { InputSpec } from "../equations/equation.ts";
import { equationOf } from "../equations/registry.ts";

/** An equation of today as a revision keeps it: what a page needs to typeset it and put numbers in. */
export function sealedEquation(id: string): SealedEquation {
  const found = equationOf(id);
  if (!found) throw new Error(`there is no equation "${id}"`);
  const inputs = Object.entries(found.inputs as Readonly<Record<string, InputSpec>>).map(([name, input]) => [
    name,
    {
      kind: input.kind,
      symbol: input.symbol,
      unit: input.unit,
      ...(input.decimals === undefined ? {} : { decimals: input.decimals }),
    },
  ]);
  const { symbol, unit, decimals } = found.value;
  const { document, edition, clause, checked } = found.source;
  return {
    id,
    title: found.title,
    version: found.version,
    tex: found.tex,
    value: { symbol, unit, ...(decimals === undefined ? {} : { decimals }) },
    inputs: Object.fromEntries(inputs),
    source: { document, edition, clause, checked },
  };
}
