"use client";
import type { ReactNode } from "react";
import { arcToChords } from "@/bending/geometry/arcToChords";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { Loop } from "@/bending/exchange/dxf/contour/piece";
import type { LineRole } from "@/bending/exchange/dxf/import/lineGroup";
import type { FlatBendEntry } from "@/bending/part/partDocument";
import { DrawingSheet } from "@/components/ui/drawing/DrawingSheet";
import { fitView } from "@/components/ui/drawing/fitView";
import { pathOf } from "@/components/ui/drawing/pathOf";
import { bendLook } from "../drawing/bendLook";
import type { BendDraft } from "../draft/partDraft";
import type { FoundDrawing } from "./useDrawing";

interface DrawingPreviewProps {
  readonly found: FoundDrawing;
  /** Role of each line group, in the order of the groups. */
  readonly roles: readonly LineRole[];
  readonly bends: readonly { readonly entry: FlatBendEntry; readonly row: BendDraft }[];
  readonly selected: number | null;
  readonly onSelect: (index: number) => void;
  /** A place to look at, from the lists. */
  readonly place: Vec2 | null;
  readonly whole: boolean;
  readonly note: ReactNode;
}

const closed = (loop: Loop): readonly Vec2[] => loop.vertices.flatMap(([x, y, bulge], i): readonly Vec2[] => {
  const next = loop.vertices[(i + 1) % loop.vertices.length] ?? [x, y, 0];
  return [[x, y], ...arcToChords([x, y], [next[0], next[1]], bulge, 0.05).slice(0, -1)];
});

/** The drawing as it is read: contour and holes filled, bend lines by way, what was mended ringed, what is left over dashed. */
export function DrawingPreview({ found: { flat, paths }, roles, bends, selected, onSelect, place, whole, note }: DrawingPreviewProps) {
  const contours = [...(flat.outline ? [flat.outline] : []), ...flat.holes].map(closed);
  const cut = roles.flatMap((role, i) => (role === "cut" ? (paths[i] ?? []) : []));
  const span = whole || flat.outline === null ? (whole ? paths.flat(2) : cut.flat()) : contours[0];
  const view = fitView(boundsOf(span ?? []), { width: 640, maxHeight: 520, minHeight: 200, margin: [22, 22, 22, 22] });
  const open = (path: readonly Vec2[]) => path.map((p, i) => { const [x, y] = view.at(p); return `${i === 0 ? "M" : "L"}${x.toFixed(1)} ${y.toFixed(1)}`; }).join("");
  return (
    <DrawingSheet title="Drawing as read" width={view.width} height={view.height} live note={note}
      description={`Drawing with ${flat.outline ? "a closed contour" : "no closed contour"}, ${flat.holes.length} holes and ${flat.bends.length} bend lines`}>
      {roles.map((role, i) => (role === "leave out" ? <path key={i} d={(paths[i] ?? []).map(open).join("")} fill="none" stroke="var(--steel-400)" strokeWidth="0.6" /> : null))}
      {flat.outline === null
        ? <path d={cut.map(open).join("")} fill="none" stroke="var(--ink)" strokeWidth="1.1" />
        : <path d={pathOf(contours, view.at)} fillRule="evenodd" fill="var(--paper)" stroke="var(--ink)" strokeWidth="1.3" strokeLinejoin="round" />}
      {flat.leftovers.slice(0, 400).map(({ what, path }, i) => <path key={i} d={open(path)} fill="none" stroke="var(--brick)" strokeWidth="1.6" strokeDasharray="2 2"><title>{what}</title></path>)}
      {flat.singleLines.slice(0, 200).map((line, i) => <path key={i} d={open(line)} fill="none" stroke="var(--amber)" strokeWidth="1.6" />)}
      {flat.bends.map(({ line }, i) => {
        const bend = bends[i];
        const [a, b] = [view.at(line[0]), view.at(line[1])];
        const look = bendLook[bend?.row.direction ?? "up"];
        const name = `${bend?.entry.id ?? `b${i + 1}`} ${look.letter}${bend === undefined ? "" : ` ${bend.row.angle}°`}`;
        const chosen = i === selected;
        return (
          <g key={i} role="button" tabIndex={0} aria-label={`Bend line ${name}`} aria-pressed={chosen} className="group cursor-pointer outline-none" onClick={() => onSelect(i)}
            onKeyDown={(event) => { if (event.key === "Enter" || event.key === " ") { event.preventDefault(); onSelect(i); } }}>
            <line x1={a[0]} y1={a[1]} x2={b[0]} y2={b[1]} stroke="transparent" strokeWidth="14" />
            <line x1={a[0]} y1={a[1]} x2={b[0]} y2={b[1]} stroke="var(--accent)" strokeWidth={chosen ? 3.2 : 1.4} strokeDasharray={look.dash} className="group-hover:stroke-[3] group-focus-visible:stroke-[3]" />
            {chosen ? [a, b].map(([x, y], end) => <circle key={end} cx={x} cy={y} r="4" fill="var(--accent)" />) : null}
            {flat.bends.length > 24 && !chosen ? null : (
              <text x={(a[0] + b[0]) / 2 + 4} y={(a[1] + b[1]) / 2 - 4} className="num" fontWeight={chosen ? 600 : 400} fill="var(--accent-ink)" stroke="var(--paper)" strokeWidth="3" paintOrder="stroke" style={{ fontSize: 11 }}>{name}</text>
            )}
          </g>
        );
      })}
      {flat.repairs.slice(0, 200).map(({ at, message }, i) => { const [x, y] = view.at(at); return <circle key={i} cx={x} cy={y} r="5" fill="none" stroke="var(--amber)" strokeWidth="1.4"><title>{message}</title></circle>; })}
      {place === null ? null : <Cross at={view.at(place)} />}
    </DrawingSheet>
  );
}

function boundsOf(points: readonly Vec2[]): readonly Vec2[] {
  let [minX, minY, maxX, maxY] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const [x, y] of points) [minX, minY, maxX, maxY] = [Math.min(minX, x), Math.min(minY, y), Math.max(maxX, x), Math.max(maxY, y)];
  return points.length === 0 ? [] : [[minX, minY], [maxX, maxY]];
}

function Cross({ at: [x, y] }: { readonly at: Vec2 }) {
  return (
    <g stroke="var(--brick)" strokeWidth="1.6" fill="none" pointerEvents="none">
      <circle cx={x} cy={y} r="11" />
      <path d={`M${x - 18} ${y}h12M${x + 6} ${y}h12M${x} ${y - 18}v12M${x} ${y + 6}v12`} />
    </g>
  );
}
