import type { Bend } from "../part/partModel";
import type { FindingsContext } from "./context";

/** No hole needs more than this to a bend's zone: the guides' longest slot, or half the V. */
export function farthestNeed({ part, toolsOf }: FindingsContext, bend: Bend): number {
  const { nearest, usual } = toolsOf(bend);
  return Math.max(4 * part.thickness, (nearest?.vOpening ?? usual) / 2);
}
