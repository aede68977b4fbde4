import { describe, expect, test } from "vitest";
import { strict } from "../../templates/models/strict.ts";
import { textIn, wordsOf } from "../../templates/models/words.ts";

describe("a page model", () => {
  const model: { readonly [key: string]: unknown } = {
    level: 64.5,
    wrong: Number.NaN,
    endless: Number.POSITIVE_INFINITY,
    nothing: undefined,
    empty: null,
    rows: [{ text: "a" }],
  };
  const read = strict(model, "page");

  test("gives what it holds", () => {
    expect(read.level).toBe(64.5);
    expect((read.rows as readonly { text: string }[]).map(({ text }) => text)).toEqual(["a"]);
  });
  test.each([
    ["levle", "page.levle: the page model has no such key"],
    ["wrong", "page.wrong: a page cannot print NaN"],
    ["endless", "page.endless: a page cannot print Infinity"],
    ["nothing", "page.nothing: the page model holds no value here"],
    ["empty", "page.empty: the page model holds no value here"],
  ])("throws for %s", (key, message) => {
    expect(() => read[key]).toThrow(message);
  });
  test("throws deep inside a list, with the place", () => {
    const [row] = read.rows as readonly { readonly text: string; readonly more?: string }[];
    expect(() => row?.more).toThrow("page.rows.0.more: the page model has no such key");
  });
});

describe("words", () => {
  const words = wordsOf({ language: "en", sections: { levels: { day: "{day} {date}", unit: "dB" } } });

  test("are filled in", () => {
    expect(words.say("levels.day", { day: "Monday", date: "8 March 2027" })).toBe("Monday 8 March 2027");
  });
  test("that are missing throw with file and name", () => {
    expect(() => words.say("levels.night")).toThrow(
      'content/wording/en.json: expected the word "levels.night", received nothing. Write every word that pages print.',
    );
    expect(() => words.say("times.night")).toThrow(
      'content/wording/en.json: expected the section "times", received nothing.',
    );
    expect(() => words.section("times")).toThrow(
      'content/wording/en.json: expected the section "times", received nothing.',
    );
  });
  test("with a part that nobody gives throw", () => {
    expect(() => words.say("levels.day", { day: "Monday" })).toThrow('"levels.day" in en: nothing is given for {date}');
  });
  test("of an author come in the page's language, else in the first", () => {
    expect(textIn({ en: "Pump", pl: "Pompa" }, "pl", "en")).toBe("Pompa");
    expect(textIn({ en: "Pump" }, "pl", "en")).toBe("Pump");
    expect(() => textIn({}, "pl", "en")).toThrow("a text has no language ({})");
  });
});
