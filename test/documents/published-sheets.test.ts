import { expect, test } from "vitest";
import { loadContent } from "../../compute/documents/load-content.ts";
import { mistakeText } from "../../compute/documents/mistake-text.ts";

const BANDS = ["63", "125", "250", "500", "1000", "2000", "4000", "8000"] as const;

const loaded = loadContent("content");
const sheets = () => {
  if (loaded.kind === "invalid") throw new Error(loaded.mistakes.map(mistakeText).join("\n"));
  return loaded.content;
};

test("the content of this project has no mistake", () => {
  expect(loaded.kind === "invalid" ? loaded.mistakes.map(mistakeText) : []).toEqual([]);
});

// [read] Bies, Hansen and Howard, Engineering Noise Control, 5th edition 2017, Table 7.6; "-" is not printed there.
test.each([
  ["plywood-18", 10, "- 24 22 27 28 25 27 -"],
  ["steel-16g", 13, "9 14 21 27 32 37 43 42"],
  ["steel-door", undefined, "37 36 39 44 49 54 57 60"],
])("panel %s as printed", (id, surfaceDensityKgm2, printed) => {
  const sheet = sheets().panels.get(id)?.sheet;
  if (!sheet) throw new Error(`there is no panel ${id}`);
  if (surfaceDensityKgm2 !== undefined) expect(sheet.surfaceDensityKgm2).toBe(surfaceDensityKgm2);
  const values = printed.split(" ");
  expect(values.filter((value) => value !== "-").map(Number)).toEqual(
    BANDS.filter((_, i) => values[i] !== "-").map((band) => sheet.reductionIndexDb[band]),
  );
  expect(sheet.source.checked).toBe("read");
  // [derived] Where 63 Hz is not printed, the 125 Hz value less 6 dB is assumed, and the sheet says so.
  if (values[0] === "-")
    expect([sheet.reductionIndexDb["63"], sheet.assumed63Hz !== undefined]).toEqual([
      sheet.reductionIndexDb["125"] - 6,
      true,
    ]);
});

// [read] the same book, Table 6.2, 125 Hz to 4 kHz.
test.each([
  ["mineral-wool-50", ".3 .8 1 1 1 1"],
  ["concrete-floor", ".01 .01 .01 .02 .02 .02"],
])("lining %s as printed", (id, printed) => {
  const sheet = sheets().linings.get(id)?.sheet;
  if (!sheet) throw new Error(`there is no lining ${id}`);
  expect(BANDS.slice(1, 7).map((band) => sheet.absorption[band])).toEqual(printed.split(" ").map(Number));
  // [derived] Half the 125 Hz value is assumed at 63 Hz, and the sheet says so.
  expect([sheet.absorption["63"], sheet.assumed63Hz !== undefined]).toEqual([sheet.absorption["125"] / 2, true]);
});

// [read] S.R. (NI) 2006/1 regulation 4, as S.I. 2005/1643: lower 80 dB and 135 dB, upper 85 dB and 137 dB, "at or above".
test("exposure values of the Control of Noise at Work Regulations 2005", () => {
  const { mandatoryFrom, informationFrom } = sheets().duties.get("uk-noise-at-work-2005")?.sheet ?? {};
  expect(mandatoryFrom).toMatchObject({
    levelDba: 85,
    comparator: "at-or-above",
    peakDbc: 137,
    peakComparator: "at-or-above",
  });
  expect(informationFrom).toMatchObject({
    levelDba: 80,
    comparator: "at-or-above",
    peakDbc: 135,
    peakComparator: "at-or-above",
  });
});
