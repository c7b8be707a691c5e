import type { GaugeSystem } from "./gaugeThickness";
import type { MaterialGroup } from "./material";

/** Whose gauge numbers a material is sold by; null for copper and brass, which are named by their thickness or weight. */
export function gaugeSystemOf(group: MaterialGroup): GaugeSystem | null {
  return group === "steel" || group === "stainless" || group === "aluminium" ? group : null;
}
