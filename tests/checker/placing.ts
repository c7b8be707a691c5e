/** A rigid placing in space: three rows of four numbers; x' = m[0] x + m[1] y + m[2] z + m[3], and so on. */
export type Placing = readonly number[];
export type Point = readonly [number, number, number];

export const UNMOVED: Placing = [1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0];

const at = (m: Placing, i: number): number => m[i] ?? 0;

export function move(m: Placing, [x, y, z]: Point): Point {
  return [
    at(m, 0) * x + at(m, 1) * y + at(m, 2) * z + at(m, 3),
    at(m, 4) * x + at(m, 5) * y + at(m, 6) * z + at(m, 7),
    at(m, 8) * x + at(m, 9) * y + at(m, 10) * z + at(m, 11),
  ];
}

/** First `second`, then `first`. */
export function after(first: Placing, second: Placing): Placing {
  const out: number[] = [];
  for (let row = 0; row < 12; row += 4) {
    for (let column = 0; column < 4; column++) {
      let sum = column === 3 ? at(first, row + 3) : 0;
      for (let k = 0; k < 3; k++) sum += at(first, row + k) * at(second, 4 * k + column);
      out.push(sum);
    }
  }
  return out;
}
