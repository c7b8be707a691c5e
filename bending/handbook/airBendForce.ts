import { kiloNewtonPerMetre, type KiloNewtonPerMetre, type MPa, type Mm } from "../core/units";

/** The formula holds for V openings between these times the thickness. */
export const FORCE_V_RANGE: readonly [number, number] = [5, 20];

/**
 * Air-bending force for each metre of bend: F / L = (1 + 4 t / V) Rm t² / V.
 * Oehler, quoted with Lange, Umformtechnik vol. 3 (1990), for 5 <= V / t <= 20; other published forms give up
 * to 20 % less.
 */
export function airBendForce(tensile: MPa, thickness: Mm, vOpening: Mm): KiloNewtonPerMetre {
  return kiloNewtonPerMetre(((1 + (4 * thickness) / vOpening) * tensile * thickness * thickness) / vOpening);
}
