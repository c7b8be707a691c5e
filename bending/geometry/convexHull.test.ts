import fc from "fast-check";
import { expect, it } from "vitest";
import { convexHull } from "./convexHull";

const point = fc.tuple(fc.integer({ min: -20, max: 20 }), fc.integer({ min: -20, max: 20 }));

it("holds every point, and turns left at every corner", () => {
  fc.assert(fc.property(fc.array(point, { minLength: 3, maxLength: 30 }), (points) => {
    const hull = convexHull(points);
    if (hull.length < 3) return;
    hull.forEach((a, i) => {
      const b = hull[(i + 1) % hull.length] ?? a;
      for (const [x, y] of points) expect((b[0] - a[0]) * (y - a[1]) - (b[1] - a[1]) * (x - a[0])).toBeGreaterThanOrEqual(-1e-6);
    });
  }));
});
