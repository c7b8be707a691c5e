import type { BulgeVertex } from "./partModel";

/** The same closed path run the other way round. */
export function reversedPath(vertices: readonly BulgeVertex[]): readonly BulgeVertex[] {
  const n = vertices.length;
  return vertices.map((_, j): BulgeVertex => {
    const [x, y] = vertices[n - 1 - j] ?? [0, 0];
    return [x, y, -(vertices[(2 * n - 2 - j) % n]?.[2] ?? 0)];
  });
}
