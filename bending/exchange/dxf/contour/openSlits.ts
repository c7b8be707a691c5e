import { DRAWN_POINT_MM, DRAWN_SLIT_MM } from "../../../core/tolerance";
import type { Vec2 } from "../../../geometry/vec2";
import type { Repair } from "./piece";
import { placeText } from "./placeText";

type Vertex = readonly [number, number, number];

/**
 * Cuts without width (the contour runs in and straight back over itself, as beside a bend without a relief) are given one: both
 * passes move half the width to their own left, where the sheet is in a contour that runs counter-clockwise.
 */
export function openSlits(vertices: readonly Vertex[]): { readonly vertices: readonly Vertex[]; readonly repairs: readonly Repair[] } {
  const repairs: Repair[] = [];
  const n = vertices.length;
  const at = (i: number): Vertex => vertices[((i % n) + n) % n] ?? [0, 0, 0];
  const moves = new Map<number, Vec2>();
  const tips = new Map<number, readonly [Vertex, Vertex]>();
  vertices.forEach((tip, i) => {
    const [p, r] = [at(i - 1), at(i + 1)];
    if (p[2] !== 0 || tip[2] !== 0 || n < 4) return;
    const [inLength, outLength] = [Math.hypot(tip[0] - p[0], tip[1] - p[1]), Math.hypot(r[0] - tip[0], r[1] - tip[1])];
    if (inLength <= DRAWN_SLIT_MM || outLength <= DRAWN_SLIT_MM) return;
    const u: Vec2 = [(tip[0] - p[0]) / inLength, (tip[1] - p[1]) / inLength];
    const back = u[0] * (r[0] - tip[0]) + u[1] * (r[1] - tip[1]);
    const off = u[0] * (r[1] - tip[1]) - u[1] * (r[0] - tip[0]);
    if (back >= 0 || Math.abs(off) > 2 * DRAWN_POINT_MM) return;
    const half: Vec2 = [(-u[1] * DRAWN_SLIT_MM) / 2, (u[0] * DRAWN_SLIT_MM) / 2];
    tips.set(i, [[tip[0] + half[0], tip[1] + half[1], 0], [tip[0] - half[0], tip[1] - half[1], 0]]);
    // Where the sides go on beyond the mouth of the slit they stay where they are.
    moves.set(((i - 1) % n + n) % n, half);
    moves.set((i + 1) % n, [-half[0], -half[1]]);
    repairs.push({ kind: "slit", at: [tip[0], tip[1]], message: `a cut without width that ends at ${placeText([tip[0], tip[1]])} was opened to ${DRAWN_SLIT_MM} mm` });
  });
  if (tips.size === 0) return { vertices, repairs };
  const opened = vertices.flatMap((vertex, i): readonly Vertex[] => {
    const tip = tips.get(i);
    const move = moves.get(i);
    return tip ? tip : move ? [[vertex[0] + move[0], vertex[1] + move[1], vertex[2]]] : [vertex];
  });
  return { vertices: opened, repairs };
}
