import { kiloNewtonPerMetre, MM_PER_INCH, type Mm } from "../core/units";
import { SHORT_TON_PER_FOOT } from "./forceForms";
import type { ForceRange } from "./methodForceRange";

/** Short tons a foot for each inch of thickness, air and bottoming; lowest and highest where the chart gives both. */
export const chartForces = {
  v: { air: [60, 60], bottoming: [150, 150] },
  channel: { air: [225, 225], bottoming: [300, 300] },
  hat: { air: [300, 300], bottoming: [450, 450] },
  offset: { air: [150, 150], bottoming: [300, 600] },
} as const satisfies Record<string, Readonly<Record<"air" | "bottoming", readonly [number, number]>>>;

/** Rough force of a shape made in one stroke, in proportion to the thickness (trade chart, mild steel). */
export function chartForce(shape: keyof typeof chartForces, method: "air" | "bottoming", thickness: Mm): ForceRange {
  const perThickness = SHORT_TON_PER_FOOT / MM_PER_INCH;
  const [lowest, highest] = chartForces[shape][method];
  return {
    lowest: kiloNewtonPerMetre(lowest * perThickness * thickness),
    highest: kiloNewtonPerMetre(highest * perThickness * thickness),
  };
}
