import type { Tool, ToolPiece } from "../../tooling/tool";

/** The id of a tool of a kind that the shop does not own. */
export const newId = (kind: Tool["kind"]): string => `new ${kind}`;

/** Pieces of the same lengths as an owned tool's. */
export const piecesLike = ({ pieces }: Tool): readonly ToolPiece[] => pieces.map((piece) => ({ ...piece, id: `new ${piece.id}`, rack: null }));
