import { MEANT_CONTACT_MM } from "../core/tolerance";
import type { Bend, PartModel } from "../part/partModel";

/** Plates that a formed bend zone is cut into, so that their outside stands at most 0.8 of `MEANT_CONTACT_MM` off the arc (1 to 32). */
export function facetCount(part: PartModel, bend: Bend, angle: number): number {
  if (angle < 1e-6) return 1;
  const radius = bend.allowance / angle + (1 - bend.k) * part.thickness;
  return Math.min(32, Math.max(1, Math.ceil(angle / (2 * Math.acos(1 / (1 + (0.8 * MEANT_CONTACT_MM) / radius))))));
}
