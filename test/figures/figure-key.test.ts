import { expect, test } from "vitest";
import { figure, figureKey, partsOf } from "../../compute/figures/figure-key.ts";

const parts = {
  quantity: "insertion-loss",
  metric: "LAeq-15min",
  subject: "chandlers-row.first-floor",
  period: "consent.day",
  scope: "phase",
  controls: "screen-north",
};

test("a key is its six parts in the order of design.md 3", () => {
  expect(figureKey(parts)).toBe("insertion-loss/LAeq-15min/chandlers-row.first-floor/consent.day/phase/screen-north");
});
test("a key gives its parts back", () => {
  expect(partsOf(figureKey(parts))).toEqual(parts);
});
test("what is not a key has no parts", () => {
  for (const wrong of ["", "level/LAeq/a/b/c", "level/LAeq/a/b/c/", "level/LAeq/a/b/c/d/e", "level//a/b/c/d"])
    expect(partsOf(wrong)).toBeUndefined();
});
test("a part that would break an address or a key is refused by name", () => {
  for (const wrong of ["", "a/b", "a b", "-a", "a#b", "ä"])
    expect(() => figureKey({ ...parts, scope: wrong })).toThrowError(`"${wrong}" cannot be part of a figure key`);
});
test("a figure carries its key, its parts, its value unrounded and its unit", () => {
  expect(figure(parts, 5.123456789, "dB")).toEqual({ key: figureKey(parts), ...parts, value: 5.123456789, unit: "dB" });
});
test("a figure that is no number is refused by its key", () => {
  expect(() => figure(parts, Number.NaN, "dB")).toThrowError(
    `${figureKey(parts)}: the value is not a finite number (NaN)`,
  );
});
