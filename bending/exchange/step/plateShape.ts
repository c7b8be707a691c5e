import { SOLID_MATCH_MM } from "../../core/tolerance";
import type { Frame } from "../../geometry/frame";
import { flattenLoop, type FlatLoop } from "./flattenLoop";
import { outlineArea } from "./outlineArea";
import type { Solid } from "./solid";

/** A plate's plane seen from one of its sides: the outer loop counter-clockwise, and the loops of its holes. */
export interface PlateShape {
  readonly outline: FlatLoop;
  readonly holes: readonly FlatLoop[];
}

/** Null when the face has no outer loop. */
export function plateShape(solid: Solid, face: number, frame: Frame): PlateShape | null {
  const loops = (solid.faces[face]?.loops ?? []).map((loop) => flattenLoop(solid, loop, frame)).filter(({ vertices }) => vertices.length > 1);
  const areas = loops.map(({ vertices }) => outlineArea(vertices));
  const most = areas.reduce((best, area, i) => (Math.abs(area) > Math.abs(areas[best] ?? 0) ? i : best), 0);
  const outline = loops[most];
  if (!outline || Math.abs(areas[most] ?? 0) <= SOLID_MATCH_MM ** 2) return null;
  return { outline: (areas[most] ?? 0) > 0 ? outline : turnedRound(outline), holes: loops.filter((_, i) => i !== most) };
}

/** The same loop the other way round. */
function turnedRound({ vertices, edges, chords }: FlatLoop): FlatLoop {
  const n = vertices.length;
  const from = (i: number) => (n - i) % n;
  return {
    vertices: vertices.map((_, i) => [vertices[from(i)]?.[0] ?? 0, vertices[from(i)]?.[1] ?? 0, -(vertices[from(i + 1)]?.[2] ?? 0)]),
    edges: edges.map((_, i) => edges[from(i + 1)] ?? -1),
    chords,
  };
}
