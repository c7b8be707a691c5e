import earcut from "earcut";

export type Ring = readonly (readonly [number, number])[];

const turnAt = (a: readonly [number, number], b: readonly [number, number], c: readonly [number, number]) => (b[0] - a[0]) * (c[1] - b[1]) - (b[1] - a[1]) * (c[0] - b[0]);

export const areaOf = (ring: Ring): number => ring.reduce((sum, [x, y], i) => {
  const [u, v] = ring[(i + 1) % ring.length] ?? [x, y];
  return sum + (x * v - u * y) / 2;
}, 0);

const isConvex = (ring: Ring): boolean => {
  let turned = 0;
  for (let i = 0; i < ring.length; i++) {
    const [a, b, c] = [0, 1, 2].map((k) => ring[(i + k) % ring.length] as readonly [number, number]) as [Ring[number], Ring[number], Ring[number]];
    const turn = turnAt(a, b, c);
    if (turn < -1e-9) return false;
    turned += Math.atan2(turn, (b[0] - a[0]) * (c[0] - b[0]) + (b[1] - a[1]) * (c[1] - b[1]));
  }
  return turned < 2 * Math.PI + 1e-6;
};

/** Is one ring, without holes, convex and counter-clockwise? */
export const isWhole = (ring: Ring, holes: readonly Ring[]): boolean => holes.length === 0 && areaOf(ring) > 0 && isConvex(ring);

/** A region cut into triangles, and neighbours joined again as long as the sum is convex. */
export function convexParts(ring: Ring, holes: readonly Ring[] = []): readonly Ring[] {
  if (isWhole(ring, holes)) return [ring];
  const points = [...ring, ...holes.flat()];
  const starts = holes.map((_, i) => ring.length + holes.slice(0, i).reduce((sum, hole) => sum + hole.length, 0));
  const corners = earcut(points.flatMap(([x, y]) => [x, y]), starts.length > 0 ? starts : null, 2);
  const parts: number[][] = [];
  for (let i = 0; i < corners.length; i += 3) {
    const triangle = corners.slice(i, i + 3);
    const area = areaOf(triangle.map((k) => points[k] ?? [0, 0]));
    if (Math.abs(area) > 1e-7) parts.push(area > 0 ? triangle : triangle.reverse());
  }
  for (let i = 0; i < parts.length; i++) {
    for (let j = i + 1; j < parts.length; j++) {
      const sum = joined(parts[i] ?? [], parts[j] ?? [], points);
      if (!sum) continue;
      parts[i] = sum;
      parts.splice(j, 1);
      j = i;
    }
  }
  return parts.map((part) => part.map((k) => points[k] ?? [0, 0]));
}

function joined(a: readonly number[], b: readonly number[], points: Ring): number[] | null {
  for (let i = 0; i < a.length; i++) {
    const [from, to] = [a[i], a[(i + 1) % a.length]];
    const j = b.findIndex((k, n) => k === to && b[(n + 1) % b.length] === from);
    if (j < 0) continue;
    const sum = [...a.slice(i + 1), ...a.slice(0, i + 1), ...[...b.slice(j), ...b.slice(0, j)].slice(2)];
    return isConvex(sum.map((k) => points[k] ?? [0, 0])) ? sum : null;
  }
  return null;
}

/** Convex hull (Andrew's chain), counter-clockwise. */
export function hullOf(points: Ring): Ring {
  const sorted = [...points].sort((p, q) => p[0] - q[0] || p[1] - q[1]);
  const half = (list: Ring): (readonly [number, number])[] => {
    const chain: (readonly [number, number])[] = [];
    for (const p of list) {
      while (chain.length > 1 && turnAt(chain[chain.length - 2] ?? p, chain[chain.length - 1] ?? p, p) <= 1e-12) chain.pop();
      chain.push(p);
    }
    return chain.slice(0, -1);
  };
  return [...half(sorted), ...half([...sorted].reverse())];
}
