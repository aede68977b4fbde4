import { expect, test } from "vitest";
import { setsAtOnce } from "../../compute/programme/running-together.ts";

// [derived] Read off a bar chart of the stretches, hours as minutes are not needed here.
const stretch = (fromMin: number, toMin: number) => ({ fromMin, toMin });

test("activities one after the other are never at once, also when they touch", () => {
  expect(setsAtOnce([[stretch(8, 12)], [stretch(12, 16)]])).toEqual([[0], [1]]);
});
test("activities that overlap are at once for a while", () => {
  expect(setsAtOnce([[stretch(8, 14)], [stretch(12, 18)]])).toEqual([[0], [0, 1]]);
});
test("one that begins as another ends is not at work with it, but with a third that goes on", () => {
  expect(setsAtOnce([[stretch(8, 12)], [stretch(12, 16)], [stretch(9, 13)]])).toEqual([[0], [1, 2], [0, 2]]);
});
test("each set stands once, however often it comes", () => {
  expect(setsAtOnce([[stretch(8, 18)], [stretch(9, 10), stretch(11, 12)]])).toEqual([[0], [0, 1]]);
});
test("all that begin together are one set", () => {
  expect(setsAtOnce([[stretch(8, 9)], [stretch(8, 12)], [stretch(8, 10)]])).toEqual([[0, 1, 2]]);
});
test("without work there is no set", () => {
  expect(setsAtOnce([[], []])).toEqual([]);
});
