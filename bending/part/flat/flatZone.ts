import type { Vec2 } from "../../geometry/vec2";
import type { EdgeAxes } from "../edgeCut";
import type { ResolvedBend } from "../resolveBend";
import type { MaterialChord } from "./materialChords";
import type { ZoneCorner } from "./zoneCorner";

/** The zone of a bend on a drawn flat, over one stretch of material along its line: half the allowance to each side. */
export interface FlatZone {
  readonly bend: ResolvedBend;
  readonly strokeWith: string | null;
  /** Of the line in the document. */
  readonly path: string;
  /** Along the drawn line; inward is its left. */
  readonly axes: EdgeAxes;
  readonly half: number;
  readonly chord: MaterialChord;
  readonly right: readonly [ZoneCorner, ZoneCorner];
  readonly left: readonly [ZoneCorner, ZoneCorner];
}

export const cornerPoint = (corner: ZoneCorner): Vec2 => (corner.kind === "place" ? corner.place.point : corner.point);

/** The zone's corners counter-clockwise: right border from start to end, left border back. */
export function zoneQuad({ right, left }: Pick<FlatZone, "right" | "left">): readonly [Vec2, Vec2, Vec2, Vec2] {
  return [cornerPoint(right[0]), cornerPoint(right[1]), cornerPoint(left[1]), cornerPoint(left[0])];
}
