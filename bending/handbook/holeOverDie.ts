import type { Mm } from "../core/units";

/** True when a hole's edge lies over the V's opening, where it pulls out of shape: nearer to the bend line than V / 2 (from memory). */
export function holeOverDie(edgeToBendLine: Mm, vOpening: Mm): boolean {
  return edgeToBendLine < vOpening / 2;
}
