import MarkdownIt from "markdown-it";

const reader = new MarkdownIt({ html: false, linkify: false, typographer: false });

/** Prose of content/method/ as HTML; HTML in it is shown as text. */
export function markdown(text: string): string {
  return reader.render(text);
}
