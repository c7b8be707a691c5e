import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import { invertFrame } from "../geometry/invertFrame";
import type { PartPoint, Vec3 } from "../geometry/vec3";
import { bendArc } from "./bendArc";
import { bendDirections } from "./bendDirections";
import { foldFrames } from "./foldFrames";
import type { FormedAngles, PartModel } from "./partModel";

/** Undoes `foldZonePoint`, for a bend that is formed (its angle over 0): where a point of the bent zone lies in the unfolded sheet. */
export function unfoldZonePoint(part: PartModel, bendIndex: number, angles: FormedAngles, folded: PartPoint): Vec3 {
  const bend = part.bends[bendIndex];
  const frame = bend && foldFrames(part, angles)[bend.parent];
  const angle = angles[bendIndex] ?? 0;
  invariant(bend && frame && angle > 0, "unfoldZonePoint: a formed bend of the part");
  const [x, y, z] = applyFrame(invertFrame(frame), folded);
  const { along: d, outward: n } = bendDirections(bend);
  const [sx, sy] = bend.zone[0];
  const [a, away] = [(x - sx) * d[0] + (y - sy) * d[1], (x - sx) * n[0] + (y - sy) * n[1]];
  const arc = bendArc(part, bend, angle);
  const radius = bend.allowance / angle;
  // From the centre of the bend: 0 at the parent's tangent, which lies straight below (or above) it.
  const toCentre = arc.neutralHeight + arc.sense * radius - z;
  const turned = Math.atan2(away, arc.sense * toCentre);
  const off = Math.hypot(away, toCentre) - radius;
  const u = bend.allowance * ((turned < angle / 2 - Math.PI ? turned + 2 * Math.PI : turned) / angle);
  return [sx + d[0] * a + n[0] * u, sy + d[1] * a + n[1] * u, arc.neutralHeight - arc.sense * off];
}
