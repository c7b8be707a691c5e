import type { ToolPiece } from "../tooling/tool";

/** Pieces standing side by side on the bed, left to right, with the gap before each (the first has none). */
export interface Run {
  readonly pieces: readonly ToolPiece[];
  /** Between two neighbours, mm; 0 when they touch. */
  readonly gap: number;
  /** From the first end to the last, gaps and all, mm. */
  readonly length: number;
}

/** Lengths are added up in thousandths of a millimetre, so that sums compare exactly. */
const PER_MM = 1000;
const inThousandths = (length: number) => Math.round(length * PER_MM);

interface Sum { readonly length: number; readonly count: number; readonly before: Sum | null; readonly kind: number }

/**
 * The runs worth having that are at least `need` long: for every count of pieces the shortest that needs no
 * more, and, where real pieces do not come out, one drawn apart by equal gaps up to `maxGap`. Shortest first.
 * Pieces with a horn stand in only where plain ones do not reach.
 */
export function composeRuns(pieces: readonly ToolPiece[], need: number, maxGap: number): readonly Run[] {
  const plain = pieces.filter((piece) => piece.horn === null);
  const runs = runsOf(plain, need, maxGap);
  return runs.length > 0 || plain.length === pieces.length ? runs : runsOf(pieces, need, maxGap);
}

function runsOf(pieces: readonly ToolPiece[], need: number, maxGap: number): readonly Run[] {
  const kinds = byLength(pieces);
  const wanted = inThousandths(need);
  const sums = reachableSums(kinds, wanted);
  const ascending = [...sums.values()].sort((a, b) => a.length - b.length);
  const runs: Run[] = [];
  let fewest = Infinity;
  for (const sum of ascending) {
    if (sum.length < wanted || sum.count >= fewest) continue;
    fewest = sum.count;
    runs.push({ pieces: pick(kinds, sum), gap: 0, length: sum.length / PER_MM });
  }
  const apart = drawnApart(ascending, wanted, inThousandths(maxGap), runs[0]?.pieces.length ?? Infinity);
  if (apart === null) return runs;
  return [...runs, { pieces: pick(kinds, apart), gap: (wanted - apart.length) / PER_MM / (apart.count - 1), length: need }];
}

/** The run that reaches the length only with gaps; of the fewest pieces, then of the least gap. */
function drawnApart(sums: readonly Sum[], wanted: number, maxGap: number, fewer: number): Sum | null {
  let best: Sum | null = null;
  for (const sum of sums) {
    if (sum.length >= wanted || sum.count < 2 || sum.count > fewer) continue;
    if (sum.length + (sum.count - 1) * maxGap < wanted) continue;
    if (best === null || sum.count < best.count || (sum.count === best.count && sum.length > best.length)) best = sum;
  }
  return best;
}

function byLength(pieces: readonly ToolPiece[]): readonly { readonly length: number; readonly pieces: readonly ToolPiece[] }[] {
  const kinds = new Map<number, ToolPiece[]>();
  for (const piece of pieces) {
    const length = inThousandths(piece.length);
    const same = kinds.get(length);
    if (same) same.push(piece);
    else kinds.set(length, [piece]);
  }
  return [...kinds].sort((a, b) => b[0] - a[0]).map(([length, same]) => ({ length, pieces: same }));
}

/** Every length that pieces add up to, each with as few pieces as can be; none longer than it is of use. */
function reachableSums(kinds: ReturnType<typeof byLength>, wanted: number): Map<number, Sum> {
  const sums = new Map<number, Sum>([[0, { length: 0, count: 0, before: null, kind: -1 }]]);
  kinds.forEach((kind, index) => {
    for (const start of [...sums.values()]) {
      let sum = start;
      for (let used = 0; used < kind.pieces.length && sum.length < wanted; used += 1) {
        sum = { length: sum.length + kind.length, count: sum.count + 1, before: sum, kind: index };
        const known = sums.get(sum.length);
        if (known === undefined || known.count > sum.count) sums.set(sum.length, sum);
      }
    }
  });
  sums.delete(0);
  return sums;
}

/** The real pieces of a sum, long ones in the middle of the list first, horns at the ends. */
function pick(kinds: ReturnType<typeof byLength>, sum: Sum): readonly ToolPiece[] {
  const used = new Map<number, number>();
  const chosen: ToolPiece[] = [];
  for (let at: Sum | null = sum; at !== null && at.kind >= 0; at = at.before) {
    const count = used.get(at.kind) ?? 0;
    const piece = kinds[at.kind]?.pieces[count];
    if (piece === undefined) throw new Error("invariant: a sum uses no more pieces than there are");
    used.set(at.kind, count + 1);
    chosen.push(piece);
  }
  return chosen.sort((a, b) => hornPlace(a) - hornPlace(b) || b.length - a.length);
}

const hornPlace = (piece: ToolPiece) => (piece.horn === "left" ? -1 : piece.horn === null ? 0 : 1);
