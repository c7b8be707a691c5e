import { ARC_CHORD_MM } from "../core/tolerance";
import { arcToChords } from "../geometry/arcToChords";
import type { Vec2 } from "../geometry/vec2";
import type { DocumentVertex } from "./partDocument";

export interface ChordOutline {
  readonly points: readonly Vec2[];
  /** For each point, which drawn edge the chord that starts there belongs to. */
  readonly edgeOf: readonly number[];
  /** For each drawn edge, the point where it starts. */
  readonly firstPoint: readonly number[];
  /** For each drawn edge, whether it is an arc. */
  readonly curved: readonly boolean[];
}

/** A drawn outline (mm) with its bulged edges as chords. */
export function outlineAsChords(outline: readonly DocumentVertex[], tolerance = ARC_CHORD_MM): ChordOutline {
  const points: Vec2[] = [];
  const edgeOf: number[] = [];
  const firstPoint: number[] = [];
  const curved: boolean[] = [];
  outline.forEach((vertex, edge) => {
    const next = outline[(edge + 1) % outline.length] ?? vertex;
    const from: Vec2 = [vertex[0], vertex[1]];
    const chords = arcToChords(from, [next[0], next[1]], vertex[2] ?? 0, tolerance);
    firstPoint.push(points.length);
    curved.push(chords.length > 1);
    points.push(from, ...chords.slice(0, -1));
    for (let i = 0; i < chords.length; i++) edgeOf.push(edge);
  });
  return { points, edgeOf, firstPoint, curved };
}
