import { toDeg } from "@/bending/core/units";
import type { Tool } from "@/bending/tooling/tool";

/** The row of a tool, without its pieces. */
export function toolColumns(tool: Tool): Readonly<Record<string, unknown>> {
  const punch = tool.kind === "punch";
  return {
    code: tool.id,
    kind: tool.kind,
    name: tool.name,
    profile: JSON.stringify(tool.profile),
    angle_deg: roundedAngle(toDeg(punch ? tool.tipAngle : tool.vAngle)),
    tip_radius_mm: punch ? tool.tipRadius : null,
    v_opening_mm: punch ? null : tool.vOpening,
    shoulder_radius_mm: punch ? null : tool.shoulderRadius,
    flattening: !punch && tool.flattening ? JSON.stringify(tool.flattening) : null,
    height_mm: tool.height,
    max_force_kn_per_m: tool.maxForcePerMetre,
    tang: tool.tang,
  };
}

/** Degrees to radians and back leaves a last digit behind; a billionth of a degree is far under any grind. */
const roundedAngle = (angle: number): number => Math.round(angle * 1e9) / 1e9;
