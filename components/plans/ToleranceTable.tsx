"use client";
import { useState } from "react";
import { mmPer, toDeg } from "@/bending/core/units";
import type { PlanTolerance } from "@/bending/plan/planTolerance";
import { toleranceName } from "@/bending/plan/toleranceName";
import { Choice } from "@/components/ui/Choice";
import { DataTable, type Column, type ListState } from "@/components/ui/DataTable";
import { EmptyState } from "@/components/ui/EmptyState";
import { StateMark } from "@/components/ui/StateMark";
import type { PlanDetail } from "@/lib/schemas/views";
import { createSheetFormat } from "@/lib/sheet/createSheetFormat";
import { toleranceState } from "@/lib/sheet/toleranceState";

type Shown = "asked" | "leg" | "hole" | "overall";

/** What gauge and angles let every dimension miss in this plan, and which steps bring it in. */
export function ToleranceTable({ detail: { plan, machineModel } }: { readonly detail: Pick<PlanDetail, "plan" | "machineModel"> }) {
  const all = plan.tolerances ?? [];
  const count = (shown: Shown) => all.filter((row) => isShown(row, shown)).length;
  const choices = (["asked", "leg", "hole", "overall"] as const).filter((shown) => count(shown) > 0);
  const [chosen, setChosen] = useState<Shown>(choices[0] ?? "leg");
  const [list, setList] = useState<ListState>({ q: "", sort: "", dir: "desc", page: 1, pageSize: 20 });
  if (all.length === 0) return <EmptyState title="This plan does not say what its dimensions may miss">It was made before plans kept that. Plan the part again to see it.</EmptyState>;
  const format = createSheetFormat(plan.units);
  const anyAsked = count("asked") > 0;
  const rows = sorted(all.filter((row) => isShown(row, chosen)), list);
  const { gaugeRepeat, angleRepeat } = machineModel.settings;
  return (
    <div className="space-y-3">
      <p className="max-w-prose text-sm text-ink-soft">
        How far one part may differ from the next when every stop of the gauge repeats within <span className="num">±{format.fine(gaugeRepeat)}</span> and every angle
        within <span className="num">±{toDeg(angleRepeat).toFixed(2)}°</span>, the brake’s settings. Blank and sheet count as true. A bend gauged from a flange that is bent already takes over that flange’s errors.{anyAsked ? "" : " Give the part or a flange a length tolerance, and the next plan gauges so that it is kept where it can be."}
      </p>
      {choices.length > 1 ? (
        <Choice label="Dimensions" labelHidden small value={chosen} onChange={(next) => { setChosen(next); setList({ ...list, page: 1 }); }}
          options={choices.map((value) => ({ value, label: `${names[value]} (${count(value)})` }))} />
      ) : null}
      <DataTable caption="What the dimensions may miss" dense columns={columns(plan.units).filter(({ key }) => anyAsked || (key !== "asked" && key !== "state"))} rows={rows.slice((list.page - 1) * list.pageSize, list.page * list.pageSize)}
        rowKey={(row) => `${toleranceName(row)}/${row.nominal}`} list={{ ...list, total: rows.length, onChange: (change) => setList({ ...list, ...change }) }} empty={null} />
    </div>
  );
}

const names: Record<Shown, string> = { asked: "Asked for", leg: "Lengths", hole: "Holes", overall: "Over all" };

const isShown = (row: PlanTolerance, shown: Shown) => (shown === "asked" ? row.asked !== undefined : row.kind === shown);

function sorted(rows: readonly PlanTolerance[], { sort, dir }: ListState): readonly PlanTolerance[] {
  const value = (row: PlanTolerance) => (sort === "nominal" ? row.nominal : sort === "statistical" ? row.statistical ?? Infinity : row.worstCase ?? Infinity);
  return sort === "" ? rows : [...rows].sort((a, b) => (dir === "asc" ? 1 : -1) * (value(a) - value(b) || 0));
}

function columns(units: PlanDetail["plan"]["units"]): readonly Column<PlanTolerance>[] {
  const { gauge } = createSheetFormat(units);
  const inUnits = (value: number) => gauge(value * mmPer(units));
  const plusMinus = (value: number | null | undefined) => <span className="num whitespace-nowrap">{value === undefined ? "" : value === null ? "unbounded" : `±${inUnits(value)}`}</span>;
  return [
    { key: "name", header: "Dimension", rowHeader: true, cell: (row) => <span className="font-medium">{row.kind === "overall" ? toleranceName(row).replace("over", "Over") : toleranceName(row)}</span> },
    { key: "nominal", header: `Nominal, ${units}`, align: "right", sortable: true, cell: (row) => <span className="num">{inUnits(row.nominal)}</span> },
    { key: "asked", header: "Asked for", align: "right", cell: (row) => plusMinus(row.asked) },
    { key: "worst", header: "At worst", align: "right", sortable: true, cell: (row) => plusMinus(row.worstCase) },
    { key: "statistical", header: "95 of 100 parts", align: "right", sortable: true, cell: (row) => plusMinus(row.statistical) },
    { key: "state", header: "", cell: (row) => <State row={row} /> },
    { key: "shares", header: "Brought in by", cell: (row) => <Shares row={row} inUnits={inUnits} /> },
  ];
}

function State({ row }: { readonly row: PlanTolerance }) {
  const state = toleranceState(row);
  return state === null ? null : <StateMark tone={state.tone}>{state.word}</StateMark>;
}

/** Steps with the larger shares first; what is under a hundredth is left out. */
function Shares({ row, inUnits }: { readonly row: PlanTolerance; readonly inUnits: (value: number) => string }) {
  const told = row.shares.flatMap(({ step, gauge, angle }) => {
    const parts = [...(Number(inUnits(gauge)) > 0 ? [`${inUnits(gauge)} gauge`] : []), ...(Number(inUnits(angle)) > 0 ? [`${inUnits(angle)} angle`] : [])];
    return parts.length > 0 ? [{ step, size: gauge + angle, text: parts.join(", ") }] : [];
  }).sort((a, b) => b.size - a.size);
  return <span className="num text-sm">{told.map(({ step, text }) => <span key={step} className="mr-4 inline-block whitespace-nowrap"><span className="text-ink-soft">step {step}</span> {text}</span>)}</span>;
}
