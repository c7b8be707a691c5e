"use client";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { FaceEdge } from "@/components/preview/partPicking";

interface EdgeButtonProps {
  readonly edge: FaceEdge;
  readonly at: (point: Vec2) => Vec2;
  readonly onPick: (edge: FaceEdge) => void;
}

/** A free edge in the flat drawing, to click or to reach with Tab: adds a flange there. */
export function EdgeButton({ edge, at, onPick }: EdgeButtonProps) {
  const [a, b] = [at(edge.line[0]), at(edge.line[1])];
  const name = `Add a flange on ${edge.face}, edge ${edge.edge}`;
  return (
    <g role="button" tabIndex={0} aria-label={name} className="group cursor-pointer outline-none" onClick={() => onPick(edge)}
      onKeyDown={(event) => { if (event.key === "Enter" || event.key === " ") { event.preventDefault(); onPick(edge); } }}>
      <title>{name}</title>
      <line x1={a[0]} y1={a[1]} x2={b[0]} y2={b[1]} stroke="transparent" strokeWidth="14" />
      <line x1={a[0]} y1={a[1]} x2={b[0]} y2={b[1]} className="stroke-transparent group-hover:stroke-accent group-focus-visible:stroke-accent" strokeWidth="4" />
      <circle cx={(a[0] + b[0]) / 2} cy={(a[1] + b[1]) / 2} r="6" className="fill-sheet stroke-accent group-hover:fill-accent group-focus-visible:fill-accent" strokeWidth="1.2" />
      <path d={`M${(a[0] + b[0]) / 2 - 3} ${(a[1] + b[1]) / 2}h6m-3 -3v6`} className="stroke-accent group-hover:stroke-accent-on group-focus-visible:stroke-accent-on" strokeWidth="1.3" />
    </g>
  );
}
