import type { Hit } from "../clearance/hit";
import type { PartModel } from "../part/partModel";
import { createSheetReach, type SheetReach } from "./createSheetReach";

/** How far the sheet lies level on either side of a bend line before one stroke: see `createSheetReach`. */
export function sheetReach(part: PartModel, { bends, front, formed }: Hit): SheetReach {
  return createSheetReach(part, bends, front)(formed);
}
