import { mm } from "../core/units";
import type { StockSheet } from "./shopLimits";

/** Sheet sizes as merchants stock them; common practice, no source. A shop gives its own. */
export const stockSheets: readonly StockSheet[] = [
  { length: mm(3000), width: mm(1500) },
  { length: mm(2500), width: mm(1250) },
  { length: mm(2000), width: mm(1000) },
];
