import type { MaterialAllowance, MaterialGroup } from "./material";

/** The rule of a group where a material says nothing else: steel and stainless by DIN 6935, everything else by the straight-length formulas. */
export function materialRule(group: MaterialGroup): MaterialAllowance {
  return { rule: group === "steel" || group === "stainless" ? "din6935" : "machinery" };
}
