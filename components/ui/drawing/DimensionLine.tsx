import type { Vec2 } from "@/bending/geometry/vec2";

interface DimensionLineProps {
  /** On the sheet, in drawing units. */
  readonly from: Vec2;
  readonly to: Vec2;
  /** How far the dimension line stands off, to the left of from -> to as seen on the sheet; negative: right. */
  readonly offset: number;
  readonly label: string;
  readonly size?: number;
}

/** A dimension with its extension lines, slim arrows and its number above the line, as on a drawing. */
export function DimensionLine({ from, to, offset, label, size = 11 }: DimensionLineProps) {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  if (length < 1e-6) return null;
  const u: Vec2 = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  const n: Vec2 = [u[1], -u[0]];
  const on = (p: Vec2, along: number, off: number): Vec2 => [p[0] + u[0] * along + n[0] * off, p[1] + u[1] * along + n[1] * off];
  const sign = Math.sign(offset) || 1;
  const a = on(from, 0, offset);
  const b = on(to, 0, offset);
  const narrow = length < 26;
  const arrow = (tip: Vec2, way: number) => [tip, on(tip, 7 * way, 1.6), on(tip, 7 * way, -1.6)].map((p) => p.map((v) => v.toFixed(2)).join(",")).join(" ");
  const middle = on(from, length / 2, offset);
  const turned = (Math.atan2(u[1], u[0]) * 180) / Math.PI;
  // Read from below or from the right.
  const upright = turned > 89.9 || turned <= -90.1 ? turned + 180 : turned;
  const line = (p: Vec2, q: Vec2) => <line x1={p[0]} y1={p[1]} x2={q[0]} y2={q[1]} />;
  return (
    <g stroke="var(--ink-soft)" strokeWidth="0.7">
      {line(on(from, 0, 3 * sign), on(from, 0, offset + 4 * sign))}
      {line(on(to, 0, 3 * sign), on(to, 0, offset + 4 * sign))}
      {line(narrow ? on(a, -10, 0) : a, narrow ? on(b, 10, 0) : b)}
      <polygon points={arrow(a, narrow ? -1 : 1)} fill="var(--ink-soft)" stroke="none" />
      <polygon points={arrow(b, narrow ? 1 : -1)} fill="var(--ink-soft)" stroke="none" />
      <text transform={`translate(${middle[0].toFixed(2)} ${middle[1].toFixed(2)}) rotate(${upright.toFixed(2)})`} y={-3.5} textAnchor="middle" fontSize={size}
        className="num" style={{ fontSize: size }} fill="var(--ink)" stroke="var(--sheet)" strokeWidth="3" paintOrder="stroke">{label}</text>
    </g>
  );
}
