import { mmPer, type LengthUnit } from "@/bending/core/units";
import { formatFixed } from "@/lib/format/formatFixed";
import type { LineResult } from "./lineResult";

interface LineNumbersProps {
  readonly result: LineResult | null;
  readonly units: LengthUnit;
}

const cell = "num px-2 text-right whitespace-nowrap";

/** What comes of a line: deduction with its uncertainty, the handbook's, K and the inside radius. */
export function LineNumbers({ result, units }: LineNumbersProps) {
  if (result === null) return <>{["deduction", "handbook", "k", "radius"].map((key) => <td key={key} className={`${cell} text-ink-faint`}>–</td>)}</>;
  const digits = units === "in" ? 4 : 2;
  const length = (value: number, more = 0) => formatFixed(value / mmPer(units), digits + more);
  const { deduction, k, insideRadius } = result.result;
  return (
    <>
      <td className={`${cell} font-medium`}>{length(deduction.value)} <span className="text-ink-faint">± {length(deduction.expanded)}</span></td>
      <td className={`${cell} text-ink-soft`}>{length(result.handbook)}</td>
      <td className={cell}>{formatFixed(k.value, 3)}</td>
      <td className={cell}>{length(insideRadius.value)}{insideRadius.source === "measured" ? "" : <span className="text-ink-faint" title={insideRadius.source}>*</span>}</td>
    </>
  );
}
