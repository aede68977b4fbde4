/** The place where a rising function meets a value, by halving the interval. */
export function solve(rising: (x: number) => number, target: number, low: number, high: number): number {
  let [from, to] = [low, high];
  for (let step = 0; step < 200; step++) {
    const middle = (from + to) / 2;
    if (rising(middle) < target) from = middle;
    else to = middle;
  }
  return (from + to) / 2;
}
