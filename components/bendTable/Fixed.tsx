import { formatFixed } from "@/lib/format/formatFixed";

/** A number of a column, always with as many decimals; a dash where there is none. */
export const Fixed = ({ value, digits }: { readonly value: number | null; readonly digits: number }) =>
  (value === null ? <span className="text-ink-faint">–</span> : <span className="num whitespace-nowrap">{formatFixed(value, digits)}</span>);
