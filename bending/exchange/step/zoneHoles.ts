import type { Vec2 } from "../../geometry/vec2";
import type { FlatLoop } from "./flattenLoop";
import { plateHoles } from "./plateHoles";
import type { BendWindow } from "./recognisedPart";

/**
 * Holes that lie wholly inside a bend, as the loops of its two round faces show them; `arc` (mm) is about how long the bend is across.
 * `widened` of them are wider on one side; `blind` are on one side only.
 */
export function zoneHoles(top: readonly (readonly Vec2[])[], under: readonly (readonly Vec2[])[], arc: number): { readonly windows: readonly BendWindow[]; readonly widened: number; readonly blind: number } {
  const asLoop = (points: readonly Vec2[]): FlatLoop => ({ vertices: points.map(([along, turn]) => [along, turn * arc, 0]), edges: [], chords: false });
  const { outlines, widened } = plateHoles(top.map(asLoop), under.map(asLoop));
  return {
    windows: outlines.map((outline) => ({ pieces: [{ on: "bend", path: outline.map(([along, across]): Vec2 => [along, across / arc]) }] })),
    widened,
    blind: top.length - outlines.length + under.length - outlines.length,
  };
}
