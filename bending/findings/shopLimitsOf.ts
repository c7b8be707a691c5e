import { toDeg } from "../core/units";
import type { Machine } from "../tooling/machine";
import type { Tool } from "../tooling/tool";
import type { DieLimit, PunchLimit, ShopLimits, StockSheet } from "./shopLimits";

/** What tools and machines can do, taken from their full descriptions; tools without a piece in service do not count. */
export function shopLimitsOf(tools: readonly Tool[], machines: readonly Machine[], stock: readonly StockSheet[]): ShopLimits {
  const serving = tools.filter(({ pieces }) => pieces.length > 0);
  return {
    dies: serving.flatMap((tool): readonly DieLimit[] => (tool.kind === "die"
      ? [{ id: tool.id, vOpening: tool.vOpening, vAngle: toDeg(tool.vAngle), shoulderRadius: tool.shoulderRadius, maxForcePerMetre: tool.maxForcePerMetre }] : [])),
    punches: serving.flatMap((tool): readonly PunchLimit[] => (tool.kind === "punch"
      ? [{ id: tool.id, tipAngle: toDeg(tool.tipAngle), tipRadius: tool.tipRadius, maxForcePerMetre: tool.maxForcePerMetre }] : [])),
    machines: machines.map(({ name, bedLength, betweenFrames, throatDepth, maxForce, settings }) => ({ name, bedLength, betweenFrames, throatDepth, maxForce, maxUncoveredEnd: settings.maxUncoveredEnd })),
    stock,
    flattening: serving.flatMap((tool) => (tool.kind === "die" && tool.flattening ? [tool.name] : [])),
  };
}
