export interface PlotScale {
  readonly from: number;
  readonly to: number;
  /** Ruled values, within. */
  readonly ticks: readonly number[];
  /** Decimals that the ticks need. */
  readonly digits: number;
}

/** A scale of round steps (1, 2 or 5 times a power of ten) that holds all values with some room at both ends. */
export function plotScale(values: readonly number[], most = 8): PlotScale {
  const low = Math.min(...values);
  const high = Math.max(...values);
  const span = Math.max(high - low, 0.02);
  const rough = (span * 1.2) / most;
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = ([1, 2, 5, 10].find((times) => times * power >= rough * 0.999999) ?? 10) * power;
  const middle = (low + high) / 2;
  const from = Math.floor((middle - span * 0.6) / step) * step;
  const to = Math.ceil((middle + span * 0.6) / step) * step;
  const count = Math.round((to - from) / step);
  const digits = Math.max(0, Math.ceil(-Math.log10(step) - 1e-9));
  return { from, to, digits, ticks: Array.from({ length: count + 1 }, (_, i) => Number((from + i * step).toFixed(digits + 2))) };
}
