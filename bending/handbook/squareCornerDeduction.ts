import { mm, type Mm } from "../core/units";

/** Part of the thickness that each bend takes off, by how the corner is made; 1.67 is printed for 5/3. */
export const squareCorners = { "v-die": 5 / 3, drawn: 1.33 } as const;

/**
 * What `bends` nearly square corners take off the sum of the outside sizes: X = 1.67 B G in a V die, 1.33 B G drawn or
 * rolled, B bends of gauge G (Machinery's Handbook, from memory; its table goes by 5/3).
 */
export function squareCornerDeduction(bends: number, thickness: Mm, corner: keyof typeof squareCorners): Mm {
  return mm(squareCorners[corner] * bends * thickness);
}
