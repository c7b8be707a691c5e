"use client";
import { Plus } from "lucide-react";
import { useState } from "react";
import { Button } from "@/components/ui/Button";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { EmptyState } from "@/components/ui/EmptyState";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { PageHeader } from "@/components/ui/PageHeader";
import { StateMark } from "@/components/ui/StateMark";
import { formatNumber } from "@/lib/format/formatNumber";
import { useInstruments } from "@/lib/queries/bendTable";
import type { InstrumentView } from "@/lib/schemas/bendTableViews";
import { BendTableTabs } from "../BendTableTabs";
import { NewInstrument } from "./NewInstrument";
import { WithdrawInstrument } from "./WithdrawInstrument";

const reading = (instrument: InstrumentView, value: number) => <span className="num whitespace-nowrap">{formatNumber(value, 4)} {instrument.kind === "protractor" ? "°" : "mm"}</span>;

const columns: readonly Column<InstrumentView>[] = [
  { key: "name", header: "Instrument", rowHeader: true, cell: ({ name }) => <span className="font-medium">{name}</span> },
  { key: "kind", header: "Kind", cell: ({ kind }) => kind },
  { key: "resolution", header: "Smallest step", align: "right", cell: (one) => reading(one, one.resolution) },
  { key: "uncertainty", header: "Limit of error ±", align: "right", cell: (one) => reading(one, one.uncertainty) },
  { key: "trials", header: "Trials", align: "right", cell: ({ trials }) => <span className="num">{trials}</span> },
  { key: "note", header: "Where the limit comes from", className: "text-sm text-ink-soft", cell: ({ note }) => note },
  { key: "state", header: "State", cell: ({ withdrawn }) => (withdrawn === null ? <StateMark tone="good">in use</StateMark> : (
    <div className="text-sm"><StateMark tone="off">withdrawn</StateMark><p>{withdrawn.reason} <span className="text-ink-faint">({withdrawn.by}, {withdrawn.at.slice(0, 10)})</span></p></div>
  )) },
];

/** What the shop measures with: an instrument's limit of error is what makes a trial's ±. */
export function InstrumentList({ mayWrite }: { readonly mayWrite: boolean }) {
  const instruments = useInstruments();
  const [adding, setAdding] = useState(false);
  const [withdrawing, setWithdrawing] = useState<InstrumentView | null>(null);
  const act: Column<InstrumentView> = {
    key: "act", header: "", align: "right",
    cell: (one) => (one.withdrawn === null ? <Button look="quiet" size="small" aria-label={`Withdraw ${one.name}`} onClick={() => setWithdrawing(one)}>Withdraw</Button> : null),
  };
  return (
    <>
      <PageHeader kicker="Bend table" title="Instruments" summary="What trials are measured with. The limit of error of an instrument decides how far a trial can be trusted."
        actions={mayWrite ? <Button icon={<Plus aria-hidden />} onClick={() => setAdding(true)}>Add an instrument</Button> : null} />
      <BendTableTabs />
      {instruments.isError ? <LoadProblem what="The instruments" error={instruments.error} onRetry={() => void instruments.refetch()} /> : (
        <DataTable caption="Instruments" columns={mayWrite ? [...columns, act] : columns} rows={instruments.data ?? []} rowKey={({ id }) => id} loading={instruments.isPending}
          empty={<EmptyState title="No instrument yet">Without one no trial can be entered.</EmptyState>} />
      )}
      {adding ? <NewInstrument onClose={() => setAdding(false)} /> : null}
      {withdrawing === null ? null : <WithdrawInstrument instrument={withdrawing} onClose={() => setWithdrawing(null)} />}
    </>
  );
}
