import type { GaugeOption } from "../setup/gaugeOption";

/** Gives every gauge setting (X and R; Z of the fingers is left out) a number; the same setting the same number. */
export type GaugeNumbers = (option: GaugeOption | undefined) => number;

export function createGaugeNumbers(): GaugeNumbers {
  const numbers = new Map<string, number>([["none", 0]]);
  const seen = new WeakMap<GaugeOption, number>();
  return (option) => {
    if (option === undefined) return 0;
    const before = seen.get(option);
    if (before !== undefined) return before;
    const key = `${option.x.toFixed(2)}/${option.slope.toFixed(4)}/${option.r.toFixed(2)}`;
    const known = numbers.get(key) ?? numbers.size;
    numbers.set(key, known);
    seen.set(option, known);
    return known;
  };
}
