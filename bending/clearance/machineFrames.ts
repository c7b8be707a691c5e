import { invariant } from "../core/invariant";
import type { Rad } from "../core/units";
import { applyFrame } from "../geometry/applyFrame";
import { composeFrames } from "../geometry/composeFrames";
import type { Frame } from "../geometry/frame";
import { identityFrame } from "../geometry/identityFrame";
import { invertFrame } from "../geometry/invertFrame";
import type { Vec3 } from "../geometry/vec3";
import { foldFrames } from "../part/foldFrames";
import type { PartModel } from "../part/partModel";
import type { Die, Punch } from "../tooling/tool";
import type { Hit } from "./hit";
import { hitLine } from "./hitLine";
import { hitSides } from "./hitSides";
import { strokePlacement } from "./strokePlacement";

export type { Hit } from "./hit";

/**
 * partToMachine: the frame of every face, from coordinates of the unfolded sheet (z in 0..thickness) to the machine's
 * frame, with the hit's bends at `strokeAngle` and the formed ones at their own angles. A bend forms upwards, so the part
 * is turned over for a `down` bend. z = 0 in the middle of the hit. The punch does not move the sheet (air bending).
 */
export function machineFrames(part: PartModel, hit: Hit, strokeAngle: Rad, ...[, die]: readonly [punch: Punch, die: Die]): readonly Frame[] {
  const first = hit.bends[0];
  invariant(first !== undefined, "a hit forms at least one bend");
  const angles = part.bends.map((bend, i) => (hit.bends.includes(i) ? strokeAngle : (hit.formed >> i) & 1 ? bend.angle : 0));
  const folded = foldFrames(part, angles);
  const line = hitLine(part, hit, first, hitSides(part, hit));
  const parent = folded[line.bend.parent] ?? identityFrame;
  const place = composeFrames(parentInMachine(part, line, strokeAngle, die), invertFrame(parent));
  return folded.map((frame) => composeFrames(place, frame));
}

function parentInMachine(part: PartModel, line: ReturnType<typeof hitLine>, strokeAngle: Rad, die: Die): Frame {
  const { slope, tangent } = strokePlacement(line.bend, part.thickness, die, strokeAngle);
  const side = line.parentInFront ? -1 : 1;
  const up = line.bend.direction === "up" ? 1 : -1;
  const outward: Vec3 = [side * Math.cos(slope), Math.sin(slope), 0];
  const normal: Vec3 = [-side * up * Math.sin(slope), up * Math.cos(slope), 0];
  const axis = (i: 0 | 1): Vec3 => [-line.across[i] * outward[0], -line.across[i] * outward[1], line.along[i]];
  const turned: Frame = { x: axis(0), y: axis(1), z: normal, o: [0, 0, 0] };
  const [start] = line.bend.line;
  const half = line.bend.allowance / 2;
  const foot: Vec3 = [start[0] - line.across[0] * half, start[1] - line.across[1] * half, up > 0 ? 0 : part.thickness];
  const moved = applyFrame(turned, foot);
  const z = line.along[0] * foot[0] + line.along[1] * foot[1] - line.middle;
  return { ...turned, o: [side * tangent[0] - moved[0], tangent[1] - moved[1], z - moved[2]] };
}
