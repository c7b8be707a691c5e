/** Inches as a reduced fraction of the given denominator: `3 1/2`, `-1/8`, `0`. Rounds to the nearest one. */
export function formatInchFraction(inches: number, denominator = 64): string {
  const parts = Math.round(Math.abs(inches) * denominator);
  const sign = inches < 0 && parts > 0 ? "-" : "";
  const whole = Math.floor(parts / denominator);
  let above = parts % denominator;
  let below = denominator;
  while (above > 0 && above % 2 === 0 && below % 2 === 0) { above /= 2; below /= 2; }
  if (above === 0) return `${sign}${whole}`;
  return whole === 0 ? `${sign}${above}/${below}` : `${sign}${whole} ${above}/${below}`;
}
