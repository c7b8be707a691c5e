import { kiloNewtonPerMetre, type KiloNewtonPerMetre } from "../core/units";
import { defaultMethodFactors, type BendMethod, type MethodFactors } from "./forceMethods";

/** Air-bend force carried over to a method by a factor (see `publishedMethodFactors` for how far the sources part). */
export function forceByMethod(air: KiloNewtonPerMetre, method: BendMethod, factors: MethodFactors = defaultMethodFactors): KiloNewtonPerMetre {
  return kiloNewtonPerMetre(air * factors[method]);
}
