import type { PlanSection } from "@/bending/plan/planDocument";
import type { Tool } from "@/bending/tooling/tool";

/** A tool piece standing on the bed, mm from the middle of the bed. */
export interface StationPiece {
  readonly id: string;
  readonly tool: string;
  readonly kind: "punch" | "die";
  readonly from: number;
  readonly to: number;
  readonly horn: "left" | "right" | "both" | null;
  readonly rack: string | null;
}

/**
 * Lays a station's sections from left to right. A section that names no piece gets the first piece of that tool with that
 * length that no section before it has taken; without one it keeps the tool's name and its length.
 */
export function stationPieces(sections: readonly PlanSection[], tool: Tool, from: number, mmPerUnit: number): readonly StationPiece[] {
  const taken = new Set(sections.flatMap((section) => (section.length !== undefined && section.piece ? [section.piece] : [])));
  const pieces: StationPiece[] = [];
  let at = from;
  for (const section of sections) {
    if (section.length === undefined) {
      at += section.gap * mmPerUnit;
      continue;
    }
    const length = section.length * mmPerUnit;
    const known = section.piece
      ? tool.pieces.find((piece) => piece.id === section.piece)
      : tool.pieces.find((piece) => !taken.has(piece.id) && Math.abs(piece.length - length) < 0.01);
    const id = section.piece ?? known?.id ?? `${tool.id} ${length}`;
    taken.add(id);
    pieces.push({
      id, tool: tool.id, kind: tool.kind, from: at, to: at + length,
      horn: section.horn ?? known?.horn ?? null, rack: known?.rack ?? null,
    });
    at += length;
  }
  return pieces;
}
