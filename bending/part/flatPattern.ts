import { SAME_POINT_MM } from "../core/tolerance";
import { polygonBounds, type Bounds2 } from "../geometry/polygonBounds";
import { signedArea } from "../geometry/signedArea";
import type { FlatPoint } from "../geometry/vec2";
import { mm, type Mm, type Rad } from "../core/units";
import { developedOutline } from "./developedOutline";
import type { BendDirection } from "./partDocument";
import type { PartModel } from "./partModel";

export interface FlatBendLine {
  readonly id: string;
  readonly line: readonly [FlatPoint, FlatPoint];
  readonly angle: Rad;
  readonly direction: BendDirection;
}

/** The blank that the laser or punch cuts, in the frame of the unfolded sheet (millimetres). */
export interface FlatPattern {
  /** Counter-clockwise; a tear relief is a slit without width. */
  readonly outline: readonly FlatPoint[];
  /** Clockwise. */
  readonly holes: readonly (readonly FlatPoint[])[];
  readonly bendLines: readonly FlatBendLine[];
  readonly bounds: Bounds2;
  /** Size along x and along y. */
  readonly width: Mm;
  readonly depth: Mm;
  /** mm², holes taken off. */
  readonly area: number;
  readonly massKg: number;
}

export function flatPattern(part: PartModel): FlatPattern {
  const outline = developedOutline(part);
  const holes = part.faces.flatMap((face) => face.holes.map(clockwise));
  const bounds = polygonBounds(outline);
  const area = signedArea(outline) + holes.reduce((sum, hole) => sum + signedArea(hole), 0);
  return {
    outline: withoutMidpoints(outline),
    holes,
    bendLines: part.bends.map(({ id, line, angle, direction }) => ({ id, line, angle, direction })),
    bounds,
    width: mm(bounds.max[0] - bounds.min[0]),
    depth: mm(bounds.max[1] - bounds.min[1]),
    area,
    massKg: (area * part.thickness * part.material.density) / 1e9,
  };
}

const clockwise = (hole: readonly FlatPoint[]): readonly FlatPoint[] => (signedArea(hole) > 0 ? [...hole].reverse() : hole);

/** Leaves out points in the middle of straight runs; the tip of a slit, where the outline turns back, stays. */
function withoutMidpoints(outline: readonly FlatPoint[]): readonly FlatPoint[] {
  const kept: FlatPoint[] = [];
  outline.forEach((q, i) => {
    const p = kept[kept.length - 1] ?? outline[outline.length - 1] ?? q;
    const r = outline[(i + 1) % outline.length] ?? q;
    const [ux, uy, vx, vy] = [q[0] - p[0], q[1] - p[1], r[0] - q[0], r[1] - q[1]];
    const straightOn = ux * vx + uy * vy > 0 && Math.abs(ux * vy - uy * vx) <= SAME_POINT_MM * Math.max(Math.hypot(ux, uy), Math.hypot(vx, vy));
    if (!straightOn) kept.push(q);
  });
  return kept;
}
