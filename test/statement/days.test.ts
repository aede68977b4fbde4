import { describe, expect, test } from "vitest";
import { everCoincide } from "../../compute/statement/coincident.ts";
import type { StatementInputs } from "../../compute/statement/inputs.ts";
import type { RuleRef } from "../../compute/statement/limit-rules.ts";
import { limitRules } from "../../compute/statement/limit-rules.ts";
import { periodDays } from "../../compute/statement/period-days.ts";
import { standsThroughout } from "../../compute/statement/stands.ts";
import { sceneInputs } from "../helpers/scene-inputs.ts";

// [derived] Counting on a calendar: 1 March 2027 is a Monday.
type Activity = StatementInputs["statement"]["activities"][number];
type Window = Activity["windows"][number];
const WEEK: Window["days"] = ["mon", "tue", "wed", "thu", "fri"];
const window = (days: Window["days"], from: string, to: string): Window => ({ id: "window", days, from, to });
const base = sceneInputs().statement.activities[0] as Activity;
const activity = (from: string, until: string, ...windows: Window[]): Activity => ({ ...base, from, until, windows });

describe("whether two activities are ever at work at once", () => {
  const day = (from: string, until: string) => activity(from, until, window(WEEK, "08:00", "16:00"));
  test("needs days and hours in common", () => {
    const late = activity("2027-03-01", "2027-03-12", window(WEEK, "16:00", "20:00"));
    const overlapping = activity("2027-03-01", "2027-03-12", window(WEEK, "15:59", "20:00"));
    const works = day("2027-03-01", "2027-03-05");
    expect(everCoincide(works, day("2027-03-05", "2027-03-12"))).toBe(true);
    expect(everCoincide(works, day("2027-03-08", "2027-03-12"))).toBe(false);
    expect(everCoincide(works, late)).toBe(false);
    expect(everCoincide(works, overlapping)).toBe(true);
    expect(everCoincide(late, works)).toBe(false);
  });
  test("looks at the days that both have: only Saturdays, only weekdays", () => {
    const saturdays = activity("2027-03-01", "2027-03-31", window(["sat"], "08:00", "16:00"));
    expect(everCoincide(saturdays, day("2027-03-01", "2027-03-31"))).toBe(false);
  });
  test("counts work begun in the evening against work of the next morning", () => {
    const night = activity("2027-03-01", "2027-03-05", window(WEEK, "22:00", "06:00"));
    const early = (from: string) => activity(from, "2027-03-12", window([...WEEK, "sat"], "05:00", "09:00"));
    expect(everCoincide(night, early("2027-03-02"))).toBe(true);
    // The last night ends on Saturday 6 March, a day after the activity's last date.
    expect(everCoincide(night, early("2027-03-06"))).toBe(true);
    expect(everCoincide(early("2027-03-06"), night)).toBe(true);
    expect(everCoincide(night, early("2027-03-08"))).toBe(false);
  });
});

describe("kinds of day in a limit's period", () => {
  const days = (activities: readonly Activity[], period: Omit<RuleRef["rule"]["period"], "id" | "name">) => {
    const inputs = sceneInputs(({ statement }) => {
      statement.from = "2027-03-01";
      statement.until = "2027-03-12";
      statement.activities = activities.map((each, index) => ({
        ...structuredClone(each),
        id: `work-${index}`,
      })) as never;
    });
    const ref = limitRules(inputs)[0] as RuleRef;
    const rule = { ...ref.rule, period: { ...ref.rule.period, ...period } };
    return periodDays(inputs, { ...ref, rule }).map(({ date, work }) => [date, ...work.map((each) => each.activity)]);
  };
  test("are the first day with each mix of work", () => {
    const all = activity("2027-03-01", "2027-03-12", window(WEEK, "08:00", "16:00"));
    const some = activity("2027-03-03", "2027-03-12", window(["wed", "thu"], "09:00", "12:00"));
    expect(days([all, some], { days: [...WEEK], from: "07:00", to: "19:00" })).toEqual([
      ["2027-03-01", "work-0"],
      ["2027-03-03", "work-0", "work-1"],
    ]);
  });
  test("leave out days that the period does not hold and days without work in it", () => {
    const saturday = activity("2027-03-01", "2027-03-12", window(["sat"], "08:00", "12:00"));
    expect(days([saturday], { days: [...WEEK], from: "07:00", to: "19:00" })).toEqual([]);
    expect(days([saturday], { days: ["sat"], from: "13:00", to: "19:00" })).toEqual([]);
  });
  test("tell hours apart: a shorter day is another kind", () => {
    const long = activity(
      "2027-03-01",
      "2027-03-12",
      window(["mon", "tue"], "08:00", "16:00"),
      window(["wed"], "08:00", "12:00"),
    );
    expect(days([long], { days: [...WEEK], from: "07:00", to: "19:00" })).toEqual([
      ["2027-03-01", "work-0"],
      ["2027-03-03", "work-0"],
    ]);
  });
  test("hold the morning after the last day and the night before the first", () => {
    const lastNight = activity("2027-03-12", "2027-03-12", window(["fri"], "22:00", "06:00"));
    expect(days([lastNight], { days: ["sat"], from: "00:00", to: "07:00" })).toEqual([["2027-03-13", "work-0"]]);
    const firstMorning = activity("2027-03-01", "2027-03-01", window(["mon"], "05:00", "06:30"));
    expect(days([firstMorning], { days: ["sun"], from: "23:00", to: "07:00" })).toEqual([["2027-02-28", "work-0"]]);
  });
});

describe("what stands throughout an activity", () => {
  const inputs = sceneInputs((all) => {
    all.phases = {
      early: { from: "2027-02-01", until: "2027-02-26" },
      late: { from: "2027-03-01", until: "2027-03-26" },
    };
  });
  const date = (on: string) => ({ kind: "date", date: on }) as const;
  const phase = (id: string) => ({ kind: "phase", phase: id }) as const;
  const stands = (
    from: Parameters<typeof standsThroughout>[1]["standsFrom"],
    until?: Parameters<typeof standsThroughout>[1]["standsUntil"],
  ) => standsThroughout(inputs, { standsFrom: from, standsUntil: until }, "2027-03-01", "2027-03-12");
  test("by date: on the first day and on the last, no later, no earlier", () => {
    expect([stands(date("2027-03-01")), stands(date("2027-03-02"))]).toEqual([true, false]);
    expect([stands(undefined, date("2027-03-12")), stands(undefined, date("2027-03-11"))]).toEqual([true, false]);
    expect(stands(undefined)).toBe(true);
  });
  test("by phase: from its first day, until its last", () => {
    expect([stands(phase("early")), stands(phase("late"))]).toEqual([true, true]);
    expect([stands(undefined, phase("late")), stands(undefined, phase("early"))]).toEqual([true, false]);
    expect(stands(phase("early"), phase("early"))).toBe(false);
  });
});
