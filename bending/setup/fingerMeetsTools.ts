import { MEANT_CONTACT_MM } from "../core/tolerance";
import { convexOverlap } from "../geometry/convexOverlap";
import { convexPieces } from "../geometry/convexPieces";
import type { Vec2 } from "../geometry/vec2";
import type { Machine } from "../tooling/machine";
import type { Die, Punch } from "../tooling/tool";

/** Does a gauge finger with its stop at (x, r) stand in the tools, the ram or the bed when the punch touches the flat sheet? */
export function fingerMeetsTools(x: number, r: number, thickness: number, punch: Punch, die: Die, machine: Machine): boolean {
  const finger = moved(machine.gauge.fingerProfile, x, r);
  const bodies = [
    moved(die.profile, 0, 0),
    moved(punch.profile, 0, thickness),
    moved(machine.bedProfile, 0, -die.height),
    moved(machine.ramProfile, 0, thickness + punch.height),
  ];
  return bodies.some((body) => body.some((piece) => finger.some((part) => convexOverlap(part, piece) > MEANT_CONTACT_MM)));
}

function moved(profile: readonly Vec2[], x: number, y: number): readonly (readonly Vec2[])[] {
  return convexPieces(profile).map((piece) => piece.map((p): Vec2 => [p[0] + x, p[1] + y]));
}
