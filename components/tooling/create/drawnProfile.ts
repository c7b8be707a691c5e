import { deg, mm, toRad } from "@/bending/core/units";
import type { Vec2 } from "@/bending/geometry/vec2";
import { relievedPunchProfile } from "@/bending/tooling/relievedPunchProfile";
import { straightPunchProfile } from "@/bending/tooling/straightPunchProfile";
import { hemDieProfile } from "@/bending/tooling/hemDieProfile";
import { vDieProfile, type VDieShape } from "@/bending/tooling/vDieProfile";
import { formatNumber } from "@/lib/format/formatNumber";
import { parseAngle } from "@/lib/format/parseAngle";
import { parseNumber } from "@/lib/format/parseNumber";
import { parseLength } from "@/lib/format/parseLength";
import type { ToolDraft } from "./toolDraft";

/** Corners drawn from the sizes typed, as text to go on from; null when a size cannot be read. */
export function drawnProfile(draft: ToolDraft, relieved: boolean): string | null {
  const angle = parseAngle(draft.angle);
  const [radius, height, width, opening] = [draft.radius, draft.height, draft.bodyWidth, draft.vOpening].map((text) => parseLength(text, "mm"));
  if (!angle.ok || radius?.ok !== true || height?.ok !== true || width?.ok !== true) return null;
  const turned = toRad(deg(angle.value));
  const common = { height: mm(height.value), bodyWidth: mm(width.value) };
  const points: readonly Vec2[] | null = draft.kind === "die"
    ? (opening?.ok === true ? dieProfile(draft, { vOpening: mm(opening.value), vAngle: turned, shoulderRadius: mm(radius.value), ...common }) : null)
    : relieved
      ? relievedPunchProfile({ tipAngle: turned, tipRadius: mm(radius.value), reliefDepth: mm(8), reliefHeight: mm(height.value * 0.4), ...common })
      : straightPunchProfile({ tipAngle: turned, tipRadius: mm(radius.value), ...common });
  return points === null ? null : points.map(([x, y]) => `${formatNumber(x, 3)} ${formatNumber(y, 3)}`).join("\n");
}

/** A plain V, or one over a slot that flattens; null when the slot's sizes cannot be read. */
function dieProfile(draft: ToolDraft, shape: VDieShape): readonly Vec2[] | null {
  if (!draft.flattens) return vDieProfile(shape);
  const [floor, back, opening] = [parseLength(draft.slotFloor, "mm"), parseNumber(draft.slotBack), parseLength(draft.slotOpening, "mm")];
  return floor.ok && back.ok && opening.ok ? hemDieProfile(shape, { floor: mm(floor.value), back: mm(back.value), opening: mm(opening.value) }) : null;
}
