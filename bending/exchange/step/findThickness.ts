import { SOLID_MATCH_MM } from "../../core/tolerance";
import { PART_LIMITS } from "../../part/partLimits";
import { coaxialPairs } from "./coaxialPairs";
import type { FacingPlanes } from "./facingPlanes";
import type { Solid } from "./solid";

/**
 * The sheet's thickness: the distance for which the faces back to back, plane and coaxial round ones, cover the most area.
 * Null when nothing lies back to back.
 */
export function findThickness(solid: Solid, planes: readonly FacingPlanes[]): number | null {
  const votes = [
    ...planes.map(({ distance, area, cover }) => ({ distance, weight: area * cover })),
    ...coaxialPairs(solid).map(({ distance, area }) => ({ distance, weight: area })),
  ].filter(({ distance }) => distance <= PART_LIMITS.thickness).sort((a, b) => a.distance - b.distance);
  let best: { readonly weight: number; readonly distance: number } | null = null;
  for (let first = 0; first < votes.length; ) {
    const start = votes[first]?.distance ?? 0;
    let next = first;
    let [weight, sum] = [0, 0];
    for (; next < votes.length && (votes[next]?.distance ?? 0) - start <= SOLID_MATCH_MM; next += 1) {
      weight += votes[next]?.weight ?? 0;
      sum += (votes[next]?.weight ?? 0) * (votes[next]?.distance ?? 0);
    }
    if (weight > 0 && (!best || weight > best.weight)) best = { weight, distance: sum / weight };
    first = next;
  }
  return best && best.distance;
}
