"use client";
import { useId } from "react";
import type { Finding, FindingMark } from "@/bending/findings/finding";
import { polygonBounds } from "@/bending/geometry/polygonBounds";
import type { Vec2 } from "@/bending/geometry/vec2";
import type { View } from "@/components/ui/drawing/fitView";
import { pathOf } from "@/components/ui/drawing/pathOf";
import { severityLook } from "./severityLook";

interface FindingMarksProps {
  readonly findings: readonly Finding[];
  readonly selected: string | null;
  readonly onSelect: (key: string | null) => void;
  readonly view: View;
}

/** More signs than this hide the drawing. */
const SIGNS_MOST = 30;

/** Findings on the flat: a sign at each, and the selected one with its outline thick and hatched. */
export function FindingMarks({ findings, selected, onSelect, view }: FindingMarksProps) {
  const pattern = useId();
  const chosen = findings.find(({ key }) => key === selected);
  const taken = new Map<string, number>();
  return (
    <g>
      {chosen === undefined ? null : (
        <g data-marks-of={chosen.key}>
          <pattern id={pattern} width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(-45)">
            <path d="M0 0v7" stroke={severityLook[chosen.severity].colour} strokeWidth="2.6" strokeOpacity="0.7" />
          </pattern>
          {chosen.marks.map((mark, i) => <MarkShape key={i} mark={mark} at={view.at} fill={`url(#${pattern})`} colour={severityLook[chosen.severity].colour} />)}
        </g>
      )}
      {findings.slice(0, SIGNS_MOST).map((finding) => {
        const first = finding.marks[0];
        if (first === undefined) return null;
        const [x, y] = signAt(first, view.at);
        // Signs on one spot stand side by side.
        const spot = `${Math.round(x / 12)} ${Math.round(y / 12)}`;
        const beside = taken.get(spot) ?? 0;
        taken.set(spot, beside + 1);
        return <Sign key={finding.key} finding={finding} x={x + beside * 15} y={y} selected={finding.key === selected} onPick={() => onSelect(finding.key === selected ? null : finding.key)} />;
      })}
    </g>
  );
}

function MarkShape({ mark, at, fill, colour }: { readonly mark: FindingMark; readonly at: (p: Vec2) => Vec2; readonly fill: string; readonly colour: string }) {
  switch (mark.kind) {
    case "region": return <path d={pathOf([mark.outline], at)} fill={fill} stroke={colour} strokeWidth="2.4" strokeLinejoin="round" />;
    case "line": {
      const [[x1, y1], [x2, y2]] = [at(mark.from), at(mark.to)];
      return <g stroke={colour} strokeLinecap="round"><line x1={x1} y1={y1} x2={x2} y2={y2} strokeWidth="3.4" /><line x1={x1} y1={y1} x2={x2} y2={y2} stroke="var(--paper)" strokeWidth="1.2" strokeDasharray="2 5" /></g>;
    }
    case "point": {
      const [x, y] = at(mark.at);
      return <circle cx={x} cy={y} r="7" fill="none" stroke={colour} strokeWidth="2.4" />;
    }
    default: return mark satisfies never;
  }
}

/** An octagon stops, a triangle cautions, a circle notes. */
function Sign({ finding, x, y, selected, onPick }: { readonly finding: Finding; readonly x: number; readonly y: number; readonly selected: boolean; readonly onPick: () => void }) {
  const { colour, word } = severityLook[finding.severity];
  const paint = { fill: selected ? colour : "var(--sheet)", stroke: colour, strokeWidth: 1.5 };
  return (
    <g transform={`translate(${x.toFixed(1)} ${y.toFixed(1)})`} className="cursor-pointer" onClick={onPick}>
      <title>{`${word}: ${finding.title}`}</title>
      <circle r="11" fill="transparent" />
      {finding.severity === "stop" ? <path d="M-2.9 -7h5.8l4.1 4.1v5.8l-4.1 4.1h-5.8l-4.1 -4.1v-5.8z" {...paint} /> : null}
      {finding.severity === "caution" ? <path d="M0 -7.5L7.5 6H-7.5z" strokeLinejoin="round" {...paint} /> : null}
      {finding.severity === "note" ? <circle r="6.5" {...paint} /> : null}
      <path d={finding.severity === "caution" ? "M0 -3v4.4m0 1.6v.6" : finding.severity === "stop" ? "M0 -4.2v4.8m0 1.9v.7" : "M0 -3.2v.6m0 1.8v4"} stroke={selected ? "var(--sheet)" : colour} strokeWidth="1.6" fill="none" />
    </g>
  );
}

/** Where its sign stands, in drawing units: beside a small thing, in a large one, off the middle where names and handles are. */
function signAt(mark: FindingMark, at: (p: Vec2) => Vec2): Vec2 {
  switch (mark.kind) {
    case "point": return beside(at(mark.at));
    case "line": return at([mark.from[0] + (mark.to[0] - mark.from[0]) * 0.2, mark.from[1] + (mark.to[1] - mark.from[1]) * 0.2]);
    case "region": {
      const { min, max } = polygonBounds(mark.outline);
      const [[left, low], [right, high]] = [at(min), at(max)];
      const small = right - left < 26 && low - high < 26;
      return small ? beside([right, high]) : [left + (right - left) * 0.2, low + (high - low) * (low - high > right - left ? 0.2 : 0.5)];
    }
    default: return mark satisfies never;
  }
}

const beside = ([x, y]: Vec2): Vec2 => [x + 9, y - 9];
