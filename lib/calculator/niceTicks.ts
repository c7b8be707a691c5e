/** Round places on an axis from 0 to `most`: 1, 2 or 5 times a power of ten apart, about `wanted` of them. */
export function niceTicks(least: number, most: number, wanted = 6): readonly number[] {
  const rough = (most - least) / Math.max(1, wanted);
  if (!(rough > 0) || !Number.isFinite(rough)) return [least];
  const power = 10 ** Math.floor(Math.log10(rough));
  const step = [1, 2, 5, 10].map((times) => times * power).find((size) => size >= rough * 0.999) ?? rough;
  const first = Math.ceil(least / step - 1e-9);
  return Array.from({ length: Math.floor(most / step + 1e-9) - first + 1 }, (_, i) => Number(((first + i) * step).toPrecision(12)));
}
