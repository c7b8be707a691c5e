import type { Mm } from "../core/units";
import type { ShopPlace } from "./shopAnswer";

/** A value on its way: what places say about the thickness and angle asked for. */
export interface ShopPoint {
  readonly k: number;
  readonly radius: Mm;
  readonly deduction: Mm;
  /** Of the deduction, mm squared. */
  readonly variance: number;
  readonly spread: Mm | null;
  readonly places: readonly ShopPlace[];
}
