import { TEXT, type ChartFrame } from "./chartFrame";

/** A limit across the whole chart, named above its right end. */
export function ChartLimit({ frame, y, label }: { readonly frame: ChartFrame; readonly y: number; readonly label: string }) {
  const [x0, at] = frame.at([frame.x[0], y]);
  return (
    <g>
      <line x1={x0} x2={frame.width - frame.right} y1={at} y2={at} stroke="var(--brick)" strokeWidth="2" strokeDasharray="9 4 2 4" />
      <text x={frame.width - frame.right - 6} y={at - 7} textAnchor="end" style={{ fontSize: TEXT }} fill="var(--brick-ink)" stroke="var(--sheet)" strokeWidth="4" paintOrder="stroke">{label}</text>
    </g>
  );
}
