"use client";
import type { ReactNode } from "react";
import type { LengthUnit } from "@/bending/core/units";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { FlatBendLine, FlatPattern } from "@/bending/part/flatPattern";
import type { Face } from "@/bending/part/partModel";
import type { PartPicking } from "@/components/preview/partPicking";
import { DimensionLine } from "@/components/ui/drawing/DimensionLine";
import { DrawingSheet } from "@/components/ui/drawing/DrawingSheet";
import { fitView, type View } from "@/components/ui/drawing/fitView";
import { pathOf } from "@/components/ui/drawing/pathOf";
import { formatAngle } from "@/lib/format/formatAngle";
import { formatLength } from "@/lib/format/formatLength";
import { bendLook } from "./bendLook";
import { EdgeButton } from "./EdgeButton";
import { PickFace } from "./PickFace";

interface FlatDrawingProps {
  readonly flat: FlatPattern;
  readonly units: LengthUnit;
  readonly stale?: boolean;
  /** What can be picked in it, where it is edited. */
  readonly picking?: { readonly faces: readonly Face[] } & PartPicking;
  /** Marks to draw over the sheet. */
  readonly over?: ((view: View) => ReactNode) | undefined;
}

/** The blank with its bend lines and overall size. */
export function FlatDrawing({ flat, units, stale = false, picking, over }: FlatDrawingProps) {
  const { min, max } = flat.bounds;
  const view = fitView([min, max], { width: 560, maxHeight: 400, minHeight: 150, margin: [56, 34, 30, 48] });
  const corner = (x: number, y: number): Vec2 => view.at([x, y]);
  return (
    <DrawingSheet title="Flat pattern" width={view.width} height={view.height} stale={stale} live={picking !== undefined}
      note={<><span className="num">{formatLength(flat.width, units, false)} × {formatLength(flat.depth, units)}</span>, base’s top side up</>}
      description={`Flat pattern, ${formatLength(flat.width, units)} by ${formatLength(flat.depth, units)}, ${flat.bendLines.length} bend lines`}>
      <path d={pathOf([flat.outline, ...flat.holes], view.at)} fillRule="evenodd" fill="var(--paper)" stroke="var(--ink)" strokeWidth="1.3" strokeLinejoin="round" />
      {picking?.faces.map((face) => <PickFace key={face.id} face={face} at={view.at} picked={picking.picked === face.id} onPick={picking.onFace} />)}
      {flat.bendLines.map((bend) => <BendLine key={bend.id} bend={bend} view={view} named={flat.bendLines.length <= 14} onPick={picking?.onBend} />)}
      <DimensionLine from={corner(min[0], min[1])} to={corner(max[0], min[1])} offset={-28} label={formatLength(flat.width, units, false)} />
      <DimensionLine from={corner(min[0], min[1])} to={corner(min[0], max[1])} offset={28} label={formatLength(flat.depth, units, false)} />
      {over?.(view)}
      {picking?.edges.map((edge) => <EdgeButton key={`${edge.face} ${edge.edge}`} edge={edge} at={view.at} onPick={picking.onEdge} />)}
    </DrawingSheet>
  );
}

interface BendLineProps {
  readonly bend: FlatBendLine;
  readonly view: View;
  readonly named: boolean;
  readonly onPick: ((bend: string) => void) | undefined;
}

function BendLine({ bend, view, named, onPick }: BendLineProps) {
  const [a, b] = [view.at(bend.line[0]), view.at(bend.line[1])];
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const turned = (Math.atan2(b[1] - a[1], b[0] - a[0]) * 180) / Math.PI;
  const upright = turned > 89.9 || turned <= -90.1 ? turned + 180 : turned;
  const look = bendLook[bend.direction];
  const label = `${bend.id} ${look.letter} ${formatAngle((bend.angle * 180) / Math.PI)}`;
  return (
    <g {...(onPick === undefined ? {} : { onClick: () => onPick(bend.id), className: "cursor-pointer" })}>
      {onPick === undefined ? null : <line x1={a[0]} y1={a[1]} x2={b[0]} y2={b[1]} stroke="transparent" strokeWidth="10" />}
      <line x1={a[0]} y1={a[1]} x2={b[0]} y2={b[1]} stroke="var(--accent)" strokeWidth="1.2" strokeDasharray={look.dash} />
      <text transform={`translate(${((a[0] + b[0]) / 2).toFixed(2)} ${((a[1] + b[1]) / 2).toFixed(2)}) rotate(${upright.toFixed(2)})`} y={-3} textAnchor="middle"
        className="num" fill="var(--accent-ink)" stroke="var(--paper)" strokeWidth="3" paintOrder="stroke" style={{ fontSize: 10 }}>
        {named && label.length * 6 < length ? label : `${look.letter} ${formatAngle((bend.angle * 180) / Math.PI)}`}
      </text>
    </g>
  );
}
