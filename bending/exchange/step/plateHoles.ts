import { SOLID_MATCH_MM } from "../../core/tolerance";
import { polygonBounds } from "../../geometry/polygonBounds";
import type { Vec2 } from "../../geometry/vec2";
import type { FlatLoop } from "./flattenLoop";
import { outlineArea } from "./outlineArea";
import type { OutlineVertex } from "./recognisedPart";

export interface PlateHoles {
  readonly outlines: readonly (readonly OutlineVertex[])[];
  /** Through holes that are wider on one side, taken at the narrower: how many. */
  readonly widened: number;
}

/** The holes that go through: on both sides of a plate at one place. What is on one side only is no hole. */
export function plateHoles(top: readonly FlatLoop[], bottom: readonly FlatLoop[]): PlateHoles {
  const free = [...bottom];
  let widened = 0;
  const outlines = top.flatMap((loop): readonly (readonly OutlineVertex[])[] => {
    const place = middleOf(loop);
    const size = Math.abs(outlineArea(loop.vertices));
    const match = free.findIndex((candidate) => {
      const [x, y] = middleOf(candidate);
      return Math.hypot(x - place[0], y - place[1]) <= Math.max(SOLID_MATCH_MM, OFF_CENTRE * Math.sqrt(size));
    });
    const [opposite] = match < 0 ? [] : free.splice(match, 1);
    if (!opposite) return [];
    const other = Math.abs(outlineArea(opposite.vertices));
    if (Math.abs(other - size) > SOLID_MATCH_MM * Math.sqrt(size) * 4) widened += 1;
    return [other < size ? opposite.vertices : loop.vertices];
  });
  return { outlines, widened };
}

/** A hole's two rims may be off centre by this part of its size. */
const OFF_CENTRE = 0.1;

function middleOf({ vertices }: FlatLoop): Vec2 {
  const { min, max } = polygonBounds(vertices.map(([x, y]): Vec2 => [x, y]));
  return [(min[0] + max[0]) / 2, (min[1] + max[1]) / 2];
}
