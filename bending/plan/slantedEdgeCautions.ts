import { formatBends } from "./formatBends";
import type { PlanReason, PlanStep } from "./planDocument";

/** Steps gauged with two fingers at different depths: a slanted edge slides along them, so nothing holds the sheet along the bed. */
export function slantedEdgeCautions(steps: readonly PlanStep[]): readonly PlanReason[] {
  return steps.flatMap(({ bends, gauge: { fingers, face } }): readonly PlanReason[] => {
    const [one, other] = fingers;
    if (!one || !other || one.x === other.x) return [];
    return [{
      kind: "gauge", bends, faces: [face], tools: [],
      message: `${formatBends(bends)}: the fingers stand at two depths on a slanted edge, along which the sheet can slide; use a side stop, or each part comes out at another depth`,
    }];
  });
}
