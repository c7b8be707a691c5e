"use client";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { StateMark } from "@/components/ui/StateMark";
import { TextLink } from "@/components/ui/TextLink";
import { formatNumber } from "@/lib/format/formatNumber";
import type { ValueTrial } from "@/lib/schemas/bendTableViews";
import { Fixed } from "../Fixed";
import { TrialActions } from "../TrialActions";
import { trialStateWords } from "../valueStates";

const fixed = (digits: number, of: (trial: ValueTrial) => number | null) => function FixedCell(trial: ValueTrial) { return <Fixed value={of(trial)} digits={digits} />; };

const columns: readonly Column<ValueTrial>[] = [
  { key: "number", header: "Trial", rowHeader: true, cell: ({ number }) => <span className="num font-medium whitespace-nowrap">{number}</span> },
  { key: "batch", header: "Batch", className: "whitespace-nowrap", cell: ({ batch }) => batch || <span className="text-ink-faint">–</span> },
  { key: "thickness", header: "Measured t", align: "right", cell: fixed(2, ({ thicknessMm }) => thicknessMm) },
  { key: "angle", header: "Angle", align: "right", cell: ({ angleDeg }) => <span className="num">{formatNumber(angleDeg, 2)}°</span> },
  { key: "blank", header: "Blank", align: "right", cell: fixed(2, ({ blankMm }) => blankMm) },
  { key: "flangeA", header: "Flange 1", align: "right", cell: fixed(2, ({ flangesMm }) => flangesMm[0]) },
  { key: "flangeB", header: "Flange 2", align: "right", cell: fixed(2, ({ flangesMm }) => flangesMm[1]) },
  { key: "radius", header: "Inside r", align: "right", cell: fixed(2, ({ insideRadiusMm }) => insideRadiusMm) },
  { key: "deduction", header: "Deduction", align: "right", cell: (trial) => <><Fixed value={trial.deductionHereMm} digits={2} />{trial.result === null ? null : <span className="num ml-1.5 whitespace-nowrap text-ink-faint">± {trial.result.deduction.expanded.toFixed(2)}</span>}</> },
  { key: "k", header: "K", align: "right", cell: fixed(3, ({ kHere }) => kHere) },
  { key: "score", header: "Score", align: "right", cell: fixed(1, ({ score }) => score) },
  { key: "who", header: "Measured", cell: ({ measuredOn, measuredBy }) => <span className="text-sm"><span className="num whitespace-nowrap">{measuredOn}</span> {measuredBy}</span> },
  { key: "state", header: "State", className: "min-w-48", cell: (trial) => <TrialStanding trial={trial} /> },
];

function TrialStanding({ trial }: { readonly trial: ValueTrial }) {
  return (
    <div className="space-y-0.5 text-sm">
      {trial.state === "counted" && trial.outlier ? <StateMark tone="caution">outlier, counts</StateMark> : <StateMark tone={trialStateWords[trial.state].tone}>{trialStateWords[trial.state].label}</StateMark>}
      {trial.excluded === null ? null : <p>{trial.excluded.reason} <span className="text-ink-faint">({trial.excluded.by}, {trial.excluded.at.slice(0, 10)})</span></p>}
      {trial.note === "" ? null : <p className="text-ink-soft">{trial.note}</p>}
      {trial.part === null ? null : <TextLink href={`/parts/${trial.part.id}`}>{trial.part.number}</TextLink>}
    </div>
  );
}

/** The trials of a value, each with what it says of it; a person decides which count. */
export function ValueTrials({ trials, mayJudge }: { readonly trials: readonly ValueTrial[]; readonly mayJudge: boolean }) {
  const all = mayJudge ? [...columns, { key: "act", header: "", cell: (trial: ValueTrial) => <TrialActions trial={trial} /> }] : columns;
  return <DataTable caption="Trials of this value" columns={all} rows={trials} rowKey={({ id }) => id} dense empty={<p>No trial is left.</p>} />;
}
