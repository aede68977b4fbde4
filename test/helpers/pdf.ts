import type { Canvas } from "@napi-rs/canvas";
import { createCanvas } from "@napi-rs/canvas";
import { getDocument } from "pdfjs-dist/legacy/build/pdf.mjs";

/** What a printed page is held against. */
export interface PrintedPdf {
  readonly isTagged: boolean;
  /** Sizes of the pages in points, 1/72 inch. */
  readonly sizesPt: readonly (readonly [width: number, height: number])[];
  /** Text of each page, white space drawn together. */
  readonly texts: readonly string[];
  /** Draws the first page at 72 dots per inch times a scale. */
  readonly firstPage: (scale: number) => Promise<Canvas>;
}

/** Reads a PDF. */
export async function readPdf(bytes: Uint8Array): Promise<PrintedPdf> {
  const pdf = await getDocument({ data: new Uint8Array(bytes), verbosity: 0 }).promise;
  const pages = await Promise.all(Array.from({ length: pdf.numPages }, (_, index) => pdf.getPage(index + 1)));
  const texts = await Promise.all(
    pages.map(async (page) => {
      const { items } = await page.getTextContent();
      return items.map((item) => ("str" in item ? `${item.str}${item.hasEOL ? " " : ""}` : "")).join("");
    }),
  );
  const [first] = pages;
  if (!first) throw new Error("the PDF has no page");
  return {
    isTagged: ((await pdf.getMarkInfo()) as { Marked?: boolean } | null)?.Marked === true,
    sizesPt: pages.map(({ view: [left = 0, bottom = 0, right = 0, top = 0] }) => [right - left, top - bottom]),
    texts: texts.map((text) => text.replace(/\s+/g, " ")),
    firstPage: async (scale) => {
      const viewport = first.getViewport({ scale });
      const canvas = createCanvas(Math.ceil(viewport.width), Math.ceil(viewport.height));
      await first.render({ canvas: canvas as unknown as HTMLCanvasElement, viewport }).promise;
      return canvas;
    },
  };
}
