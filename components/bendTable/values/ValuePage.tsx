"use client";
import { Facts } from "@/components/ui/Facts";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { Panel } from "@/components/ui/Panel";
import { StateMark } from "@/components/ui/StateMark";
import { TextLink } from "@/components/ui/TextLink";
import { formatFixed } from "@/lib/format/formatFixed";
import { formatLength } from "@/lib/format/formatLength";
import { formatMoment } from "@/lib/format/formatMoment";
import { formatNumber } from "@/lib/format/formatNumber";
import { useBendValue } from "@/lib/queries/bendTable";
import type { ValueDetail } from "@/lib/schemas/bendTableViews";
import { valueStateWords } from "../valueStates";
import { DotPlot } from "./DotPlot";
import { ValueTrials } from "./ValueTrials";

const num = (text: string) => <span className="num whitespace-nowrap">{text}</span>;
const signed = (value: number, digits: number) => `${Number(value.toFixed(digits)) > 0 ? "+" : ""}${formatFixed(value, digits)}`;

/** One measured value: its trials, how they scatter, and how far they lie from the handbook. */
export function ValuePage({ valueKey, mayJudge }: { readonly valueKey: string; readonly mayJudge: boolean }) {
  const value = useBendValue(valueKey);
  if (value.isPending) return <Loading what="the value" />;
  if (value.isError) return <LoadProblem what="The value" error={value.error} onRetry={() => void value.refetch()} />;
  const { data } = value;
  return (
    <>
      <PageHeader kicker={<TextLink href="/bend-table">Bend table</TextLink>} title={`${data.material}, ${formatNumber(data.thicknessMm, 2)} mm over V ${formatNumber(data.vOpeningMm, 2)} at ${formatNumber(data.angleDeg, 1)}°`}
        summary={data.materialName} facts={headFacts(data)} />
      <Standing value={data} />
      <div className="mb-8 grid grid-cols-1 gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,42rem)_minmax(0,1fr)]">
        <DotPlot value={data} />
        <div className="space-y-8">
          <Panel title="Beside the handbook"><Facts rows={comparison(data)} /></Panel>
          <Panel title="Parts of this sheet">
            {data.parts.length === 0 ? <p className="text-ink-soft">No part is made of {data.material} {formatNumber(data.thicknessMm, 2)} mm yet.</p> : (
              <ul className="flex flex-wrap gap-x-6 gap-y-1">{data.parts.map((part) => <li key={part.id}><TextLink href={`/parts/${part.id}`}>{part.number} {part.name}</TextLink> <span className="text-ink-faint">({part.bends} {part.bends === 1 ? "bend" : "bends"})</span></li>)}</ul>
            )}
          </Panel>
        </div>
      </div>
      <Panel title="Trials" aside={<>lengths in mm; the deduction is at <span className="num">{formatNumber(data.thicknessMm, 2)} mm</span> and <span className="num">{formatNumber(data.angleDeg, 1)}°</span></>}>
        <ValueTrials trials={data.trials} mayJudge={mayJudge} />
        <p className="mt-2 max-w-prose text-sm text-ink-faint">Score: how far a trial lies from the median, in standard deviations estimated from the median deviation. Over 3.5 it is marked as an outlier; it counts until an engineer excludes it.</p>
      </Panel>
    </>
  );
}

function Standing({ value }: { readonly value: ValueDetail }) {
  if (value.state === "none") return <div className="mb-6"><Notice tone="caution" title="No trial counts">Every trial of this value is excluded, so the handbook holds. Bring one back, or bend new ones.</Notice></div>;
  if (value.state === "outlier") return <div className="mb-6"><Notice tone="caution" title={value.outliers === 1 ? "One trial lies apart from the others" : `${value.outliers} trials lie apart from the others`}>It counts as long as nobody excludes it. Look for a reason first: a slip in measuring is one, being far off alone is none.</Notice></div>;
  if (value.state === "few") return <div className="mb-6"><Notice tone="note" title={value.counted === 1 ? "Only one trial" : "Only two trials"}>From three on it can be told whether one lies apart.</Notice></div>;
  return null;
}

function headFacts(value: ValueDetail) {
  return [
    { label: "Deduction", value: value.deductionMm === null ? "–" : num(`${formatFixed(value.deductionMm, 2)} ± ${formatFixed(value.expandedMm ?? 0, 2)} mm`) },
    { label: "K", value: num(value.k === null ? "–" : formatFixed(value.k, 3)) },
    { label: "Inside radius", value: <>{num(formatLength(value.radiusMm, "mm"))} <span className="text-sm text-ink-faint">{value.radiusSource}</span></> },
    { label: "Spread", value: num(value.spreadMm === null ? "–" : `${formatFixed(value.spreadMm, 3)} mm`) },
    { label: "Punch radius", value: num(formatLength(value.punchRadiusMm, "mm")) },
    { label: "Angles", value: num(`${formatNumber(value.anglesDeg[0], 1)}° to ${formatNumber(value.anglesDeg[1], 1)}°`) },
    { label: "Trials", value: num(value.excluded === 0 ? `${value.counted}` : `${value.counted} of ${value.counted + value.excluded}`) },
    { label: "Last used", value: value.lastUsed === null ? "in no plan yet" : <>{formatMoment(value.lastUsed.at)}, <TextLink href={`/parts/${value.lastUsed.partId}`}>{value.lastUsed.partNumber}</TextLink></> },
    { label: "State", value: <StateMark tone={valueStateWords[value.state].tone}>{valueStateWords[value.state].label}</StateMark> },
  ];
}

function comparison({ handbook, deductionMm, k, radiusMm }: ValueDetail) {
  const off = deductionMm === null ? null : deductionMm - handbook.deductionMm;
  return [
    { label: handbook.source, value: num(`${formatFixed(handbook.deductionMm, 2)} mm`) },
    { label: "Measured here", value: num(deductionMm === null ? "–" : `${formatFixed(deductionMm, 2)} mm`) },
    { label: "Difference of the deduction", value: num(off === null ? "–" : `${signed(off, 2)} mm`) },
    { label: "A flat by the handbook would come out", value: num(off === null ? "–" : Math.abs(off) < 0.005 ? "just right" : `${formatFixed(Math.abs(off), 2)} mm too ${off > 0 ? "long" : "short"} a bend`) },
    { label: "K, measured and handbook", value: num(`${k === null ? "–" : formatFixed(k, 3)} / ${formatFixed(handbook.k, 3)}`) },
    { label: "Inside radius, measured and handbook", value: num(`${formatLength(radiusMm, "mm", false)} / ${formatLength(handbook.radiusMm, "mm")}`) },
  ];
}
