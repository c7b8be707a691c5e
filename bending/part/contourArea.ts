import type { FlatContour } from "./partModel";

/** Area that a contour encloses, mm²: positive when it runs counter-clockwise (a circle always). */
export function contourArea(contour: FlatContour): number {
  if (contour.kind === "circle") return Math.PI * contour.radius ** 2;
  const { vertices } = contour;
  const [x0, y0] = vertices[0] ?? [0, 0];
  return vertices.reduce((sum, [x, y, bulge], i) => {
    const [u, v] = vertices[(i + 1) % vertices.length] ?? [x, y];
    return sum + ((x - x0) * (v - y0) - (u - x0) * (y - y0)) / 2 + segmentArea(Math.hypot(u - x, v - y), bulge);
  }, 0);
}

/** Between chord and arc; the arc turns through 4 atan(bulge). */
function segmentArea(chord: number, bulge: number): number {
  if (bulge === 0 || chord === 0) return 0;
  const sweep = 4 * Math.atan(bulge);
  const radius = chord / (2 * Math.sin(sweep / 2));
  return (radius * radius * (sweep - Math.sin(sweep))) / 2;
}
