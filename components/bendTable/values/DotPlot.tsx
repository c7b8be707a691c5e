import { DrawingSheet } from "@/components/ui/drawing/DrawingSheet";
import { formatFixed } from "@/lib/format/formatFixed";
import type { ValueDetail, ValueTrial } from "@/lib/schemas/bendTableViews";
import { plotDots } from "./plotDots";
import { plotScale } from "./plotScale";

const WIDTH = 640;
const SIDE = 28;
const DOT = 5;
const ROW = 13;

/** Every trial on a line of deductions: full dots count, a diamond lies apart, a cross is excluded; the mean with its uncertainty, and the handbook's value. */
export function DotPlot({ value }: { readonly value: ValueDetail }) {
  const { trials, deductionMm, expandedMm, handbook } = value;
  const scale = plotScale([...trials.map(({ deductionHereMm }) => deductionHereMm), handbook.deductionMm, ...(deductionMm === null || expandedMm === null ? [] : [deductionMm - expandedMm, deductionMm + expandedMm])]);
  const at = (deduction: number) => SIDE + ((deduction - scale.from) / (scale.to - scale.from)) * (WIDTH - 2 * SIDE);
  const dots = plotDots(trials.map(({ id, deductionHereMm }) => ({ id, x: at(deductionHereMm) })), 2 * DOT + 3);
  const byId = new Map(trials.map((trial) => [trial.id, trial]));
  const rows = Math.max(3, ...dots.map(({ row }) => row + 1));
  const base = 46 + rows * ROW;
  const height = base + 34;
  return (
    <DrawingSheet title="Deduction of each trial, mm" note="at this sheet and angle" width={WIDTH} height={height} description={described(value)}>
      {deductionMm === null || expandedMm === null ? null : (
        <>
          <rect x={at(deductionMm - expandedMm)} y={34} width={at(deductionMm + expandedMm) - at(deductionMm - expandedMm)} height={base - 34} fill="var(--accent-wash)" />
          <line x1={at(deductionMm)} x2={at(deductionMm)} y1={30} y2={base} stroke="var(--accent)" strokeWidth="1.6" />
          <Label x={at(deductionMm)} y={14} fill="var(--accent-ink)">mean {formatFixed(deductionMm, 2)}</Label>
        </>
      )}
      <line x1={at(handbook.deductionMm)} x2={at(handbook.deductionMm)} y1={30} y2={base} stroke="var(--ink-soft)" strokeWidth="1.2" strokeDasharray="9 3 2 3" />
      <Label x={at(handbook.deductionMm)} y={27} fill="var(--ink-soft)">handbook {formatFixed(handbook.deductionMm, 2)}</Label>
      <line x1={SIDE} x2={WIDTH - SIDE} y1={base} y2={base} stroke="var(--ink)" strokeWidth="1" />
      {scale.ticks.map((tick) => (
        <g key={tick}>
          <line x1={at(tick)} x2={at(tick)} y1={base} y2={base + 5} stroke="var(--ink)" strokeWidth="1" />
          <text x={at(tick)} y={base + 18} textAnchor="middle" className="num" style={{ fontSize: 11 }} fill="var(--ink-soft)">{tick.toFixed(scale.digits)}</text>
        </g>
      ))}
      {dots.map(({ id, x, row }) => {
        const trial = byId.get(id);
        return trial === undefined ? null : <Dot key={id} trial={trial} x={x} y={base - 9 - row * ROW} />;
      })}
    </DrawingSheet>
  );
}

function Label({ x, y, fill, children }: { readonly x: number; readonly y: number; readonly fill: string; readonly children: React.ReactNode }) {
  const anchor = x > WIDTH - 110 ? "end" : x < 110 ? "start" : "middle";
  return <text x={x} y={y} textAnchor={anchor} className="num" style={{ fontSize: 11 }} fill={fill}>{children}</text>;
}

function Dot({ trial, x, y }: { readonly trial: ValueTrial; readonly x: number; readonly y: number }) {
  const title = <title>{`${trial.number}: ${formatFixed(trial.deductionHereMm, 3)} mm`}</title>;
  if (trial.state !== "counted") return <g stroke="var(--ink-faint)" strokeWidth="1.6">{title}<path d={`M${x - 4} ${y - 4}l8 8M${x + 4} ${y - 4}l-8 8`} /></g>;
  if (trial.outlier) return <g>{title}<path d={`M${x} ${y - 7}l7 7l-7 7l-7 -7Z`} fill="var(--amber-wash)" stroke="var(--amber-ink)" strokeWidth="1.8" /></g>;
  return <g>{title}<circle cx={x} cy={y} r={DOT} fill="var(--steel-600)" /></g>;
}

function described({ trials, deductionMm, handbook }: ValueDetail): string {
  const apart = trials.filter(({ outlier }) => outlier).map(({ number }) => number);
  const out = trials.filter(({ state }) => state !== "counted").map(({ number }) => number);
  return [
    `Deductions of ${trials.length} trials`,
    deductionMm === null ? "none counts" : `mean ${formatFixed(deductionMm, 2)} mm`,
    `handbook ${formatFixed(handbook.deductionMm, 2)} mm`,
    ...(apart.length === 0 ? [] : [`lying apart: ${apart.join(", ")}`]),
    ...(out.length === 0 ? [] : [`excluded: ${out.join(", ")}`]),
  ].join(", ");
}
