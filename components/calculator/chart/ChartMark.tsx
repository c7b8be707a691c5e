import { TEXT, type ChartFrame } from "./chartFrame";

interface ChartMarkProps {
  readonly frame: ChartFrame;
  readonly at: readonly [number, number];
  readonly label: string;
  readonly shape: "ring" | "square" | "cross";
  readonly side?: "left" | "right";
  /** Height of the label on the sheet, where it would lie on a curve beside its point. */
  readonly labelY?: number;
  readonly ink?: string;
}

/** A point worth naming. */
export function ChartMark({ frame, at, label, shape, side = "right", labelY, ink = "var(--ink)" }: ChartMarkProps) {
  const [x, y] = frame.at(at);
  return (
    <g stroke={ink} strokeWidth="2.2" fill="var(--sheet)">
      {shape === "ring" ? <circle cx={x} cy={y} r="6" /> : shape === "square" ? <rect x={x - 5} y={y - 5} width="10" height="10" /> : <path d={`M${x - 6} ${y - 6}l12 12m0 -12l-12 12`} fill="none" />}
      <text x={x + (side === "right" ? 12 : -12)} y={labelY ?? y + 6} textAnchor={side === "right" ? "start" : "end"} style={{ fontSize: TEXT }} fill={ink} stroke="var(--sheet)" strokeWidth="4" paintOrder="stroke">{label}</text>
    </g>
  );
}
