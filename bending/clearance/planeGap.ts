import type { Bounds } from "./half";

/** The widest gap that a half-plane of a piece (nx, ny, c each, lifted by `lift`) leaves to a posed box of a wing (as in `boxGap`); below 0 when none parts them. */
export function planeGap(poses: Float64Array, at: number, { a, b }: Pick<Bounds, "a" | "b">, planes: Float64Array, lift: number): number {
  const sin = poses[at] as number;
  const cos = poses[at + 1] as number;
  const x = poses[at + 2] as number;
  const y = (poses[at + 3] as number) - lift;
  let widest = -Infinity;
  for (let p = 0; p < planes.length; p += 3) {
    const nx = planes[p] as number;
    const ny = planes[p + 1] as number;
    const alongA = nx * cos + ny * sin;
    const alongB = ny * cos - nx * sin;
    const least = nx * x + ny * y - (planes[p + 2] as number) + alongA * (alongA >= 0 ? a[0] : a[1]) + alongB * (alongB >= 0 ? b[0] : b[1]);
    if (least > widest) widest = least;
  }
  return widest;
}
