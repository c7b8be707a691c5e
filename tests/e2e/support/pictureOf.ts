import type { Locator } from "@playwright/test";

export interface Picture {
  /** How many different colours. */
  readonly colours: number;
  /** Share of the commonest colour, 0 to 1. */
  readonly ground: number;
  /** Sum of the colours' parts in each square of 8 by 8 pixels. */
  readonly squares: readonly number[];
}

/** What stands over the drawing at its upper edge: words, which are not to count. */
const WORDS = 90;

/** A screenshot of a canvas as it stands on the screen, decoded; without the words at its upper edge. */
export async function pictureOf(canvas: Locator): Promise<Picture> {
  const png = (await canvas.screenshot()).toString("base64");
  return canvas.evaluate(async (_, given) => {
    const bytes = Uint8Array.from(atob(given.png), (letter) => letter.charCodeAt(0));
    const bitmap = await createImageBitmap(new Blob([bytes], { type: "image/png" }));
    const context = new OffscreenCanvas(bitmap.width, bitmap.height).getContext("2d");
    if (!context) throw new Error("no 2D canvas to decode a picture with");
    context.drawImage(bitmap, 0, 0);
    const { data, width } = context.getImageData(0, given.top, bitmap.width, bitmap.height - given.top);
    const across = Math.ceil(width / 8);
    const squares: number[] = [];
    const counts = new Map<number, number>();
    for (let at = 0; at < data.length; at += 4) {
      const [red = 0, green = 0, blue = 0] = data.subarray(at, at + 3);
      const colour = (red << 16) | (green << 8) | blue;
      counts.set(colour, (counts.get(colour) ?? 0) + 1);
      const pixel = at / 4;
      const square = Math.floor(pixel / width / 8) * across + Math.floor((pixel % width) / 8);
      squares[square] = (squares[square] ?? 0) + red + green + blue;
    }
    return { colours: counts.size, ground: (4 * Math.max(...counts.values())) / data.length, squares };
  }, { png, top: WORDS });
}
