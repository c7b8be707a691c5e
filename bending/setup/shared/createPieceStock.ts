import type { Tool, ToolPiece } from "../../tooling/tool";
import type { SearchEffort } from "./searchEffort";

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

/** So many sums are kept of one tool: sixteen pieces of which no two are of one length, or any number of a common raster. */
const MOST_SUMS = 70_000;
/** A count and a sum of thousandths as one number: no bed is a hundred metres long. */
const PER_COUNT = 1e8;

/** Sorts a tool's pieces and their sums up to `longest`; gives up the search when there are too many. Pieces with a horn are left out: nothing says how much of one covers the line. */
export function createPieceStock(tool: Tool, longest: number, maxGap: number, effort: SearchEffort): PieceStock {
  const byLength = new Map<number, ToolPiece[]>();
  for (const piece of tool.pieces) {
    const length = Math.round(piece.length * PER_MM);
    if (piece.horn === null) byLength.set(length, [...(byLength.get(length) ?? []), piece]);
  }
  const kinds = [...byLength].sort((a, b) => b[0] - a[0]);
  let reached: ReadonlySet<number> = new Set([0]);
  for (const [length, pieces] of kinds) {
    const more = new Set(reached);
    for (const start of reached) {
      for (let used = 1; used <= pieces.length && (start % PER_COUNT) + used * length <= longest * PER_MM; used += 1) more.add(start + used * (PER_COUNT + length));
    }
    reached = more;
    if (reached.size > MOST_SUMS) { effort.giveUp(); break; }
  }
  const sums = [...reached].map((sum): PieceSum => {
    const [count, length] = [Math.floor(sum / PER_COUNT), (sum % PER_COUNT) / PER_MM];
    return { count, length, apart: length + Math.max(0, count - 1) * maxGap };
  });
  return {
    tool,
    kinds: kinds.map(([length, pieces]) => ({ length: length / PER_MM, pieces })),
    sums: sums.filter(({ count }) => count > 0).sort((a, b) => a.count - b.count || a.length - b.length),
  };
}
