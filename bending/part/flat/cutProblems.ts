import type { FieldProblem } from "../../core/problem";
import { segmentsCross } from "../../geometry/segmentsCross";
import { signedArea } from "../../geometry/signedArea";
import type { Vec2 } from "../../geometry/vec2";
import type { CutUp } from "./cutSheet";
import type { FlatZone } from "./flatZone";
import type { Rings } from "./ringPlace";
import type { ZoneCut } from "./zoneCuts";

/** The pieces of a sheet must come to the sheet again; rounding is far under this part of it. */
const LOST_SHARE = 1e-6;

/** Zones whose cuts cross the boundary or one another, so that the sheet cannot be parted along them: told by what the pieces come to. */
export function cutProblems(rings: Rings, { pieces }: CutUp, cuts: readonly ZoneCut[], zones: readonly FlatZone[]): readonly FieldProblem[] {
  const whole = rings.reduce((sum, ring) => sum + signedArea(ring), 0);
  const parted = pieces.reduce((sum, { outline, holes }) => sum + signedArea(outline) + holes.reduce((taken, hole) => taken + signedArea(hole), 0), 0);
  if (Math.abs(parted - whole) <= LOST_SHARE * whole) return [];
  const crossing = new Set(cuts.filter((cut, i) => crossesBoundary(cut, rings) || cuts.some((other, k) => k !== i && crosses(cut, [other.from.point, other.to.point]))).map(({ zone }) => zone));
  const paths = [...new Set([...crossing].map((zone) => zones[zone]?.path ?? "flat.bends"))];
  const message = "the bend reaches over the edge of the sheet, or into another bend, beside its end; cut the corner out further or move the line";
  return (paths.length > 0 ? paths : ["flat.bends"]).map((path) => ({ path, message }));
}

const crossesBoundary = (cut: ZoneCut, rings: Rings) => rings.some((ring) => ring.some((p, i) => crosses(cut, [p, ring[(i + 1) % ring.length] ?? p])));

/** Nearer to an end of a cut than this it only touches (mm). */
const TOUCHING_MM = 1e-3;

/** Whether they cross in the inside of the cut; ends that touch are as they should be. */
function crosses({ from, to }: ZoneCut, [p, q]: readonly [Vec2, Vec2]): boolean {
  const at = segmentsCross(from.point, to.point, p, q);
  const far = (end: Vec2) => at !== null && Math.hypot(at[0] - end[0], at[1] - end[1]) > TOUCHING_MM;
  return far(from.point) && far(to.point);
}
