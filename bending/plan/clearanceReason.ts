import type { ClearanceHit } from "../clearance/clearance";
import { formatLength } from "../core/formatLength";
import { mmPer, toDeg, type LengthUnit } from "../core/units";
import type { PartModel } from "../part/partModel";
import { formatBends } from "./formatBends";
import type { PlanReason } from "./planDocument";
import { rounded } from "./rounded";

export interface ClearanceContext {
  readonly part: PartModel;
  readonly units: LengthUnit;
  /** Ids of the bends of the stroke. */
  readonly bends: readonly string[];
  /** Ids of the punch and the die that make it. */
  readonly pair: readonly string[];
}

/** What a part meets in a stroke, in words and with what is needed to draw it. */
export function clearanceReason({ part, units, bends, pair }: ClearanceContext, hit: ClearanceHit): PlanReason {
  const face = part.faces[hit.face]?.id ?? "";
  const other = hit.otherFace === null ? null : part.faces[hit.otherFace]?.id ?? "";
  const at = toDeg(hit.strokeAngle);
  const name = formatBends(bends);
  const depth = formatLength(Math.round(hit.depth * 10) / 10, units);
  const message = hit.kind === "trapped" ? `${name} with ${pair[0] ?? ""}: ${hit.need ?? "the part could not be taken off"}`
    : hit.kind === "self" ? `${name}: ${face} meets ${other ?? "the part itself"} at ${at.toFixed(0)}°, ${depth} too near`
      : `${name}: ${face} meets the ${hit.kind}${hit.tool === null ? "" : ` ${hit.tool}`} at ${at.toFixed(0)}°, ${depth} too near` +
        (hit.kind === "punch" ? `; a punch relieved by ${depth} more there, a shorter flange or an earlier place in the order would clear` : "; a shorter flange or another place in the order would clear");
  return {
    kind: hit.kind === "self" ? "self-collision" : "clearance",
    bends,
    faces: other === null ? [face] : [face, other],
    tools: hit.tool === null ? (hit.kind === "trapped" ? pair : []) : [hit.tool],
    message,
    evidence: { strokeAngle: rounded(at), depth: rounded(hit.depth / mmPer(units)), zFrom: rounded(hit.z[0] / mmPer(units)), zTo: rounded(hit.z[1] / mmPer(units)) },
  };
}
