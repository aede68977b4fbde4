/** Pages of a PDF that are drawn, and how finely: 144 dots per inch. */
const MOST_PAGES = 2;
const SCALE = 2;

/**
 * The first pages of a PDF as PNG pictures. Needs the development packages.
 *
 * @param pdf  bytes of the file
 */
export async function pdfPictures(pdf: Uint8Array): Promise<readonly Buffer[]> {
  const { createCanvas } = await import("@napi-rs/canvas");
  const { getDocument } = await import("pdfjs-dist/legacy/build/pdf.mjs");
  const document = await getDocument({ data: new Uint8Array(pdf), verbosity: 0 }).promise;
  const pictures: Buffer[] = [];
  for (let number = 1; number <= Math.min(MOST_PAGES, document.numPages); number++) {
    const page = await document.getPage(number);
    const viewport = page.getViewport({ scale: SCALE });
    const canvas = createCanvas(Math.ceil(viewport.width), Math.ceil(viewport.height));
    await page.render({ canvas: canvas as unknown as HTMLCanvasElement, viewport }).promise;
    pictures.push(canvas.toBuffer("image/png"));
  }
  return pictures;
}
