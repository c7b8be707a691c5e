import { mm } from "../../core/units";
import type { ProfilePoint } from "../../geometry/vec2";
import type { Die, Punch } from "../../tooling/tool";
import { newId, piecesLike } from "./asNew";

/** An owned tool's like with its body drawn out, or cut short, at the seat to another height, mm. */
export function tallerTool<T extends Punch | Die>(like: T, height: number): T {
  const more = height - like.height;
  const moved = ([x, y]: ProfilePoint): ProfilePoint => [x, Math.abs(y) < like.height - 1e-6 ? y : y + Math.sign(y) * more];
  return { ...like, id: newId(like.kind), name: `another ${like.kind}`, height: mm(height), pieces: piecesLike(like), profile: like.profile.map(moved) };
}
