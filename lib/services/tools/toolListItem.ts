import type { ToolRow } from "@/db/tools/toolRow";
import type { ToolListItem } from "@/lib/schemas/views";

export const toolListItem = (row: ToolRow): ToolListItem => ({
  code: row.code,
  kind: row.kind,
  name: row.name,
  angleDeg: row.angle_deg,
  radiusMm: (row.kind === "punch" ? row.tip_radius_mm : row.shoulder_radius_mm) ?? 0,
  vOpeningMm: row.v_opening_mm,
  heightMm: row.height_mm,
  maxForcePerMetreKN: row.max_force_kn_per_m,
  pieces: row.pieces,
  piecesInService: row.pieces_in_service,
  lengthInServiceMm: row.length_in_service_mm,
});
