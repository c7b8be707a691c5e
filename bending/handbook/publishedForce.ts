import { kiloNewtonPerMetre, type KiloNewtonPerMetre, type Mm, type MPa } from "../core/units";
import type { ForceForm } from "./forceForms";

/**
 * Force for each metre of bend by one published form. A form that was printed for one steel goes with the strength over
 * that steel's. `opening` is the V, or for wiping the die's gap D.
 */
export function publishedForce(form: ForceForm, tensile: MPa, thickness: Mm, opening: Mm): KiloNewtonPerMetre {
  return kiloNewtonPerMetre(((form.factor + (form.perRatio * thickness) / opening) * tensile * thickness * thickness) / opening);
}
