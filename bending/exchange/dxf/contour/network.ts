import type { Vec2 } from "../../../geometry/vec2";
import type { Piece, Repair } from "./piece";

/** Pieces joined in nodes. */
export interface Network {
  readonly nodes: readonly Vec2[];
  readonly edges: readonly NetworkEdge[];
  readonly repairs: readonly Repair[];
}

export interface NetworkEdge {
  readonly from: number;
  readonly to: number;
  readonly piece: Piece;
}
