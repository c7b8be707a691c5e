import type { ChartFrame } from "./chartFrame";

export const dashes = ["", "14 5", "4 5"] as const;

interface ChartLineProps {
  readonly frame: ChartFrame;
  readonly points: readonly (readonly [number, number])[];
  /** Told apart by its dashes first, by colour second. */
  readonly dash?: string;
  readonly stroke?: string;
}

export function ChartLine({ frame, points, dash = "", stroke = "var(--accent)" }: ChartLineProps) {
  const path = points.filter(([, y]) => Number.isFinite(y)).map((point, i) => {
    const [x, y] = frame.at(point);
    return `${i === 0 ? "M" : "L"}${x.toFixed(1)} ${y.toFixed(1)}`;
  }).join("");
  return <path d={path} fill="none" stroke={stroke} strokeWidth="2.5" strokeDasharray={dash} />;
}
