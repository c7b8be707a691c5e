"use client";
import { useId } from "react";
import type { Vec2 } from "@/bending/geometry/vec2";
import { DimensionLine } from "@/components/ui/drawing/DimensionLine";
import { DrawingSheet } from "@/components/ui/drawing/DrawingSheet";
import { fitView } from "@/components/ui/drawing/fitView";
import { Hatch } from "@/components/ui/drawing/Hatch";
import { pathOf } from "@/components/ui/drawing/pathOf";
import { formatAngle } from "@/lib/format/formatAngle";
import { formatLength } from "@/lib/format/formatLength";

export interface DrawnTool {
  readonly kind: "punch" | "die";
  readonly profile: readonly Vec2[];
  readonly heightMm: number;
  readonly angleDeg: number;
  readonly radiusMm: number;
  readonly vOpeningMm: number | null;
}

/** A tool's cross-section, cut and hatched, with the sizes that the fit rules use. */
export function ToolDrawing({ tool, stale = false }: { readonly tool: DrawnTool; readonly stale?: boolean }) {
  const hatch = useId();
  const view = fitView(tool.profile, { width: 420, maxHeight: 460, minHeight: 220, margin: [76, 56, 76, 48] });
  const xs = tool.profile.map(([x]) => x);
  const [left, right] = [Math.min(...xs), Math.max(...xs)];
  const ys = tool.profile.map(([, y]) => y);
  const [low, high] = [Math.min(...ys), Math.max(...ys)];
  const seat = tool.kind === "punch" ? tool.heightMm : -tool.heightMm;
  const tip = view.at([0, 0]);
  const says = `${tool.kind === "punch" ? "tip" : "V"} ${formatAngle(tool.angleDeg)}, R ${formatLength(tool.radiusMm, "mm", false)}`;
  return (
    <DrawingSheet title="Cross-section" note="mm, operator’s side on the left" width={view.width} height={view.height} stale={stale}
      description={`Cross-section of the ${tool.kind}, ${formatLength(tool.heightMm, "mm")} high, ${says}`}>
      <defs><Hatch id={hatch} /></defs>
      <path d={pathOf([tool.profile], view.at)} fill={`url(#${hatch})`} stroke="var(--ink)" strokeWidth="1.3" strokeLinejoin="round" />
      <line x1={tip[0]} x2={tip[0]} y1={view.at([0, high])[1] - 12} y2={view.at([0, low])[1] + 12} stroke="var(--accent)" strokeWidth="0.8" strokeDasharray="12 3 2 3" />
      <DimensionLine from={view.at([left, Math.min(0, seat)])} to={view.at([left, Math.max(0, seat)])} offset={34} label={formatLength(tool.heightMm, "mm", false)} />
      <DimensionLine from={view.at([left, low])} to={view.at([right, low])} offset={tool.kind === "die" ? -26 : -26} label={formatLength(right - left, "mm", false)} />
      {tool.kind === "die" && tool.vOpeningMm !== null ? (
        <DimensionLine from={view.at([-tool.vOpeningMm / 2, 0])} to={view.at([tool.vOpeningMm / 2, 0])} offset={24} label={`V ${formatLength(tool.vOpeningMm, "mm", false)}`} />
      ) : null}
      <text x={view.width - 10} y={18} textAnchor="end" className="num" style={{ fontSize: 12 }} fill="var(--accent-ink)">{says}</text>
    </DrawingSheet>
  );
}
