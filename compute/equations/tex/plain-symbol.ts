const greek: Readonly<Record<string, string>> = {
  alpha: "α",
  delta: "δ",
  lambda: "λ",
  theta: "θ",
  Delta: "Δ",
  Omega: "Ω",
  tau: "τ",
};

/** A symbol's name for a terminal, e.g. `D_Ω`. */
export function plainSymbol(name: string): string {
  return name.replace(/[A-Za-z]+/g, (word) => greek[word] ?? word).replace(/^Δ /, "Δ");
}
