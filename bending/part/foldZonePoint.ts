import { invariant } from "../core/invariant";
import { applyFrame } from "../geometry/applyFrame";
import type { PartPoint, Vec3 } from "../geometry/vec3";
import { bendArc } from "./bendArc";
import { bendDirections } from "./bendDirections";
import { foldFrames } from "./foldFrames";
import type { FormedAngles, PartModel } from "./partModel";
import { pointOnBendArc } from "./pointOnBendArc";

/** Where a point of a bend zone, given in the unfolded sheet, is when the part is formed to `angles`. */
export function foldZonePoint(part: PartModel, bendIndex: number, angles: FormedAngles, [x, y, z]: Vec3): PartPoint {
  const bend = part.bends[bendIndex];
  const frame = bend && foldFrames(part, angles)[bend.parent];
  invariant(bend && frame, "foldZonePoint: a bend of the part");
  const { along: d, outward: n } = bendDirections(bend);
  const [sx, sy] = bend.zone[0];
  const [a, u] = [(x - sx) * d[0] + (y - sy) * d[1], (x - sx) * n[0] + (y - sy) * n[1]];
  const arc = bendArc(part, bend, angles[bendIndex] ?? 0);
  const [away, height] = pointOnBendArc(arc, u / bend.allowance, arc.sense * (arc.neutralHeight - z));
  return applyFrame(frame, [sx + d[0] * a + n[0] * away, sy + d[1] * a + n[1] * away, height]);
}
