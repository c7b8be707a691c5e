import { TEXT, type ChartFrame } from "./chartFrame";

interface ChartKeyProps {
  readonly frame: ChartFrame;
  readonly side: "left" | "right";
  readonly lines: readonly { readonly name: string; readonly dash: string; readonly stroke: string }[];
}

/** Which line is which, in the corner that the curves leave free. */
export function ChartKey({ frame, side, lines }: ChartKeyProps) {
  const x = side === "left" ? frame.left + 18 : frame.width - frame.right - 250;
  return (
    <g>
      <rect x={x - 10} y={frame.top + 2} width={252} height={lines.length * 25 + 10} fill="var(--sheet)" />
      {lines.map(({ name, dash, stroke }, i) => (
        <g key={name}>
          <line x1={x} x2={x + 44} y1={frame.top + 20 + i * 25} y2={frame.top + 20 + i * 25} stroke={stroke} strokeWidth="2.5" strokeDasharray={dash} />
          <text x={x + 54} y={frame.top + 26 + i * 25} style={{ fontSize: TEXT }} fill="var(--ink)">{name}</text>
        </g>
      ))}
    </g>
  );
}
