import { describe, expect, test } from "vitest";
import { silently } from "../../compute/equations/working.ts";
import type { ActionValue, Duty, Notice, Place } from "../../compute/hearing/notice.ts";
import { notice } from "../../compute/hearing/notice.ts";

// The rule of design.md 7, written out here from its text: the notice is mandatory when for any place level + U meets the law's
// value, or peak data meet it, or impulsive plant has no peak data; where the law has no value, or one above 85, it also stands
// from 85 as good practice; else it informs when the information value is met.
type Comparator = "above" | "at-or-above";
type Offset = "below" | "at" | "over";

const U = 3;
const SHIFT = { shiftH: 8, uncertaintyDb: U };
const OFFSETS: readonly Offset[] = ["below", "at", "over"];
const COMPARATORS: readonly Comparator[] = ["above", "at-or-above"];
const MET: Readonly<Record<Comparator, Readonly<Record<Offset, boolean>>>> = {
  above: { below: false, at: false, over: true },
  "at-or-above": { below: false, at: true, over: true },
};
/** A whole number or half beside a whole value: exact in binary, so "at" is at. */
const placed = (value: number, offset: Offset) => value + { below: -0.5, at: 0, over: 0.5 }[offset];

const action = (levelDba: number | undefined, comparator: Comparator, peakDbc: number | undefined): ActionValue => ({
  levelDba,
  comparator,
  peakDbc,
  peakComparator: comparator,
});
const duty = (mandatoryFrom: ActionValue, informationFrom: ActionValue): Duty => ({
  exchange: { kind: "equal-energy" },
  mandatoryFrom,
  informationFrom,
});
const place = (changes: Partial<Place>): Place => ({
  machine: "machine",
  besideDba: 40,
  workStationDba: undefined,
  peak: undefined,
  impulsive: false,
  ...changes,
});
const standing = (found: Notice) => (found.kind === "mandatory" ? `mandatory by ${found.by}` : found.kind);
const judge = (rules: Duty, places: readonly Place[], shift = SHIFT) =>
  standing(notice(silently, rules, places, shift));

interface Case {
  readonly lawDba: 80 | 85 | 90 | undefined;
  readonly comparator: Comparator;
  readonly infoDba: 75 | undefined;
  /** What the level with U is compared with, and how it lies to it. */
  readonly level: { readonly of: 75 | 80 | 85 | 90; readonly offset: Offset };
  readonly where: "beside" | "work-station";
  readonly peak: Offset | undefined;
  readonly lawPeak: 137 | undefined;
  readonly impulsive: boolean;
}

/** How a level that lies by an offset at one value lies to another. */
function towards({ of, offset }: Case["level"], value: number): Offset {
  if (of === value) return offset;
  return of < value ? "below" : "over";
}

function byTheRule({ lawDba, comparator, infoDba, level, peak, lawPeak, impulsive }: Case): string {
  const lawLevel = lawDba !== undefined && MET[comparator][towards(level, lawDba)];
  const lawPeakMet = lawPeak !== undefined && peak !== undefined && MET[comparator][peak];
  if (lawLevel || lawPeakMet || (impulsive && peak === undefined)) return "mandatory by law";
  const goodPractice = lawDba === undefined || lawDba > 85;
  if (goodPractice && MET["at-or-above"][towards(level, 85)]) return "mandatory by good-practice";
  return infoDba !== undefined && MET[comparator][towards(level, infoDba)] ? "information" : "none";
}

const cases: readonly Case[] = ([80, 85, 90, undefined] as const).flatMap((lawDba) =>
  COMPARATORS.flatMap((comparator) =>
    ([75, undefined] as const).flatMap((infoDba) =>
      ([75, 80, 85, 90] as const).flatMap((of) =>
        OFFSETS.flatMap((offset) =>
          (["beside", "work-station"] as const).flatMap((where) =>
            ([undefined, ...OFFSETS] as const).flatMap((peak) =>
              ([137, undefined] as const).flatMap((lawPeak) =>
                [false, true].map(
                  (impulsive): Case => ({
                    lawDba,
                    comparator,
                    infoDba,
                    level: { of, offset },
                    where,
                    peak,
                    lawPeak,
                    impulsive,
                  }),
                ),
              ),
            ),
          ),
        ),
      ),
    ),
  ),
);

describe("the notice by the rule", () => {
  test("in every combination of law, comparator, information, level, place, peak and impulses", () => {
    // 4 laws × 2 comparators × 2 informations × 4 values × 3 offsets × 2 places × 4 peaks × 2 peak laws × 2 characters.
    expect(cases).toHaveLength(6144);
    const wrong = cases.filter((each) => {
      const levelDba = placed(each.level.of, each.level.offset) - U;
      const found = judge(
        duty(action(each.lawDba, each.comparator, each.lawPeak), action(each.infoDba, each.comparator, undefined)),
        [
          place({
            ...(each.where === "beside" ? { besideDba: levelDba } : { workStationDba: levelDba }),
            impulsive: each.impulsive,
            peak: each.peak && { levelDbc: placed(137, each.peak), distanceM: 1 },
          }),
        ],
      );
      return found !== byTheRule(each);
    });
    expect(wrong).toEqual([]);
  });
  test("the combinations reach each kind of notice", () => {
    const counts = new Map<string, number>();
    for (const each of cases) counts.set(byTheRule(each), (counts.get(byTheRule(each)) ?? 0) + 1);
    expect([...counts.keys()].sort()).toEqual([
      "information",
      "mandatory by good-practice",
      "mandatory by law",
      "none",
    ]);
  });
});

