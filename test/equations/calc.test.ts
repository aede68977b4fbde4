import { describe, expect, test } from "vitest";
import { calc } from "../../compute/command/calc.ts";
import { equationIds } from "../../compute/equations/registry.ts";

describe("calc works one equation out", () => {
  test("in plain words: symbol, value, unit, the equation with its numbers, its source", () => {
    // 10 lg(10^6 + 10^6.3) = 10 lg 2995262.3 = 64.764
    expect(calc(["sum-levels", "levelsDb=60,63"])).toEqual({
      code: 0,
      out: [
        "L = 64.7643486 dB",
        "  L = 10·lg(10^(0.1·60.0) + 10^(0.1·63.0)) = 64.8 dB",
        "ISO/TR 25417, 2007: definition of the level, energies added (worked out from its definition)",
        "",
      ].join("\n"),
      err: "",
    });
  });

  test("with the definitions that the case uses", () => {
    const { out } = calc(["divergence", "distanceM=100"]);
    expect(out.split("\n").slice(0, 2)).toEqual(["A_div = 51 dB", "  A_div = 20·lg(100.0/1) + 11 = 51.0 dB"]);
    const { out: edge } = calc(["double-edge-factor", "bandHz=500", "betweenEdgesM=5"]);
    expect(edge).toContain("  λ = 340/500 = 0.68\n");
  });

  test("as one line of JSON", () => {
    const { code, out, err } = calc(["permitted-time", "--json", "levelDb=100", "criterionDb=90", "exchangeRateDb=5"]);
    expect({ code, err }).toEqual({ code: 0, err: "" });
    expect(out.endsWith("}\n") && out.indexOf("\n") === out.length - 1).toBe(true);
    // [read] 29 CFR 1910.95: 2 h at 100 dBA
    expect(JSON.parse(out)).toEqual({
      equation: "permitted-time",
      version: 1,
      value: 2,
      unit: "h",
      inputs: { levelDb: 100, criterionDb: 90, exchangeRateDb: 5 },
    });
  });

  test("from numbers as people write them", () => {
    const value = (word: string) => JSON.parse(calc(["level-of-intensity", word, "--json"]).out).value;
    expect([value("intensityWm2=1e-6"), value("intensityWm2=.000001"), value("intensityWm2=+1.E-6")]).toEqual([
      60, 60, 60,
    ]);
  });
});

describe("calc lists and explains", () => {
  test("all equations without arguments", () => {
    const { code, out, err } = calc([]);
    expect({ code, err }).toEqual({ code: 0, err: "" });
    for (const id of equationIds) expect(out).toMatch(new RegExp(`^${id} `, "m"));
    expect(out).toContain(
      "bandHz sourceHeightM receptorHeightM planDistanceM groundSource groundMiddle groundReceptor",
    );
  });

  test("itself with --help, and the ranges of one equation", () => {
    expect(calc(["--help"]).out).toContain("npm run -s calc -- [<id> name=value …] [--json]");
    expect(calc(["wearing-time", "--help"]).out).toBe(
      [
        "wearing-time: protection left when worn part of the time, in dB",
        "  protectionDb  a number from 0 to 60 dB",
        "  wornPct  a number from 0 to 100 %",
        "Stillboard, own rule: energy at the ear with and without protector (worked out from its definition)",
        "",
      ].join("\n"),
    );
  });
});

describe("calc refuses in one line", () => {
  test.each([
    [["sum-level", "levelsDb=60"], 'calc: there is no equation "sum-level"; did you mean "sum-levels"?'],
    [["toString"], /^calc: there is no equation "toString"; did you mean "[a-z-]+"\?$/],
    [
      ["sum-levels", "levelDb=60"],
      'calc sum-levels: input: expected one of levelsDb, received "levelDb". Did you mean "levelsDb"?',
    ],
    [
      ["sum-levels"],
      "calc sum-levels: levelsDb: expected a list, each a number from -1500 to 200 dB, received nothing",
    ],
    [
      ["wearing-time", "protectionDb=30"],
      "calc wearing-time: wornPct: expected a number from 0 to 100 %, received nothing",
    ],
    [
      ["wearing-time", "protectionDb"],
      "calc wearing-time: protectionDb: expected protectionDb=value, a number from 0 to 60 dB, received nothing",
    ],
    [
      ["divergence", "distanceM=near"],
      'calc divergence: distanceM: expected a number above 0 and up to 10000 m, received "near"',
    ],
    [
      ["divergence", "distanceM="],
      'calc divergence: distanceM: expected a number above 0 and up to 10000 m, received ""',
    ],
    [
      ["divergence", "distanceM=1,5"],
      'calc divergence: distanceM: expected a number above 0 and up to 10000 m, received "1,5"',
    ],
    [
      ["divergence", "distanceM=Infinity"],
      'calc divergence: distanceM: expected a number above 0 and up to 10000 m, received "Infinity"',
    ],
    [
      ["divergence", "distanceM=0"],
      "calc divergence: distanceM: expected a number above 0 and up to 10000 m, received 0",
    ],
    [
      ["divergence", "distanceM=1", "distanceM=2"],
      'calc divergence: distanceM: expected each input once, received "distanceM=2"',
    ],
    [
      ["ground-effect-alternative", "distanceM=1e999", "meanPathHeightM=1"],
      "calc ground-effect-alternative: distanceM: expected a number above 0 and up to 10000 m, received Infinity",
    ],
    [
      ["double-edge-factor", "bandHz=100", "betweenEdgesM=1"],
      "calc double-edge-factor: bandHz: expected one of 63, 125, 250, 500, 1000, 2000, 4000, 8000 Hz, received 100",
    ],
    [
      ["subtract-level", "totalDb=60", "partDb=63"],
      "calc subtract-level: totalDb: expected a level above partDb (63 dB), received 60. A part cannot be louder than the total",
    ],
    [["sum-levels", "levelsDb=60", "--jsn"], "calc: there is no option --jsn; did you mean --json?"],
    [["--json"], "calc: expected the id of an equation, received nothing"],
  ] as const)("%j", (args, message) => {
    const { code, out, err } = calc(args);
    expect({ code, out }).toEqual({ code: 1, out: "" });
    expect(err.endsWith("\n") && err.indexOf("\n") === err.length - 1).toBe(true);
    if (typeof message === "string") expect(err).toBe(`${message}\n`);
    else expect(err.trimEnd()).toMatch(message);
  });
});
