import { mm, toRad, deg } from "@/bending/core/units";
import type { MaterialFacts } from "@/bending/handbook/material";
import { advisedFlange } from "@/bending/handbook/minimumFlange";
import { naturalRadius } from "@/bending/handbook/naturalRadius";
import { resolveAllowance } from "@/bending/handbook/resolveAllowance";
import type { CoverageCell, CoverageRow, SuggestedTrial } from "@/lib/schemas/bendTableViews";

/** Fewer than this many trials cannot tell an outlier. */
const ENOUGH_TRIALS = 3;
/** Strip for a trial, mm: long enough to measure well, wide enough to bend straight. Common practice, no source. */
const BLANK_MM = 100;
const WIDTH_MM = 50;

/**
 * What to bend next, best first: the V that the rule names for each sheet, sheets with the most bends of the shop's parts first;
 * where nothing is known before where a value is bridged, and that before where too few were bent.
 */
export function suggestTrials(rows: readonly CoverageRow[], material: MaterialFacts, most = 3): readonly SuggestedTrial[] {
  const wanting = rows.flatMap((row) => row.cells.filter(({ byRule }) => byRule).flatMap((cell) => {
    const rank = cell.kind === "open" ? 0 : cell.kind === "between" ? 1 : cell.kind === "measured" && cell.trials < ENOUGH_TRIALS ? 2 : null;
    return rank === null ? [] : [{ row, cell, rank }];
  }));
  return [...wanting]
    .sort((a, b) => Number(b.row.bends > 0) - Number(a.row.bends > 0) || a.rank - b.rank || b.row.bends - a.row.bends || a.row.thicknessMm - b.row.thicknessMm)
    .slice(0, most)
    .map(({ row, cell }) => suggestion(row, cell, material));
}

function suggestion(row: CoverageRow, cell: CoverageCell, material: MaterialFacts): SuggestedTrial {
  const leastFlangeMm = advisedFlange(mm(cell.vOpeningMm));
  const blankMm = Math.max(BLANK_MM, Math.ceil((2 * leastFlangeMm + 5) / 10) * 10);
  const { deduction } = resolveAllowance({ material, thickness: mm(row.thicknessMm), insideRadius: naturalRadius(material, mm(cell.vOpeningMm)), angle: toRad(deg(90)) });
  const parts = row.bends === 0 ? "No part is made of this sheet yet" : `${row.bends} ${row.bends === 1 ? "bend" : "bends"} of ${row.parts} ${row.parts === 1 ? "part" : "parts"} in this sheet`;
  const known = cell.kind === "open" ? "nothing measured near" : cell.kind === "between" ? "the value is only bridged" : `only ${cell.trials} ${cell.trials === 1 ? "trial" : "trials"} so far`;
  return {
    thicknessMm: row.thicknessMm, vOpeningMm: cell.vOpeningMm, why: `${parts}; ${known}`, angleDeg: 90,
    pieces: Math.max(1, ENOUGH_TRIALS - cell.trials), blankMm, widthMm: WIDTH_MM, flangeMm: (blankMm + deduction) / 2, leastFlangeMm,
  };
}
