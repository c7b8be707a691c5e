import { invariant } from "../core/invariant";
import type { Frame } from "../geometry/frame";
import { invertFrame } from "../geometry/invertFrame";
import type { Vec3 } from "../geometry/vec3";
import { bendFacets, type BendFacet } from "../part/bendFacets";
import { bendFrame } from "../part/bendFrame";
import type { PartModel } from "../part/partModel";
import { facetCount } from "./facetCount";

/** A bend, flat or formed. */
export interface BendShape {
  /** Moves the child, and the way back: see `bendFrame`. */
  readonly step: Frame;
  readonly back: Frame;
  /** Its zone as plates. */
  readonly facets: readonly BendFacet[];
  /** The corners of a box round all of them, in coordinates of the sheet as it lies with the bend's parent. */
  readonly box: readonly Vec3[];
}

export type BendShapes = (bend: number, formed: boolean) => BendShape;

/** Every bend of a part, flat and formed, worked out once. */
export function createBendShapes(part: PartModel): BendShapes {
  const known = new Map<number, BendShape>();
  return (index, formed) => {
    const key = 2 * index + (formed ? 1 : 0);
    const found = known.get(key) ?? shapeOf(part, index, formed);
    known.set(key, found);
    return found;
  };
}

function shapeOf(part: PartModel, index: number, formed: boolean): BendShape {
  const bend = part.bends[index];
  invariant(bend, "a path leads over bends of the part");
  const angle = formed ? bend.angle : 0;
  const facets = bendFacets(part, index, angle, facetCount(part, bend, angle));
  const corners = facets.flatMap(({ inside, outside }) => [...inside, ...outside]);
  const step = bendFrame(part, bend, angle);
  return { step, back: invertFrame(step), facets, box: boxCorners(corners) };
}

function boxCorners(points: readonly Vec3[]): readonly Vec3[] {
  const ends = ([0, 1, 2] as const).map((i) => [Math.min(...points.map((p) => p[i])), Math.max(...points.map((p) => p[i]))] as const);
  const at = (axis: 0 | 1 | 2, high: number) => ends[axis]?.[high as 0 | 1] ?? 0;
  return Array.from({ length: 8 }, (_, i): Vec3 => [at(0, i & 1), at(1, (i >> 1) & 1), at(2, (i >> 2) & 1)]);
}
