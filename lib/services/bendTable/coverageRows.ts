import { mm, type Mm, type Rad } from "@/bending/core/units";
import { vOpeningRule } from "@/bending/handbook/vOpeningRule";
import type { ShopTable } from "@/bending/shopTable/shopCell";
import { shopValue } from "@/bending/shopTable/shopValue";
import type { CoverageCell, CoverageRow } from "@/lib/schemas/bendTableViews";

export interface CoverageQuestion {
  readonly material: string;
  readonly table: ShopTable;
  /** In order. */
  readonly thicknesses: readonly number[];
  readonly openings: readonly { readonly vOpeningMm: number; readonly inService: boolean }[];
  /** Of the shop's parts in this material, by nominal thickness. */
  readonly uses: readonly { readonly thicknessMm: number; readonly bends: number }[];
}

/** A sheet is bent in a V of 4 to 12 times its thickness; common practice, no source. */
const USUAL_TIMES = [4, 12] as const;
const RIGHT_ANGLE = (Math.PI / 2) as Rad;

/** Where the shop has measured, where its values bridge a gap, and where nothing is known, for each sheet and V. */
export function coverageRows({ material, table, thicknesses, openings, uses }: CoverageQuestion): readonly CoverageRow[] {
  return thicknesses.map((thicknessMm) => {
    const here = uses.filter((use) => use.thicknessMm === thicknessMm);
    const ruled = nearestInService(vOpeningRule(mm(thicknessMm)), openings);
    return {
      thicknessMm,
      bends: here.reduce((sum, { bends }) => sum + bends, 0),
      parts: here.length,
      cells: openings.map(({ vOpeningMm }) => cellAt(material, table, mm(thicknessMm), mm(vOpeningMm), vOpeningMm === ruled)),
    };
  });
}

/** On a logarithmic scale: sizes of dies grow by steps of a part, not of a length. */
function nearestInService(wanted: Mm, openings: CoverageQuestion["openings"]): number | undefined {
  const off = (opening: number) => Math.abs(Math.log(opening / wanted));
  return openings.filter(({ inService }) => inService).map(({ vOpeningMm }) => vOpeningMm).sort((a, b) => off(a) - off(b))[0];
}

function cellAt(material: string, table: ShopTable, thickness: Mm, vOpening: Mm, byRule: boolean): CoverageCell {
  const cells = table.cells
    .filter((cell) => cell.material === material && cell.thickness === thickness && cell.vOpening === vOpening)
    .sort((a, b) => Math.abs(a.angle - 90) - Math.abs(b.angle - 90));
  const trials = cells.reduce((sum, { value }) => sum + (value?.count ?? 0), 0);
  const value = shopValue(table, { material, thickness, vOpening, angle: RIGHT_ANGLE });
  const usual = vOpening >= USUAL_TIMES[0] * thickness && vOpening <= USUAL_TIMES[1] * thickness;
  return {
    vOpeningMm: vOpening,
    kind: trials > 0 ? "measured" : !usual ? "unusual" : value ? "between" : "open",
    deductionMm: trials > 0 || usual ? (value?.deduction ?? null) : null,
    expandedMm: trials > 0 || usual ? (value?.expanded ?? null) : null,
    trials,
    anglesDeg: [...new Set(cells.filter(({ value: own }) => own !== null).map(({ angle }) => angle as number))].sort((a, b) => a - b),
    valueKeys: cells.map(({ key }) => key),
    outlier: cells.some((cell) => cell.trials.some(({ outlier }) => outlier)),
    byRule,
  };
}
