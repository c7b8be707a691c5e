import type { Vec2 } from "@/bending/geometry/vec2";
import type { Vec3 } from "@/bending/geometry/vec3";
import type { SheetPrism } from "./bendPrisms";
import { convexHull } from "@/bending/geometry/convexHull";

/** The polygon (x, y) in which the plane z = `at` cuts a prism; empty when it misses. */
export function prismSection(prism: SheetPrism, at: number): readonly Vec2[] {
  const points: Vec2[] = [];
  const cut = (from: Vec3, to: Vec3): void => {
    const [below, above] = [from[2] - at, to[2] - at];
    if (below < 0 === above < 0) return;
    const share = below / (below - above);
    points.push([from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share]);
  };
  const count = prism.lower.length;
  for (let i = 0; i < count; i++) {
    const [lower, upper] = [prism.lower[i], prism.upper[i]];
    const [nextLower, nextUpper] = [prism.lower[(i + 1) % count], prism.upper[(i + 1) % count]];
    if (!lower || !upper || !nextLower || !nextUpper) continue;
    cut(lower, nextLower);
    cut(upper, nextUpper);
    cut(lower, upper);
  }
  return points.length < 3 ? [] : convexHull(points);
}
