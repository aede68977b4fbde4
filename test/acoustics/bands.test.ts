import { expect, test } from "vitest";
import { A_WEIGHTS_DB, BANDS_HZ, exactMidbandHz, inOrder, perBand } from "../../compute/acoustics/bands.ts";
import { expectPrinted } from "../helpers/printed.ts";

test("A-weights are the printed ones", () => {
  // [read] IEC 61672-1:2013, Table 3, rows 63 Hz to 8 kHz.
  expect(inOrder(A_WEIGHTS_DB)).toEqual([-26.2, -16.1, -8.6, -3.2, 0, 1.2, 1.0, -1.1]);
});

test("exact midbands are base ten", () => {
  // [derived] 1000·10^(3k/10), ISO 266; printed digits.
  const printed = ["63.0957", "125.8925", "251.1886", "501.1872", "1000.0000", "1995.2623", "3981.0717", "7943.2823"];
  for (const [index, bandHz] of BANDS_HZ.entries()) expectPrinted(exactMidbandHz(bandHz), printed[index] ?? "");
});

test("values per band stand in the order of the bands", () => {
  expect(inOrder(perBand((bandHz) => bandHz / 1000))).toEqual([0.063, 0.125, 0.25, 0.5, 1, 2, 4, 8]);
});
