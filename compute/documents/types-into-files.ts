const HEADER = "// Made from schema/ by `npm run types`. Do not edit.\n";

/** Splits the text into its exported blocks and puts each into the file of its schema, with the imports it needs. */
export function typesIntoFiles(
  text: string,
  owner: ReadonlyMap<string, string>,
  files: readonly string[],
): ReadonlyMap<string, string> {
  const blocks = new Map<string, { name: string; text: string }[]>(files.map((file) => [file, []]));
  const pattern =
    /(?:\/\*\*(?:[^*]|\*(?!\/))*\*\/\n)?export (?:interface|type) (\w+)[\s\S]*?(?=\n(?:\/\*\*|export )|\s*$(?![\s\S]))/g;
  for (const [block, name = ""] of text.matchAll(pattern)) {
    const file = owner.get(name);
    if (file) blocks.get(file)?.push({ name, text: tidy(block) });
    else if (name !== "AllDocuments")
      throw new Error(`the type ${name} belongs to no schema; give the shape a definition of its own`);
  }
  return new Map(files.map((file) => [file, fileText(file, blocks.get(file) ?? [], owner)]));
}

function tidy(block: string): string {
  return block.replace(/ \*\n \* This interface was referenced by [\s\S]*?(?= \*\/)/g, "").trimEnd();
}

function fileText(
  file: string,
  blocks: readonly { name: string; text: string }[],
  owner: ReadonlyMap<string, string>,
): string {
  const code = blocks.map((block) => block.text).join("\n");
  const words = new Set(code.replace(/\/\*\*[\s\S]*?\*\//g, "").match(/\b[A-Z]\w*\b/g) ?? []);
  const wanted = new Map<string, string[]>();
  for (const word of [...words].sort()) {
    const from = owner.get(word);
    if (from && from !== file) wanted.set(from, [...(wanted.get(from) ?? []), word]);
  }
  const imports = [...wanted]
    .sort(([a], [b]) => (a < b ? -1 : 1))
    .map(([from, names]) => `import type { ${names.join(", ")} } from "./${from}.gen.ts";\n`);
  return `${HEADER}${imports.join("")}\n${code}\n`;
}
