export interface PlotDot {
  readonly id: string;
  readonly x: number;
  /** Which row above the line, from 0: dots that would touch are stacked. */
  readonly row: number;
}

/** Places dots along a line so that none covers another: each takes the lowest row where it is free. */
export function plotDots(values: readonly { readonly id: string; readonly x: number }[], width: number): readonly PlotDot[] {
  const rows: number[] = [];
  return [...values].sort((a, b) => a.x - b.x).map(({ id, x }) => {
    const free = rows.findIndex((last) => x - last >= width);
    const row = free === -1 ? rows.length : free;
    rows[row] = x;
    return { id, x, row };
  });
}
