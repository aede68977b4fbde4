import { describe, expect, test } from "vitest";
import { datesFrom, dayOf, daysAfter, minutesOf } from "../../compute/programme/dates.ts";
import type { ClockWindow } from "../../compute/programme/window-hours.ts";
import { hoursOf, stretchesInPeriod, stretchOf } from "../../compute/programme/window-hours.ts";

// [derived] All of it is counting on a calendar: 1 March 2027 is a Monday.
const window = (days: ClockWindow["days"], from: string, to: string): ClockWindow => ({ days, from, to });
const WEEK = ["mon", "tue", "wed", "thu", "fri"] as const;
const DAY = window([], "07:00", "19:00");
const NIGHT = window([], "23:00", "07:00");
const activity = (windows: readonly ClockWindow[], from = "2027-03-01", until = "2027-03-05") => ({
  from,
  until,
  windows,
});
const stretches = (windows: readonly ClockWindow[], period: ClockWindow, date: string, from?: string, until?: string) =>
  stretchesInPeriod(activity(windows, from, until), period, date).map(({ fromMin, toMin }) => [
    fromMin / 60,
    toMin / 60,
  ]);

describe("dates", () => {
  test("days of the week, also across the change of the clocks", () => {
    expect([dayOf("2027-03-01"), dayOf("2027-03-28"), dayOf("2024-02-29")]).toEqual(["mon", "sun", "thu"]);
    expect([daysAfter("2027-02-28", 1), daysAfter("2027-03-01", -1), daysAfter("2028-02-28", 1)]).toEqual([
      "2027-03-01",
      "2027-02-28",
      "2028-02-29",
    ]);
  });
  test("all dates of a span, both ends included; none if it ends before it begins", () => {
    expect(datesFrom("2027-03-27", "2027-03-29")).toEqual(["2027-03-27", "2027-03-28", "2027-03-29"]);
    expect(datesFrom("2027-03-01", "2027-03-01")).toEqual(["2027-03-01"]);
    expect(datesFrom("2027-03-02", "2027-03-01")).toEqual([]);
  });
  test("minutes of the clock", () => {
    expect(["00:00", "07:05", "24:00"].map(minutesOf)).toEqual([0, 425, 1440]);
  });
});

describe("a window", () => {
  test("ends on the same day, at midnight, or on the next day", () => {
    expect(stretchOf(window([], "08:00", "17:30"))).toEqual({ fromMin: 480, toMin: 1050 });
    expect(stretchOf(window([], "20:00", "24:00"))).toEqual({ fromMin: 1200, toMin: 1440 });
    expect(stretchOf(window([], "22:00", "06:00"))).toEqual({ fromMin: 1320, toMin: 1800 });
    expect(stretchOf(window([], "08:00", "08:00"))).toEqual({ fromMin: 480, toMin: 1920 });
  });
  test("has hours", () => {
    expect([hoursOf(DAY), hoursOf(NIGHT), hoursOf(window([], "00:00", "24:00"))]).toEqual([12, 8, 24]);
  });
});

describe("stretches inside a period", () => {
  test("are cut to it", () => {
    expect(stretches([window(WEEK, "06:00", "20:00")], DAY, "2027-03-01")).toEqual([[7, 19]]);
    expect(stretches([window(WEEK, "06:30", "08:00")], DAY, "2027-03-01")).toEqual([[7, 8]]);
    expect(stretches([window(WEEK, "20:00", "22:00")], DAY, "2027-03-01")).toEqual([]);
  });
  test("that only touch it are none", () => {
    expect(stretches([window(WEEK, "05:00", "07:00"), window(WEEK, "19:00", "20:00")], DAY, "2027-03-01")).toEqual([]);
  });
  test("belong to the days of the window and the dates of the activity", () => {
    expect(stretches([window(["tue"], "08:00", "12:00")], DAY, "2027-03-01")).toEqual([]);
    expect(stretches([window(["tue"], "08:00", "12:00")], DAY, "2027-03-02")).toEqual([[8, 12]]);
    expect(stretches([window(["tue"], "08:00", "12:00")], DAY, "2027-03-09")).toEqual([]);
  });
  test("of a night hold work begun in the evening and work of the next morning", () => {
    // [derived] Hours count from midnight of the evening's date, so 05:00 of the next day is 29.
    const both = [window(WEEK, "22:00", "01:30"), window(WEEK, "05:00", "08:00")];
    expect(stretches(both, NIGHT, "2027-03-01")).toEqual([
      [23, 25.5],
      [29, 31],
    ]);
  });
  test("of the first night hold no work of the evening before the first day", () => {
    const late = [window(WEEK, "22:00", "06:00")];
    expect(stretches(late, DAY, "2027-03-01")).toEqual([]);
    expect(stretches(late, window([], "00:00", "07:00"), "2027-03-01")).toEqual([]);
    expect(stretches(late, window([], "00:00", "07:00"), "2027-03-02")).toEqual([[0, 6]]);
  });
  test("of the morning after the last day hold work begun the evening before", () => {
    const late = [window(WEEK, "22:00", "06:00")];
    expect(stretches(late, window([], "00:00", "07:00"), "2027-03-06")).toEqual([[0, 6]]);
    expect(stretches(late, window([], "00:00", "07:00"), "2027-03-07")).toEqual([]);
  });
  test("that overlap or touch are one, so that no minute counts twice", () => {
    const windows = [window(WEEK, "13:00", "15:00"), window(WEEK, "08:00", "12:00"), window(WEEK, "12:00", "14:00")];
    expect(stretches(windows, DAY, "2027-03-01")).toEqual([[8, 15]]);
    expect(stretches([window(WEEK, "08:00", "18:00"), window(WEEK, "09:00", "10:00")], DAY, "2027-03-01")).toEqual([
      [8, 18],
    ]);
    expect(stretches([window(WEEK, "08:00", "10:00"), window(WEEK, "11:00", "12:00")], DAY, "2027-03-01")).toEqual([
      [8, 10],
      [11, 12],
    ]);
  });
});
