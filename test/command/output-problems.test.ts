import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { expect, onTestFinished, test } from "vitest";
import { outputProblems } from "../../compute/command/output-problems.ts";

function problemsOf(files: Readonly<Record<string, string>>): readonly string[] {
  const folder = mkdtempSync(path.join(tmpdir(), "output-"));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  for (const [file, text] of Object.entries(files)) {
    mkdirSync(path.dirname(path.join(folder, file)), { recursive: true });
    writeFileSync(path.join(folder, file), text);
  }
  return outputProblems(folder);
}

const GOOD = {
  "index.html":
    '<h1 id="top">Home</h1><a href="a/index.html#level/LAeq/x">A</a> <a href="#top">up</a> <a href="tel:+44">call</a>',
  "a/index.html": '<p id="level/LAeq/x">64.5</p><a href="../index.html">home</a><img src="../icon.svg">',
  "icon.svg": "<svg/>",
};

test("a whole site has no problem", () => {
  expect(problemsOf(GOOD)).toEqual([]);
});

/** What is added to the page, and what is found. */
const PROBLEMS: readonly (readonly [html: string, found: readonly string[]])[] = [
  ['<a href="b/index.html">B</a>', ['expected a link to a file of the site, received "b/index.html"']],
  ['<img src="no.svg">', ['expected a link to a file of the site, received "no.svg"']],
  [
    '<a href="../index.html#nowhere">B</a>',
    ['expected a link to a place on index.html, received "../index.html#nowhere"'],
  ],
  ['<a href="#nowhere">B</a>', ['expected a link to a place on a/index.html, received "#nowhere"']],
  ['<a href="./">B</a>', ['expected a link to a file of the site, received "./"']],
  ['<b id="level/LAeq/x"></b>', ['expected every id once, received "level/LAeq/x" twice']],
  ["<p>Level undefined dB</p>", ['expected text, received "undefined"']],
  ["<p>NaN dB</p>", ['expected text, received "NaN"']],
  ["<p>[object Object]</p>", ['expected text, received "[object Object]"']],
  ["<p>about {level} dB</p>", ['expected text, received "{level}"']],
  ['<span style="color:#cc0000">x</span>', ["expected a typeset equation, received one in red"]],
  // The TeX behind an equation is braces all over, and read by nobody.
  ["<annotation>L_{p}</annotation>", []],
];

test.each(PROBLEMS)("%s", (html, found) => {
  const page = `${GOOD["a/index.html"]}${html}`;
  expect(problemsOf({ ...GOOD, "a/index.html": page })).toEqual(found.map((each) => `a/index.html: ${each}`));
});
