import type { Vec2 } from "./vec2";

/** The part of a convex polygon where (p - point) . inward >= 0. */
export function clipByHalfPlane(convex: readonly Vec2[], point: Vec2, inward: Vec2): readonly Vec2[] {
  const kept: Vec2[] = [];
  const height = (p: Vec2) => (p[0] - point[0]) * inward[0] + (p[1] - point[1]) * inward[1];
  convex.forEach((p, i) => {
    const q = convex[(i + 1) % convex.length] ?? p;
    const [hp, hq] = [height(p), height(q)];
    if (hp >= 0) kept.push(p);
    if ((hp > 0 && hq < 0) || (hp < 0 && hq > 0)) {
      const t = hp / (hp - hq);
      kept.push([p[0] + t * (q[0] - p[0]), p[1] + t * (q[1] - p[1])]);
    }
  });
  return kept;
}
