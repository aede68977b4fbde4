import { afterEach, describe, expect, test, vi } from "vitest";
import { dateOption } from "../../compute/command/date-option.ts";
import { progressOn } from "../../compute/command/progress.ts";

describe("today", () => {
  afterEach(() => {
    vi.useRealTimers();
  });
  test.each([
    ["Pacific/Auckland", "2027-03-16"],
    ["Europe/London", "2027-03-15"],
    ["America/Los_Angeles", "2027-03-15"],
  ])("is the day in %s", (zone, date) => {
    vi.useFakeTimers({ now: new Date("2027-03-15T12:00:00Z"), toFake: ["Date"] });
    expect(dateOption(undefined, zone)).toEqual({ kind: "date", date });
  });
});

describe("--as-of", () => {
  test("is a calendar date, whatever the zone", () => {
    expect(dateOption("2028-02-29", "Pacific/Auckland")).toEqual({ kind: "date", date: "2028-02-29" });
  });
  test.each(["2027-02-29", "2027-13-01", "15.3.2027", "20270315", "today", ""])("%j is none", (given) => {
    expect(dateOption(given, "UTC")).toEqual({
      kind: "wrong",
      problem: `expected --as-of as a calendar date like 2027-03-08, received ${given}`,
    });
  });
});

describe("progress", () => {
  const told = (isTTY: boolean) => {
    const written: string[] = [];
    const progress = progressOn({ isTTY, write: (text: string | Uint8Array) => written.push(String(text)) > 0 });
    progress.tell("checking");
    progress.tell("writing");
    progress.done();
    return written.join("");
  };
  test("is plain lines in a pipe", () => {
    expect(told(false)).toBe("checking\nwriting\n");
  });
  test("is one line on a terminal that renews itself and goes", () => {
    expect(told(true)).toBe("\r\x1b[Kchecking\r\x1b[Kwriting\r\x1b[K");
  });
});
