/** At most `digits` decimals, without trailing zeros; never "-0". */
export function formatNumber(value: number, digits = 3): string {
  const text = value.toFixed(digits);
  const short = text.includes(".") ? text.replace(/0+$/, "").replace(/\.$/, "") : text;
  return short === "-0" ? "0" : short;
}
