import type { LengthUnit } from "@/bending/core/units";
import type { FlatPattern } from "@/bending/part/flatPattern";
import { DrawingSheet } from "@/components/ui/drawing/DrawingSheet";
import { fitView } from "@/components/ui/drawing/fitView";
import { pathOf } from "@/components/ui/drawing/pathOf";
import { formatLength } from "@/lib/format/formatLength";

interface FlatsOverlaidProps {
  readonly older: FlatPattern;
  readonly newer: FlatPattern;
  readonly names: readonly [string, string];
  readonly units: LengthUnit;
}

/** Two flats on one sheet, the base at the same place: the newer filled and solid, the older dashed. */
export function FlatsOverlaid({ older, newer, names, units }: FlatsOverlaidProps) {
  const view = fitView([older.bounds.min, older.bounds.max, newer.bounds.min, newer.bounds.max], { width: 720, maxHeight: 520, minHeight: 150, margin: [24, 40, 24, 24] });
  const size = ({ width, depth }: FlatPattern) => `${formatLength(width, units, false)} × ${formatLength(depth, units)}`;
  return (
    <DrawingSheet title="Flat patterns, drawn over each other" note={<span className="num">{size(older)} before, {size(newer)} now</span>} width={view.width} height={view.height}
      description={`The flat of ${names[1]}, ${size(newer)}, over the flat of ${names[0]}, ${size(older)}`}>
      <path d={pathOf([newer.outline, ...newer.holes], view.at)} fillRule="evenodd" fill="var(--accent-wash)" stroke="var(--accent)" strokeWidth="1.6" strokeLinejoin="round" />
      <Lines flat={newer} at={view.at} colour="var(--accent)" />
      <path d={pathOf([older.outline, ...older.holes], view.at)} fill="none" stroke="var(--ink)" strokeWidth="1.1" strokeDasharray="6 4" strokeLinejoin="round" />
      <Lines flat={older} at={view.at} colour="var(--ink)" dash="6 4" />
      {names.map((name, i) => (
        <g key={name} transform={`translate(${24 + i * 170} 18)`}>
          <line x1="0" y1="-4" x2="34" y2="-4" stroke={i === 0 ? "var(--ink)" : "var(--accent)"} strokeWidth={i === 0 ? 1.1 : 1.6} strokeDasharray={i === 0 ? "6 4" : undefined} />
          <text x="42" fill="var(--ink)" style={{ fontSize: 12 }}>{name}</text>
        </g>
      ))}
    </DrawingSheet>
  );
}

function Lines({ flat, at, colour, dash }: { readonly flat: FlatPattern; readonly at: ReturnType<typeof fitView>["at"]; readonly colour: string; readonly dash?: string }) {
  return flat.bendLines.map(({ id, line }) => {
    const [a, b] = [at(line[0]), at(line[1])];
    return <line key={id} x1={a[0]} y1={a[1]} x2={b[0]} y2={b[1]} stroke={colour} strokeWidth="0.8" strokeDasharray={dash} />;
  });
}
