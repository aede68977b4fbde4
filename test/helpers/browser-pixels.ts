import type { Canvas } from "@napi-rs/canvas";
import { createCanvas, loadImage } from "@napi-rs/canvas";

export type Rgb = readonly [red: number, green: number, blue: number];

/** A picture whose pixels can be asked for. */
export interface Pixels {
  readonly width: number;
  readonly height: number;
  readonly at: (x: number, y: number) => Rgb;
}

/** Pixels of a canvas. */
export function pixelsOf(canvas: Canvas): Pixels {
  const { width, height } = canvas;
  const { data } = canvas.getContext("2d").getImageData(0, 0, width, height);
  return {
    width,
    height,
    at: (x, y) => {
      const start = 4 * (y * width + x);
      return [data[start] ?? 0, data[start + 1] ?? 0, data[start + 2] ?? 0];
    },
  };
}

/** Pixels of a PNG. */
export async function pixelsOfPng(png: Uint8Array): Promise<Pixels> {
  const image = await loadImage(png);
  const canvas = createCanvas(image.width, image.height);
  canvas.getContext("2d").drawImage(image, 0, 0);
  return pixelsOf(canvas);
}

/** Share of the pixels inside a region that meet a test, 0 to 1. */
export function pixelShare(
  { width, height, at }: Pixels,
  meets: (colour: Rgb) => boolean,
  isInside: (x: number, y: number) => boolean = () => true,
): number {
  let inside = 0;
  let met = 0;
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      if (!isInside(x, y)) continue;
      inside++;
      if (meets(at(x, y))) met++;
    }
  }
  return met / inside;
}

/** Whether a colour is a blue such as mandatory signs have, whatever its exact value. */
export function isSignBlue([red, green, blue]: Rgb): boolean {
  return blue > 100 && blue > 1.5 * green && blue > 2 * red;
}
