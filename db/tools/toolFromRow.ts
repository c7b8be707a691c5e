import { deg, kiloNewtonPerMetre, mm, toRad } from "@/bending/core/units";
import type { Tool } from "@/bending/tooling/tool";
import type { PieceRow } from "./pieceRow";
import type { ToolRow } from "./toolRow";

/** The tool as the library computes with it, with the pieces given. */
export function toolFromRow(row: ToolRow, pieces: readonly PieceRow[]): Tool {
  const common = {
    id: row.code,
    name: row.name,
    profile: row.profile,
    height: mm(row.height_mm),
    maxForcePerMetre: kiloNewtonPerMetre(row.max_force_kn_per_m),
    tang: row.tang,
    pieces: pieces.map((piece) => ({ id: piece.code, length: mm(piece.length_mm), horn: piece.horn, rack: piece.rack === "" ? null : piece.rack })),
  };
  const angle = toRad(deg(row.angle_deg));
  return row.kind === "punch"
    ? { ...common, kind: "punch", tipAngle: angle, tipRadius: mm(row.tip_radius_mm ?? 0) }
    : { ...common, kind: "die", vAngle: angle, vOpening: mm(row.v_opening_mm ?? 0), shoulderRadius: mm(row.shoulder_radius_mm ?? 0), ...(row.flattening ? { flattening: slotOf(row.flattening) } : {}) };
}

const slotOf = ({ floor, back, opening }: NonNullable<ToolRow["flattening"]>) => ({ floor: mm(floor), back: mm(back), opening: mm(opening) });
