import { readFileSync } from "node:fs";
import { describe, expect, test, vi } from "vitest";
import { commands } from "../../compute/command/commands.ts";
import { run } from "../../compute/command/main.ts";
import { runCommand } from "../helpers/site-command.ts";
import { runInside } from "../helpers/site-run-inside.ts";

const names = Object.keys(commands);

/** Runs a whole command line inside the test and keeps what it prints. */
async function runMain(...args: readonly string[]) {
  const printed = { out: "", err: "" };
  const keep = (stream: "out" | "err") => (text: unknown) => {
    printed[stream] += String(text);
    return true;
  };
  const spies = [
    vi.spyOn(process.stdout, "write").mockImplementation(keep("out")),
    vi.spyOn(process.stderr, "write").mockImplementation(keep("err")),
  ];
  try {
    return { code: await run(args, { root: process.cwd(), bundle: "none" }), ...printed };
  } finally {
    for (const spy of spies) spy.mockRestore();
  }
}

describe("commands", () => {
  test("have a line each in package.json", () => {
    const { scripts } = JSON.parse(readFileSync("package.json", "utf8")) as { scripts: Record<string, string> };
    for (const name of names) expect(scripts[name]).toBe(`node compute/command/launch.js ${name}`);
  });

  test.each([[], ["--help"]])("are listed on standard output by %j", async (...args) => {
    const { code, out, err } = await runMain(...(args as readonly string[]));
    expect([code, err]).toEqual([0, ""]);
    for (const name of names) expect(out).toMatch(new RegExp(`^  npm run ${name} +\\S`, "m"));
  });

  test.each([
    ["bild", 'there is no command "bild"; did you mean "build"?\nCommands:\n'],
    ["publish", 'there is no command "publish"\nCommands:\n'],
    ["toString", 'there is no command "toString"\nCommands:\n'],
  ])("%s is none", async (name, says) => {
    const { code, out, err } = await runMain(name);
    expect([code, out]).toEqual([1, ""]);
    expect(err.startsWith(says), err).toBe(true);
  });

  test.each(names)("%s --help says how it is used, and does nothing", async (name) => {
    const { code, out, err } = await runMain(name, "--help", "--nonsense");
    expect([code, err]).toEqual([0, ""]);
    expect(out).toMatch(new RegExp(`^npm run (-s )?${name}\\b`));
    expect(out.endsWith("\n")).toBe(true);
  });

  test.each(names.filter((name) => name !== "calc"))("%s --help names options that it takes", async (name) => {
    const named = [...(commands[name]?.help ?? "").matchAll(/^ {2}--([a-z-]+)/gm)].map(([, option]) => option ?? "");
    for (const option of named) {
      const { err } = await runInside(name, `--${option}x`);
      expect(err).toBe(
        `${name}: there is no option --${option}x; did you mean --${option}? See npm run ${name} -- --help\n`,
      );
    }
  });
});

/** A command line that cannot be read, and the whole of what is said about it. */
const WRONG: readonly (readonly [command: string, args: readonly string[], says: string])[] = [
  [
    "check",
    ["--contnet", "x"],
    "check: there is no option --contnet; did you mean --content? See npm run check -- --help",
  ],
  ["check", ["--quiet"], "check: there is no option --quiet. See npm run check -- --help"],
  ["check", ["now"], "check: expected no further words, received now. See npm run check -- --help"],
  [
    "build",
    ["--asof=2027-03-15"],
    "build: there is no option --asof; did you mean --as-of? See npm run build -- --help",
  ],
  ["build", ["site"], "build: expected no further words, received site. See npm run build -- --help"],
  ["issue", [], "issue: expected one <project>/<phase>. See npm run issue -- --help"],
  ["issue", ["a/b", "c/d"], "issue: expected one <project>/<phase>. See npm run issue -- --help"],
  ["issue", ["--number=3"], "issue: there is no option --number. See npm run issue -- --help"],
  ["explain", ["saltpan-quay"], "explain: expected <project>/<phase> and a figure key. See npm run explain -- --help"],
  ["explain", ["a/b/c"], "explain: expected <project>/<phase> and a figure key. See npm run explain -- --help"],
  ["explain", ["--jsn"], "explain: there is no option --jsn; did you mean --json? See npm run explain -- --help"],
  ["bench", ["now"], "bench: expected no further words, received now. See npm run bench -- --help"],
  ["pictures", ["--wdth"], "pictures: there is no option --wdth. See npm run pictures -- --help"],
  ["types", ["now"], "types: expected no further words. See npm run types -- --help"],
  ["calc", ["--jsno"], "calc: there is no option --jsno; did you mean --json?"],
];

describe("a command line that cannot be read", () => {
  test.each(WRONG)("%s %j", async (name, args, says) => {
    expect(await runInside(name, ...args)).toEqual({ code: 1, out: "", err: `${says}\n` });
  });

  test("without the value of an option", async () => {
    const { code, out, err } = await runInside("check", "--content");
    expect([code, out]).toEqual([1, ""]);
    expect(err).toMatch(/^check: .*--content.* See npm run check -- --help\n$/);
  });

  test("ends a process with status 1 and nothing on standard output", async () => {
    expect(await runCommand(["check", "--contnet", "x"])).toEqual({ code: 1, out: "", err: `${WRONG[0]?.[2]}\n` });
  });
});
