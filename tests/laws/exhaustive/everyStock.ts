import type { Tool, ToolPiece } from "@/bending/tooling/tool";

/** Pieces of one tool side by side: how long they are and how many. */
export interface Solid { readonly length: number; readonly pieces: number }

const KEY = 1000;
const sum = (pieces: readonly ToolPiece[]) => Math.round(pieces.reduce((length, piece) => length + piece.length, 0) * KEY) / KEY;

/**
 * Every way to put pieces of one tool into `stations` runs, none of them empty, no piece twice: all assignments tried, those of equal lengths once,
 * with the fewest pieces. Slow and obvious.
 */
export function everyStock(tool: Tool, stations: number): readonly (readonly Solid[])[] {
  const found = new Map<string, readonly Solid[]>();
  const place = (index: number, runs: readonly (readonly ToolPiece[])[]): void => {
    const piece = tool.pieces[index];
    if (piece === undefined) {
      if (runs.some((run) => run.length === 0)) return;
      const solids = runs.map((run): Solid => ({ length: sum(run), pieces: run.length }));
      const key = solids.map(({ length }) => length).join();
      const known = found.get(key);
      if (known === undefined || count(known) > count(solids)) found.set(key, solids);
      return;
    }
    place(index + 1, runs);
    for (let station = 0; station < stations; station += 1) place(index + 1, runs.map((run, i) => (i === station ? [...run, piece] : run)));
  };
  place(0, Array.from({ length: stations }, () => []));
  return [...found.values()];
}

const count = (solids: readonly Solid[]) => solids.reduce((all, { pieces }) => all + pieces, 0);
