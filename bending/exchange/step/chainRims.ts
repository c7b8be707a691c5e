import { SOLID_MATCH_MM } from "../../core/tolerance";
import type { BendWindow, OutlineVertex, WindowPiece } from "./recognisedPart";
import type { BendEnd, BendRun, BendSide } from "./unrollBend";

/** What is cut out of a plate's edge along a bend, from the end of one stretch of the bend to the start of the next. */
export interface PlateRim {
  readonly on: BendSide;
  readonly rim: readonly OutlineVertex[];
  /** Along the bend from its start, mm. */
  readonly from: number;
  readonly to: number;
}

/** Follows the rims of cut-outs from the plates through the bend and back; what does not close again stays in `open`. */
export function chainRims(rims: readonly PlateRim[], runs: readonly BendRun[]): { readonly windows: readonly BendWindow[]; readonly open: readonly PlateRim[]; readonly unused: readonly BendRun[] } {
  const [freeRims, freeRuns] = [new Set(rims), new Set(runs)];
  const windows: BendWindow[] = [];
  for (const first of rims) {
    if (!freeRims.has(first)) continue;
    const chain = closedChain(first, [...freeRims], [...freeRuns]);
    if (!chain) continue;
    for (const { rim, run } of chain) {
      freeRims.delete(rim);
      freeRuns.delete(run);
    }
    windows.push({ pieces: chain.flatMap(({ rim, run }): readonly WindowPiece[] => [{ on: rim.on, rim: rim.rim }, ...(run.path.length > 0 ? [{ on: "bend" as const, path: run.path }] : [])]) });
  }
  return { windows, open: [...freeRims], unused: [...freeRuns] };
}

function closedChain(first: PlateRim, rims: readonly PlateRim[], runs: readonly BendRun[]): readonly { readonly rim: PlateRim; readonly run: BendRun }[] | null {
  const chain: { rim: PlateRim; run: BendRun }[] = [];
  for (let rim = first; chain.length < rims.length;) {
    const run = runs.find(({ from }) => meets(from, rim.on, rim.to));
    const next = run && rims.find((candidate) => meets(run.to, candidate.on, candidate.from));
    if (!run || !next) return null;
    chain.push({ rim, run });
    if (next === first) return chain;
    rim = next;
  }
  return null;
}

const meets = ({ on, along }: BendEnd, side: BendSide, place: number) => on === side && Math.abs(along - place) <= SOLID_MATCH_MM;
