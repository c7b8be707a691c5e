import { mm, MM_PER_INCH } from "../core/units";
import { aluminiumRadii, aluminiumThicknesses, SAME_SHEET_MM, type AluminiumTemper } from "./aluminiumMinimumRadius";
import type { MinimumRadiusTable } from "./material";

/**
 * The Aluminum Association's smallest radii of one temper as a table by thickness in mm: between two printed thicknesses the next
 * thicker one, which is the cautious way. The rolling direction is not told apart.
 */
export function aluminiumRadiusTable(temper: AluminiumTemper): MinimumRadiusTable {
  return {
    as: "thickness",
    rows: aluminiumRadii[temper].map((across, column) => ({ upTo: mm(Math.round(((aluminiumThicknesses[column] ?? 0) * MM_PER_INCH + SAME_SHEET_MM) * 100) / 100), across, along: null })),
  };
}
