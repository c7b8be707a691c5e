import type { KgPerCubicMetre, Mm } from "../core/units";
import { LOAD_CONSTANT_KG } from "./liftingLimit";

/** Square metres of sheet that weigh a limit (in kg; usual: the NIOSH load constant of 23 kg, before its multipliers). */
export function onePersonArea(thickness: Mm, density: KgPerCubicMetre, limit: number = LOAD_CONSTANT_KG): number {
  return limit / (density * (thickness / 1000));
}
