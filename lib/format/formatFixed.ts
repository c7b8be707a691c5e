/** Always `digits` decimals, so that a column of numbers lines up; never "-0.00". */
export function formatFixed(value: number, digits: number): string {
  const text = value.toFixed(digits);
  return Number(text) === 0 ? text.replace("-", "") : text;
}
