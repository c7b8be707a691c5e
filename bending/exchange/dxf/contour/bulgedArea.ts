/** Signed area of a closed contour of [x, y, bulge]: the polygon and the segments of its arcs, exact. */
export function bulgedArea(vertices: readonly (readonly [number, number, number])[]): number {
  let area = 0;
  vertices.forEach(([x, y, bulge], i) => {
    const next = vertices[(i + 1) % vertices.length];
    if (!next) return;
    area += (x * next[1] - next[0] * y) / 2;
    if (bulge !== 0) {
      const half = 2 * Math.atan(Math.abs(bulge));
      const radius = Math.hypot(next[0] - x, next[1] - y) / (2 * Math.sin(half));
      // Segment of a circle: r² (angle - sin angle) / 2.
      area += (Math.sign(bulge) * radius * radius * (2 * half - Math.sin(2 * half))) / 2;
    }
  });
  return area;
}
