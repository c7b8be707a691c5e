import { DRAWN_GAP_MM } from "@/bending/core/tolerance";
import type { ImportChoices } from "@/bending/exchange/dxf/import/importChoices";
import { parseLength } from "@/lib/format/parseLength";
import type { ImportForm } from "./importForm";

/** Gaps of half a centimetre are no slips of the pen. */
const MOST_GAP_MM = 5;

/** The gap typed, in mm; null when it is no gap. */
export function gapOf(text: string): number | null {
  const read = parseLength(text, "mm");
  return read.ok && read.value >= 0 && read.value <= MOST_GAP_MM ? read.value : null;
}

export const importChoicesOf = ({ unit, roles, gap, singleLines, contour }: Pick<ImportForm, "unit" | "roles" | "gap" | "singleLines" | "contour">): ImportChoices => ({
  unit, roles: new Map(Object.entries(roles)), gap: gapOf(gap) ?? DRAWN_GAP_MM, singleLines: singleLines === "out" ? null : singleLines, contour,
});
