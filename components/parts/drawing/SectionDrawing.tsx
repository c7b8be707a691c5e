"use client";
import { useId } from "react";
import type { LengthUnit } from "@/bending/core/units";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { DimensionKind } from "@/bending/part/partDocument";
import type { PartModel } from "@/bending/part/partModel";
import { DimensionLine } from "@/components/ui/drawing/DimensionLine";
import { DrawingSheet } from "@/components/ui/drawing/DrawingSheet";
import { fitView, type View } from "@/components/ui/drawing/fitView";
import { Hatch } from "@/components/ui/drawing/Hatch";
import { formatAngle } from "@/lib/format/formatAngle";
import { formatLength } from "@/lib/format/formatLength";
import { crossSection, type CrossSection, type SectionBend, type SectionLeg } from "./crossSection";
import { sectionPath } from "./sectionPath";

interface SectionDrawingProps {
  readonly part: PartModel;
  readonly units: LengthUnit;
  readonly dimension: DimensionKind;
  readonly stale?: boolean;
}

const step = (p: Vec2, way: Vec2, by: number): Vec2 => [p[0] + way[0] * by, p[1] + way[1] * by];

/** How far a leg's dimension reaches past its tangent point, into the bend. */
function setback(bend: SectionBend | undefined, thickness: number, kind: DimensionKind): number {
  if (bend === undefined || kind === "tangent") return 0;
  const radius = bend.insideRadius + (kind === "outside" ? thickness : 0);
  const angle = Math.abs(bend.turn);
  return angle <= Math.PI / 2 + 1e-9 ? radius * Math.tan(angle / 2) : radius;
}

/** The cross-section, cut and hatched, with each leg's dimension and each bend's angle. */
export function SectionDrawing({ part, units, dimension, stale = false }: SectionDrawingProps) {
  const hatch = useId();
  const section = crossSection(part);
  if (section === null) return null;
  const view = fitView(section.legs.flatMap((leg) => [leg.from, leg.to]), { width: 560, maxHeight: 330, minHeight: 190, margin: [64, 52, 64, 52] });
  return (
    <DrawingSheet title="Section" note={`dimensions ${dimension}, ${units}`} width={view.width} height={view.height} stale={stale}
      description={`Cross-section with ${section.legs.length} legs and ${section.bends.length} bends`}>
      <defs><Hatch id={hatch} /></defs>
      <path d={sectionPath(section, view.at, view.scale)} fill={`url(#${hatch})`} stroke="var(--ink)" strokeWidth="1.4" strokeLinejoin="round" />
      {section.legs.map((leg, i) => <LegDimension key={leg.face} section={section} index={i} view={view} units={units} kind={dimension} />)}
      {section.bends.map((bend) => {
        const middle = bend.startHeading + bend.turn / 2 - (Math.sign(bend.turn) * Math.PI) / 2;
        const [x, y] = view.at(step(bend.centre, [Math.cos(middle), Math.sin(middle)], bend.insideRadius - 17 / view.scale));
        return <text key={bend.id} x={x} y={y + 4} textAnchor="middle" className="num" style={{ fontSize: 11 }} fill="var(--accent-ink)" stroke="var(--sheet)" strokeWidth="3" paintOrder="stroke">
          {formatAngle(Math.abs(bend.turn) * 180 / Math.PI)}</text>;
      })}
    </DrawingSheet>
  );
}

/** The side of a leg, left (1) or right (-1), on which less of the section lies. */
function awayFromMiddle({ legs }: CrossSection, leg: SectionLeg): 1 | -1 {
  const sum = legs.reduce((total, one) => total + ((one.from[0] + one.to[0]) / 2 - leg.from[0]) * leg.left[0] + ((one.from[1] + one.to[1]) / 2 - leg.from[1]) * leg.left[1], 0);
  return sum > 0 ? -1 : 1;
}

function LegDimension({ section, index, view, units, kind }: { readonly section: CrossSection; readonly index: number; readonly view: View; readonly units: LengthUnit; readonly kind: DimensionKind }) {
  const leg = section.legs[index];
  if (leg === undefined) return null;
  const before = section.bends[index - 1];
  const after = section.bends[index];
  const mixed = before !== undefined && after !== undefined && Math.sign(before.turn) !== Math.sign(after.turn);
  const outward = mixed ? awayFromMiddle(section, leg) : -Math.sign(after?.turn ?? before?.turn ?? 1);
  const side = (section.thickness / 2) * outward;
  const from = step(step(leg.from, leg.along, -setback(before, section.thickness, kind)), leg.left, side);
  const to = step(step(leg.to, leg.along, setback(after, section.thickness, kind)), leg.left, side);
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  return <DimensionLine from={view.at(from)} to={view.at(to)} offset={(mixed ? 46 : 24) * outward} label={formatLength(length, units, false)} />;
}
