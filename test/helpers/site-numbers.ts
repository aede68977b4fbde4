/** The first number of a printed text, and the half of its last printed digit. */
export function printedNumber(text: string): { readonly value: number; readonly half: number } {
  const found = text.match(/[−-]?\d+(?:\.(\d+))?/);
  if (!found) throw new Error(`there is no number in "${text}"`);
  return { value: Number(found[0].replace("−", "-")), half: 0.5 * 10 ** -(found[1]?.length ?? 0) };
}
