/** A page that its template cannot print: a word or a key is missing. The site engine's own report is a page of traces. */
export class RenderError extends Error {
  override readonly name = "RenderError";

  /** @param cause  what the site engine threw */
  constructor(cause: unknown) {
    super(
      `${deepest(cause)}. Write the word in content/wording if it is one (w, common), else mend the template or its model.`,
      { cause },
    );
  }
}

/** The innermost message: the engine wraps the template's error, which quotes the model's as its last line. */
function deepest(error: unknown): string {
  const { originalError, message } = error as { readonly originalError?: unknown; readonly message?: string };
  if (originalError) return deepest(originalError);
  const lines = (message ?? String(error)).split("\n").map((line) => line.trim());
  return (lines.findLast((line) => line.startsWith("Error: ")) ?? lines[0] ?? "").replace(/^Error: /, "");
}