describe("some of them by hand", () => {
  const britain = duty(action(85, "at-or-above", 137), action(80, "at-or-above", 135));
  const norm = duty(action(undefined, "above", undefined), action(undefined, "above", undefined));
  const ninety = duty(action(90, "above", 140), action(85, "at-or-above", undefined));
  test.each([
    ["82 + 3 meets 85", britain, place({ besideDba: 82 }), "mandatory by law"],
    ["81.9 + 3 does not, but 80", britain, place({ besideDba: 81.9 }), "information"],
    ["76.9 + 3 meets neither", britain, place({ besideDba: 76.9 }), "none"],
    ["the work station alone", britain, place({ workStationDba: 82 }), "mandatory by law"],
    ["a peak of 137 at 1 m", britain, place({ peak: { levelDbc: 137, distanceM: 1 } }), "mandatory by law"],
    [
      "a peak of 117 at 10 m is 137 at 1 m",
      britain,
      place({ peak: { levelDbc: 117, distanceM: 10 } }),
      "mandatory by law",
    ],
    ["a peak of 136 informs", britain, place({ peak: { levelDbc: 136, distanceM: 1 } }), "information"],
    [
      "a peak of 143 taken half a metre away, 137 at 1 m",
      britain,
      place({ peak: { levelDbc: 143.1, distanceM: 0.5 } }),
      "mandatory by law",
    ],
    ["impulses without peak data", britain, place({ impulsive: true }), "mandatory by law"],
    [
      "impulses with peak data far below",
      britain,
      place({ impulsive: true, peak: { levelDbc: 100, distanceM: 1 } }),
      "none",
    ],
    ["no value in law: 82 + 3 meets 85", norm, place({ besideDba: 82 }), "mandatory by good-practice"],
    ["no value in law: 81.9 + 3", norm, place({ besideDba: 81.9 }), "none"],
    [
      "law above 90: 87 + 3 is not above 90 but above 85",
      ninety,
      place({ besideDba: 87 }),
      "mandatory by good-practice",
    ],
    ["law above 90: 87.1 + 3 is", ninety, place({ besideDba: 87.1 }), "mandatory by law"],
    ["a peak of 140 is not above 140", ninety, place({ peak: { levelDbc: 140, distanceM: 1 } }), "none"],
  ])("%s", (_, rules, at, hand) => {
    expect(judge(rules, [at])).toBe(hand);
  });
  test("one loud place among quiet ones is enough, and is named", () => {
    const found = notice(
      silently,
      britain,
      [place({ machine: "quiet" }), place({ machine: "loud", besideDba: 90, workStationDba: 95 })],
      SHIFT,
    );
    expect(found).toEqual({
      kind: "mandatory",
      by: "law",
      reasons: [
        { kind: "beside", machine: "loud", levelDba: 90 },
        { kind: "work-station", machine: "loud", levelDba: 95 },
      ],
    });
  });
  test("without plant there is no notice", () => {
    expect(notice(silently, britain, [], SHIFT)).toEqual({ kind: "none", reasons: [] });
  });
});

describe("long shifts", () => {
  // [derived] Bystander for the whole shift: 12 h cost 10 lg 1.5 = 1.7609 dB by equal energy, 2.9248 dB at 5 dB for each halving.
  const long = { shiftH: 12, uncertaintyDb: U };
  test("lower what is met, by the exchange of the duty set", () => {
    const energy = duty(action(85, "at-or-above", undefined), action(undefined, "above", undefined));
    expect([80.24, 80.23].map((besideDba) => judge(energy, [place({ besideDba })], long))).toEqual([
      "mandatory by law",
      "none",
    ]);
    const five: Duty = { ...energy, exchange: { kind: "exchange-rate", rateDb: 5 } };
    expect([79.08, 79.07].map((besideDba) => judge(five, [place({ besideDba })], long))).toEqual([
      "mandatory by law",
      "none",
    ]);
  });
  test("85 as good practice goes by equal energy, whatever the law's exchange", () => {
    const ninety: Duty = {
      ...duty(action(90, "above", undefined), action(undefined, "above", undefined)),
      exchange: { kind: "exchange-rate", rateDb: 5 },
    };
    expect([80.24, 80.23].map((besideDba) => judge(ninety, [place({ besideDba })], long))).toEqual([
      "mandatory by good-practice",
      "none",
    ]);
  });
  test("a short shift counts as 8 h: a bystander may stay on", () => {
    const energy = duty(action(85, "at-or-above", undefined), action(undefined, "above", undefined));
    expect(judge(energy, [place({ besideDba: 82 })], { shiftH: 2, uncertaintyDb: U })).toBe("mandatory by law");
    expect(judge(energy, [place({ besideDba: 81.9 })], { shiftH: 2, uncertaintyDb: U })).toBe("none");
  });
});
