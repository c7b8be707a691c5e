import { TextLink } from "@/components/ui/TextLink";
import { formatFixed } from "@/lib/format/formatFixed";
import { formatNumber } from "@/lib/format/formatNumber";
import type { CoverageView } from "@/lib/schemas/bendTableViews";

/** Strips to cut for the trials that would tell most. */
export function Suggestions({ coverage: { suggestions, material }, mayWrite }: { readonly coverage: CoverageView; readonly mayWrite: boolean }) {
  if (suggestions.length === 0) return <p className="text-ink-soft">Every sheet has at least three trials over the V that the rule names for it.</p>;
  return (
    <ol className="space-y-4">
      {suggestions.map((trial) => (
        <li key={`${trial.thicknessMm} ${trial.vOpeningMm}`} className="border-l-4 border-l-accent pl-3">
          <p className="font-semibold">{material}, <span className="num">{formatNumber(trial.thicknessMm, 2)} mm</span> over V <span className="num">{formatNumber(trial.vOpeningMm, 2)}</span>, to <span className="num">{formatNumber(trial.angleDeg, 1)}°</span></p>
          <p className="text-ink-soft">{trial.why}.</p>
          <p className="mt-1">
            Cut {trial.pieces} {trial.pieces === 1 ? "strip" : "strips"} of <span className="num whitespace-nowrap">{formatNumber(trial.blankMm, 1)} × {formatNumber(trial.widthMm, 1)} mm</span> and measure each blank. Bent in the middle, each flange comes to about <span className="num whitespace-nowrap">{formatFixed(trial.flangeMm, 1)} mm</span> outside
            (this V takes flanges from <span className="num whitespace-nowrap">{formatFixed(trial.leastFlangeMm, 1)} mm</span> on).
          </p>
          {mayWrite ? <p className="mt-1"><TextLink href={`/bend-table/new?${new URLSearchParams({ material, nominal: formatNumber(trial.thicknessMm, 2), vOpening: formatNumber(trial.vOpeningMm, 2) }).toString()}`}>Type in what was measured</TextLink></p> : null}
        </li>
      ))}
    </ol>
  );
}
