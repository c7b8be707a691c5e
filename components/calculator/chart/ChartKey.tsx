import { TEXT, type ChartFrame } from "./chartFrame";

interface ChartKeyProps {
  readonly frame: ChartFrame;
  readonly lines: readonly { readonly name: string; readonly dash: string; readonly stroke: string }[];
}

/** About how wide a letter is, in parts of its size. */
const LETTER = 0.52;

/** Which line is which, over the plot and to the right, where no curve and no limit runs. */
export function ChartKey({ frame, lines }: ChartKeyProps) {
  const widths = lines.map(({ name }) => 52 + name.length * TEXT * LETTER + 18);
  const start = frame.width - frame.right - widths.reduce((sum, width) => sum + width, 0);
  return (
    <g>
      {lines.map(({ name, dash, stroke }, i) => {
        const x = start + widths.slice(0, i).reduce((sum, width) => sum + width, 0);
        return (
          <g key={name}>
            <line x1={x} x2={x + 44} y1={frame.top - 20} y2={frame.top - 20} stroke={stroke} strokeWidth="2.5" strokeDasharray={dash} />
            <text x={x + 52} y={frame.top - 14} style={{ fontSize: TEXT }} fill="var(--ink)">{name}</text>
          </g>
        );
      })}
    </g>
  );
}
