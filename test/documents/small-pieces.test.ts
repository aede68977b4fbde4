import { describe, expect, test } from "vitest";
import { minutesOfWeek } from "../../compute/documents/calendar/minutes-of-week.ts";
import { isFictionNumber } from "../../compute/documents/fiction-number.ts";
import { isExampleDomain } from "../../compute/documents/is-example-domain.ts";
import { nearest } from "../../compute/documents/nearest.ts";

describe("telephone numbers", () => {
  // [memory] Ofcom, "Telephone numbers for use in TV and radio drama programmes"; ranges also printed in encyclopedias.
  test.each([
    "01632 960123",
    "(01632) 960 999",
    "+44 1632 960001",
    "0044 1632 960001",
    "+44 (0)1632 960001",
    "07700 900456",
    "020 7946 0018",
    "+44 20 7946 0018",
    "0113 496 0000",
    "0121 496 0123",
    "0191 498 0999",
    "212-555-0123",
    "+1 212 555 0199",
    "02 5550 1234",
    "+61 3 5550 1234",
    "+33 1 99 00 12 34",
    "+49 30 23125 123",
  ])("%s is fiction", (telephone) => {
    expect(isFictionNumber(telephone)).toBe(true);
  });
  test.each([
    "01632 961123",
    "+44 20 7946 1018",
    "+49 1632 960123",
    "212-555-0200",
    "0113 497 0000",
    "+48 22 555 01 23",
  ])("%s is not", (telephone) => {
    expect(isFictionNumber(telephone)).toBe(false);
  });
});

describe("domains", () => {
  // [read] RFC 2606: the endings .test, .example, .invalid, .localhost, and example.com, example.net, example.org.
  test.each(["example.com", "works.example.org", "EXAMPLE.NET", "quay.example", "a.test", "b.invalid", "localhost"])(
    "%s is an example",
    (host) => {
      expect(isExampleDomain(host)).toBe(true);
    },
  );
  test.each(["example.co.uk", "counterexample.com", "latest", "contest.org"])("%s is not", (host) => {
    expect(isExampleDomain(host)).toBe(false);
  });
});

describe("minutes of the week", () => {
  test("a row of days, and one past midnight on Sunday", () => {
    expect(minutesOfWeek({ days: ["mon", "tue"], from: "07:00", to: "19:00" }).size).toBe(2 * 12 * 60);
    const night = minutesOfWeek({ days: ["sun"], from: "23:00", to: "01:00" });
    expect([night.size, night.has(0), night.has(60), night.has(7 * 1440 - 60)]).toEqual([120, true, false, true]);
    expect(minutesOfWeek({ days: ["sat"], from: "00:00", to: "24:00" }).size).toBe(1440);
  });
});

describe("nearest", () => {
  test("takes what differs by a third of the signs at most", () => {
    expect(nearest("ontime", ["onTimePct", "sheet"])).toBe("onTimePct");
    expect(nearest("hording", ["bund", "hoarding"])).toBe("hoarding");
    expect(nearest("wall", ["bund", "hoarding"])).toBeUndefined();
    expect(nearest("", [])).toBeUndefined();
  });
});
