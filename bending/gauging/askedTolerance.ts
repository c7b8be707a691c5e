import type { Mm } from "../core/units";
import type { PartModel } from "../part/partModel";
import type { PartDimension } from "./partDimension";

/** The plus and minus that the part document asks of a dimension: a flange's own on its length, the part's on lengths of its base; null when it asks nothing. */
export function askedTolerance(part: PartModel, { kind, face, from: [from] }: PartDimension): Mm | null {
  if (kind !== "leg" || from?.at !== "outside") return null;
  const own = part.faces[face]?.bend ?? null;
  if (own === null) return part.toleranceLength;
  return from.bend === own ? part.bends[own]?.toleranceLength ?? null : null;
}
