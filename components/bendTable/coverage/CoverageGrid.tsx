import { CircleDashed, Check, Spline, TriangleAlert } from "lucide-react";
import { classes } from "@/components/ui/classes";
import { TextLink } from "@/components/ui/TextLink";
import { formatFixed } from "@/lib/format/formatFixed";
import { formatNumber } from "@/lib/format/formatNumber";
import type { CoverageCell, CoverageView } from "@/lib/schemas/bendTableViews";

/** Sheets down, V openings across. What a place is stands in it as a word, an icon and a ground. */
export function CoverageGrid({ coverage: { openings, rows, material } }: { readonly coverage: CoverageView }) {
  return (
    <div className="min-w-0">
      <div className="relative overflow-x-auto border-y border-ink" tabIndex={0} role="region" aria-label={`Coverage of ${material}`}>
        <table className="w-full border-collapse text-left">
          <caption className="sr-only">{`Coverage of ${material}: sheets down, V openings across`}</caption>
          <thead>
            <tr className="border-b border-rule-strong">
              <th scope="col" className="px-3 py-1.5 text-sm font-medium text-ink-soft">Sheet, mm</th>
              {openings.map(({ vOpeningMm, inService }) => (
                <th key={vOpeningMm} scope="col" className="min-w-24 px-2 py-1.5 text-sm font-medium text-ink-soft">V <span className="num">{formatNumber(vOpeningMm, 2)}</span>{inService ? null : <span className="block text-xs font-normal text-ink-faint">no die in service</span>}</th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map((row) => (
              <tr key={row.thicknessMm} className="border-b border-rule last:border-b-0">
                <th scope="row" className="px-3 py-1.5 align-top font-medium"><span className="num">{formatNumber(row.thicknessMm, 2)}</span><span className="block text-xs font-normal whitespace-nowrap text-ink-faint">{row.bends === 0 ? "no part" : `${row.bends} bends, ${row.parts} ${row.parts === 1 ? "part" : "parts"}`}</span></th>
                {row.cells.map((cell) => <Place key={cell.vOpeningMm} cell={cell} />)}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p className="mt-2 max-w-prose text-sm text-ink-faint">Numbers are deductions at 90° in mm. A heavy frame marks the V nearest to the rule for the sheet, of those with a die in service. Sheet is bent in a V of 4 to 12 times its thickness; other places are left empty.</p>
    </div>
  );
}

function Place({ cell }: { readonly cell: CoverageCell }) {
  const frame = cell.byRule ? "outline-2 -outline-offset-2 outline-ink" : "";
  if (cell.kind === "unusual") return <td className={classes("bg-wash/60 px-2 py-1.5", frame)}><span className="sr-only">not usual</span></td>;
  if (cell.kind === "open") return <td className={classes("px-2 py-1.5 align-top text-sm text-ink-faint", frame)}><span className="flex items-center gap-1"><CircleDashed aria-hidden className="size-3.5" />open</span></td>;
  const key = cell.valueKeys[0];
  const number = cell.deductionMm === null ? `at ${cell.anglesDeg.map((angle) => `${angle}°`).join(", ")}` : formatFixed(cell.deductionMm, 2);
  if (cell.kind === "between") return (
    <td className={classes("border-x border-dashed border-rule-strong px-2 py-1.5 align-top", frame)}>
      <span className="num text-ink-soft">{number}</span>
      <span className="flex items-center gap-1 text-xs text-ink-soft"><Spline aria-hidden className="size-3.5" />between</span>
    </td>
  );
  const Icon = cell.outlier ? TriangleAlert : cell.trials < 3 ? CircleDashed : Check;
  return (
    <td className={classes("px-2 py-1.5 align-top", cell.outlier ? "bg-amber-wash" : "bg-accent-wash", frame)}>
      {key === undefined ? <span className="num">{number}</span> : <TextLink href={`/bend-table/values/${encodeURIComponent(key)}`}><span className="num">{number}</span></TextLink>}
      <span className="flex items-center gap-1 text-xs whitespace-nowrap text-ink-soft"><Icon aria-hidden className="size-3.5 shrink-0" />{cell.trials} {cell.trials === 1 ? "trial" : "trials"}{cell.outlier ? ", outlier" : ""}</span>
    </td>
  );
}
