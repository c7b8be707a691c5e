import { mm, toRad, type Mm } from "@/bending/core/units";
import type { MaterialFacts } from "@/bending/handbook/material";
import { naturalRadius } from "@/bending/handbook/naturalRadius";
import { resolveAllowance, type ResolvedAllowance } from "@/bending/handbook/resolveAllowance";
import type { ShopCell } from "@/bending/shopTable/shopCell";

export interface HandbookBend extends ResolvedAllowance {
  readonly radius: Mm;
}

/** What the handbook says of the bend of a cell: with the radius that it expects there, the natural one of the V or the rounder punch's. */
export function handbookFor(cell: Pick<ShopCell, "thickness" | "vOpening" | "punchRadius" | "angle">, material: MaterialFacts): HandbookBend {
  const radius = mm(Math.max(naturalRadius(material, cell.vOpening), cell.punchRadius));
  return { radius, ...resolveAllowance({ material, thickness: cell.thickness, insideRadius: radius, angle: toRad(cell.angle) }) };
}
