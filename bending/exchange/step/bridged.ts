import type { FlatLoop } from "./flattenLoop";
import type { OutlineVertex } from "./recognisedPart";

/** An outline whose edges along a bend are one edge, and what was cut out between them: from the end of one to the start of the next. */
export interface Bridged {
  readonly outline: FlatLoop;
  readonly cutOuts: readonly (readonly OutlineVertex[])[];
}

/** Draws the edges on one line through as one; `edges` are the solid's. The first of them in counter-clockwise order stays. */
export function bridged(outline: FlatLoop, edges: readonly number[]): Bridged {
  const places = outline.edges.flatMap((edge, i) => (edges.includes(edge) ? [i] : []));
  const [one] = places;
  const [from, to] = [outline.vertices[one ?? -1], outline.vertices[((one ?? 0) + 1) % outline.vertices.length]];
  if (places.length < 2 || !from || !to) return { outline, cutOuts: [] };
  const along = ([x, y]: OutlineVertex) => x * (to[0] - from[0]) + y * (to[1] - from[1]);
  const ordered = [...places].sort((a, b) => along(outline.vertices[a] ?? from) - along(outline.vertices[b] ?? from));
  const n = outline.vertices.length;
  const dropped = new Set<number>();
  const cutOuts = ordered.slice(1).map((next, k) => {
    const path: OutlineVertex[] = [];
    for (let i = ((ordered[k] ?? 0) + 1) % n; ; i = (i + 1) % n) {
      const [x, y, bulge] = outline.vertices[i] ?? [0, 0, 0];
      path.push(i === next ? [x, y, 0] : [x, y, bulge]);
      dropped.add(i);
      if (i === next || path.length > n) return path;
    }
  });
  const kept = outline.vertices.flatMap((_, i) => (dropped.has(i) ? [] : [i]));
  return { outline: { ...outline, vertices: kept.map((i) => outline.vertices[i] ?? from), edges: kept.map((i) => outline.edges[i] ?? -1) }, cutOuts };
}
