import { expect } from "vitest";

/** Agrees with a printed value when within half of its last printed digit ("0.80" -> 0.005). */
export function expectPrinted(actual: number, printed: string): void {
  const decimals = printed.split(".")[1]?.length ?? 0;
  const half = 0.5 * 10 ** -decimals;
  // A millionth of a digit for ties: 0.125 is no binary fraction of the printed digits.
  expect(Math.abs(actual - Number(printed)), `printed ${printed}, computed ${actual}`).toBeLessThanOrEqual(
    half * (1 + 1e-6),
  );
}
