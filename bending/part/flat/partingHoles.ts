import { SAME_POINT_MM } from "../../core/tolerance";
import { polygonBounds } from "../../geometry/polygonBounds";
import type { Vec2 } from "../../geometry/vec2";
import { onEdge, type EdgeAxes } from "../edgeCut";
import { materialChords } from "./materialChords";

/**
 * Which holes part faces: those at which a bend line ends, as the cuts beside a tab do. A hole that a bend line runs over
 * from one side to the other parts nothing; it lies across the bend.
 */
export function partingHoles(outline: readonly Vec2[], holes: readonly (readonly Vec2[])[], lines: readonly EdgeAxes[]): readonly number[] {
  const found = new Set<number>();
  const rounds = holes.map((hole) => {
    const { min, max } = polygonBounds(hole);
    return { middle: [(min[0] + max[0]) / 2, (min[1] + max[1]) / 2] as const, radius: Math.hypot(max[0] - min[0], max[1] - min[1]) / 2 };
  });
  for (const axes of lines) {
    const met = rounds.flatMap(({ middle, radius }, i) => (Math.abs(onEdge(axes, middle)[1]) < radius && straddles(holes[i] ?? [], axes) ? [i] : []));
    if (met.length === 0) continue;
    const rings = [outline, ...met.map((i) => [...(holes[i] ?? [])].reverse())];
    const chords = materialChords(rings, axes).filter(({ from, to }) => Math.min(to, axes.length) - Math.max(from, 0) > (to - from) / 2);
    const [first, last] = [chords[0], chords[chords.length - 1]];
    for (const ring of [first?.start.ring, last?.end.ring]) {
      const hole = ring === undefined || ring === 0 ? undefined : met[ring - 1];
      if (hole !== undefined) found.add(hole);
    }
  }
  return [...found].sort((a, b) => a - b);
}

function straddles(hole: readonly Vec2[], axes: EdgeAxes): boolean {
  const heights = hole.map((p) => onEdge(axes, p)[1]);
  return Math.min(...heights) < -SAME_POINT_MM && Math.max(...heights) > SAME_POINT_MM;
}
