import type { Tool, ToolPiece } from "../../tooling/tool";

/** Pieces of one tool that can stand for each other. */
export interface PieceKind {
  readonly length: number;
  readonly pieces: readonly ToolPiece[];
}

/** A length that so many pieces make side by side, and how long they are when drawn apart as far as is allowed. */
export interface PieceSum {
  readonly count: number;
  readonly length: number;
  readonly apart: number;
}

/** What a tool's pieces can make. */
export interface PieceStock {
  readonly tool: Tool;
  /** Longest first. */
  readonly kinds: readonly PieceKind[];
  /** Each length with each count once; fewest pieces first, then the shortest. */
  readonly sums: readonly PieceSum[];
}

/** Lengths are added up in thousandths of a millimetre, so that sums compare exactly. */
const PER_MM = 1000;

/** Sorts a tool's pieces and their sums up to `longest`. Pieces with a horn are left out: nothing says how much of one covers the line. */
export function createPieceStock(tool: Tool, longest: number, maxGap: number): PieceStock {
  const byLength = new Map<number, ToolPiece[]>();
  for (const piece of tool.pieces) {
    const length = Math.round(piece.length * PER_MM);
    if (piece.horn === null) byLength.set(length, [...(byLength.get(length) ?? []), piece]);
  }
  const kinds = [...byLength].sort((a, b) => b[0] - a[0]);
  let reached: ReadonlySet<string> = new Set(["0/0"]);
  for (const [length, pieces] of kinds) {
    const more = new Set(reached);
    for (const start of reached) {
      const [count = 0, sum = 0] = start.split("/").map(Number);
      for (let used = 1; used <= pieces.length && sum + used * length <= longest * PER_MM; used += 1) more.add(`${count + used}/${sum + used * length}`);
    }
    reached = more;
  }
  const sums = [...reached].map((text): PieceSum => {
    const [count = 0, sum = 0] = text.split("/").map(Number);
    return { count, length: sum / PER_MM, apart: sum / PER_MM + Math.max(0, count - 1) * maxGap };
  });
  return {
    tool,
    kinds: kinds.map(([length, pieces]) => ({ length: length / PER_MM, pieces })),
    sums: sums.filter(({ count }) => count > 0).sort((a, b) => a.count - b.count || a.length - b.length),
  };
}
