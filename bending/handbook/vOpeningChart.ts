import { MM_PER_INCH, mm, type Mm } from "../core/units";

interface ChartRow {
  readonly from: number;
  readonly to: number;
  readonly times: number;
}

const inches = (rows: readonly ChartRow[]): readonly ChartRow[] =>
  rows.map(({ from, to, times }) => ({ from: from * MM_PER_INCH, to: to * MM_PER_INCH, times }));

/** The second chart says "over 12 mm": 12 mm itself is not in it. */
const OVER_12 = 12 + 1e-6;

/** V over thickness by ranges of thickness in mm, as three trade charts print it. */
export const vOpeningCharts = {
  metric: [{ from: 0, to: 2.6, times: 6 }, { from: 3, to: 8, times: 8 }, { from: 9, to: 12, times: 10 }, { from: 14, to: Infinity, times: 12 }],
  inch: inches([{ from: 0, to: 0.105, times: 6 }, { from: 0.12, to: 0.313, times: 8 }, { from: 0.375, to: 0.5, times: 10 }, { from: 0.625, to: Infinity, times: 12 }]),
  second: [{ from: 0.5, to: 2.5, times: 6 }, { from: 3, to: 8, times: 8 }, { from: 9, to: 10, times: 10 }, { from: OVER_12, to: Infinity, times: 12 }],
} as const satisfies Record<string, readonly ChartRow[]>;

export type VOpeningChart = keyof typeof vOpeningCharts;

export interface ChartOpening {
  readonly vOpening: Mm;
  readonly times: number;
  /** The chart has no row for this thickness; its next thicker row is used. */
  readonly betweenRows: boolean;
}

/** A printed limit is met in spite of rounding, mm. */
const SAME = 1e-9;

/** Usual air-bending V for a thickness by one of the charts. `vOpeningRule` is the metric one. */
export function vOpeningChart(thickness: Mm, chart: VOpeningChart = "metric"): ChartOpening {
  const rows: readonly ChartRow[] = vOpeningCharts[chart];
  const row = rows.find(({ to }) => thickness <= to + SAME);
  const times = row?.times ?? 12;
  return { vOpening: mm(times * thickness), times, betweenRows: row === undefined || thickness < row.from - SAME };
}
