import type { KgPerCubicMetre, Mm } from "../core/units";

const MM3_PER_M3 = 1e9;

/** Mass of a rectangular sheet in kilograms. Nominal thickness gives nominal mass. */
export function sheetMass(width: Mm, depth: Mm, thickness: Mm, density: KgPerCubicMetre): number {
  return (width * depth * thickness * density) / MM3_PER_M3;
}
