"use client";
import { useId } from "react";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { Face } from "@/bending/part/partModel";
import { pathOf } from "@/components/ui/drawing/pathOf";

interface PickFaceProps {
  readonly face: Face;
  readonly at: (point: Vec2) => Vec2;
  readonly picked: boolean;
  readonly onPick: (face: string) => void;
}

/** A face in the flat drawing, to click or to reach with Tab; the one being worked on is dotted, with a heavy outline. */
export function PickFace({ face, at, picked, onPick }: PickFaceProps) {
  const dots = useId();
  const d = pathOf([face.outline, ...face.holes], at);
  return (
    <g role="button" tabIndex={0} aria-label={`Work on ${face.id}`} aria-pressed={picked} className="group cursor-pointer outline-none" onClick={() => onPick(face.id)}
      onKeyDown={(event) => { if (event.key === "Enter" || event.key === " ") { event.preventDefault(); onPick(face.id); } }}>
      <title>{`Work on ${face.id}`}</title>
      <pattern id={dots} width="7" height="7" patternUnits="userSpaceOnUse"><circle cx="2" cy="2" r="1.1" fill="var(--accent)" /></pattern>
      <path d={d} fillRule="evenodd" fill={picked ? `url(#${dots})` : "transparent"} strokeLinejoin="round" strokeWidth={picked ? 3 : 2}
        className={picked ? "stroke-accent" : "stroke-transparent group-hover:stroke-accent group-focus-visible:stroke-accent"} />
    </g>
  );
}
