import { mm, type Mm } from "../core/units";
import type { RadiusRule } from "./radiusRules";

/** Natural inside radius over a V by one published rule, lowest and highest. */
export function radiusByRule(rule: RadiusRule, vOpening: Mm): readonly [Mm, Mm] {
  return [mm(rule.ratio[0] * vOpening), mm(rule.ratio[1] * vOpening)];
}
