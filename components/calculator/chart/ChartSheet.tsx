import type { ReactNode } from "react";
import { DrawingSheet } from "@/components/ui/drawing/DrawingSheet";
import { niceTicks } from "@/lib/calculator/niceTicks";
import { formatNumber } from "@/lib/format/formatNumber";
import { TEXT, type ChartFrame } from "./chartFrame";

interface ChartSheetProps {
  readonly title: string;
  readonly note?: ReactNode;
  readonly description: string;
  readonly frame: ChartFrame;
  /** With units, as "V opening, mm". */
  readonly xLabel: string;
  readonly yLabel: string;
  readonly children: ReactNode;
}

/** A chart on a drawing sheet: axes with round ticks and units, large enough to be read across a bench. */
export function ChartSheet({ title, note, description, frame, xLabel, yLabel, children }: ChartSheetProps) {
  const { width, height, left, right, top, bottom, x, y, at } = frame;
  const [x0, y0] = [left, height - bottom];
  return (
    <DrawingSheet title={title} note={note} width={width} height={height} description={description}>
      {niceTicks(y[0], y[1]).map((tick) => {
        const [, ty] = at([x[0], tick]);
        return <g key={tick}><line x1={x0} x2={width - right} y1={ty} y2={ty} stroke="var(--rule)" strokeWidth="1" /><text x={x0 - 8} y={ty + 6} textAnchor="end" className="num" style={{ fontSize: TEXT }} fill="var(--ink)">{formatNumber(tick, 4)}</text></g>;
      })}
      {niceTicks(x[0], x[1], 8).map((tick) => {
        const [tx] = at([tick, y[0]]);
        return <g key={tick}><line x1={tx} x2={tx} y1={y0} y2={y0 + 6} stroke="var(--ink)" strokeWidth="1.2" /><text x={tx} y={y0 + 24} textAnchor="middle" className="num" style={{ fontSize: TEXT }} fill="var(--ink)">{formatNumber(tick, 4)}</text></g>;
      })}
      {children}
      <path d={`M${x0} ${top}V${y0}H${width - right}`} fill="none" stroke="var(--ink)" strokeWidth="1.5" />
      <text x={left} y={top - 14} style={{ fontSize: TEXT }} fill="var(--ink-soft)">{yLabel}</text>
      <text x={width - right} y={height - 8} textAnchor="end" style={{ fontSize: TEXT }} fill="var(--ink-soft)">{xLabel}</text>
    </DrawingSheet>
  );
}
