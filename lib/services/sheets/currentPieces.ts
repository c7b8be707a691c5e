import type { PlanDocument } from "@/bending/plan/planDocument";
import type { Tool } from "@/bending/tooling/tool";
import type { Connection } from "@/db/connection";
import { findPieces } from "@/db/tools/findPieces";
import { inService } from "@/db/tools/inService";
import type { PieceRow } from "@/db/tools/pieceRow";

export interface CurrentPieces {
  /** The tools as planned, their pieces with the rack places of now. */
  readonly tools: readonly Tool[];
  /** Pieces that the plan names and that are out of service, gone or of another length now, with the reason. */
  readonly missing: readonly { readonly piece: string; readonly why: string }[];
}

const SAME_LENGTH_MM = 0.01;

/** Looks up where the pieces of a plan are now. */
export async function currentPieces(db: Connection, plan: PlanDocument, tools: readonly Tool[]): Promise<CurrentPieces> {
  const rows = new Map((await findPieces(db, { toolCodes: tools.map((tool) => tool.id) })).map((row) => [row.code, row]));
  const named = new Set(plan.stations.flatMap(({ punchSections, dieSections }) => [...punchSections, ...dieSections].flatMap((section) => ("piece" in section && section.piece) || [])));
  const planned = tools.flatMap((tool) => tool.pieces).filter((piece) => named.has(piece.id));
  return {
    tools: tools.map((tool) => ({ ...tool, pieces: tool.pieces.map((piece) => ({ ...piece, rack: (rows.get(piece.id)?.rack ?? piece.rack) || null })) })),
    missing: planned.flatMap((piece) => {
      const why = faultOf(rows.get(piece.id), piece.length);
      return why === null ? [] : [{ piece: piece.id, why }];
    }),
  };
}

function faultOf(row: PieceRow | undefined, plannedLength: number): string | null {
  if (!row) return "no longer there";
  if (!inService.includes(row.state)) return row.state;
  return Math.abs(row.length_mm - plannedLength) > SAME_LENGTH_MM ? `now ${row.length_mm} mm long` : null;
}
