import type { PartModel } from "@/bending/part/partModel";
import type { Vec2 } from "@/bending/geometry/vec2";
import { boundsOf } from "@/lib/sheet/boundsOf";

interface FlatEvidenceProps {
  readonly part: PartModel;
  readonly bends: readonly string[];
  readonly faces: readonly string[];
  readonly className?: string;
}

const path = (loops: readonly (readonly Vec2[])[]): string => loops.map((loop) => `M${loop.map(([x, y]) => `${x} ${-y}`).join("L")}Z`).join("");

/** The unfolded sheet with some bends and faces marked and named. */
export function FlatEvidence({ part, bends, faces, className }: FlatEvidenceProps) {
  const flip = ([x, y]: Vec2): Vec2 => [x, -y];
  const [left, top, right, bottom] = boundsOf(part.faces.map((face) => face.outline.map(flip)));
  const size = Math.max(right - left, bottom - top);
  const margin = size * 0.06;
  return (
    <svg viewBox={[left - margin, top - margin, right - left + 2 * margin, bottom - top + 2 * margin].join(" ")} className={className} role="img" aria-label="The unfolded sheet">
      {part.faces.map((face) => (
        <path key={face.id} d={path([face.outline, ...face.holes])} fillRule="evenodd" fill={faces.includes(face.id) ? "var(--brick-wash)" : "var(--accent-wash)"} stroke="var(--steel-500)" vectorEffect="non-scaling-stroke" />
      ))}
      {part.bends.map((bend) => {
        const [from, to] = [flip(bend.line[0]), flip(bend.line[1])];
        const marked = bends.includes(bend.id);
        return (
          <g key={bend.id}>
            <path d={path([bend.zone])} fill="var(--steel-200)" />
            <line x1={from[0]} y1={from[1]} x2={to[0]} y2={to[1]} stroke={marked ? "var(--brick)" : "var(--ink-soft)"} strokeWidth={marked ? 3.5 : 1} strokeDasharray={marked ? undefined : "8 3 2 3"} vectorEffect="non-scaling-stroke" />
            <text x={(from[0] + to[0]) / 2} y={(from[1] + to[1]) / 2 - size * 0.01} fontSize={size * 0.03} textAnchor="middle" fontWeight={marked ? 700 : 400} fill={marked ? "var(--brick-ink)" : "var(--ink-soft)"}
              stroke="var(--sheet)" strokeWidth={size * 0.008} paintOrder="stroke">{bend.id}</text>
          </g>
        );
      })}
    </svg>
  );
}
