/** The widest gap that a half-plane of a piece (nx, ny, c each, lifted by `lift`) leaves to points (x, y, z each); below 0 when none parts them. */
export function planeGap(points: Float64Array, planes: Float64Array, lift: number): number {
  let widest = -Infinity;
  for (let p = 0; p < planes.length; p += 3) {
    const nx = planes[p] as number;
    const ny = planes[p + 1] as number;
    const c = (planes[p + 2] as number) + ny * lift;
    let least = Infinity;
    for (let i = 0; i < points.length; i += 3) {
      const off = nx * (points[i] as number) + ny * (points[i + 1] as number) - c;
      if (off < least) least = off;
    }
    if (least > widest) widest = least;
  }
  return widest;
}
