"use client";
import Link from "next/link";
import { Choice } from "@/components/ui/Choice";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { EmptyState } from "@/components/ui/EmptyState";
import { FilterBox } from "@/components/ui/FilterBox";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { StateMark } from "@/components/ui/StateMark";
import { useListState } from "@/components/ui/useListState";
import { flatChangeText } from "@/lib/format/flatChangeText";
import { formatMoment } from "@/lib/format/formatMoment";
import { useSheetList } from "@/lib/queries/sheets";
import { sheetSorts } from "@/lib/schemas/sheetInputs";
import type { SheetListItem, SheetState } from "@/lib/schemas/views";
import { sheetState } from "./sheetState";

const columns: readonly Column<SheetListItem>[] = [
  { key: "number", header: "Sheet", sortable: true, rowHeader: true, cell: (row) => <Link href={`/sheets/${row.id}`} className="num font-medium text-accent-ink underline">{row.number}</Link> },
  { key: "state", header: "State", sortable: true, cell: (row) => <StateMark tone={sheetState[row.state].tone}>{row.state}</StateMark> },
  { key: "partNumber", header: "Part", sortable: true, cell: (row) => <span className="num">{row.partNumber}</span> },
  { key: "partName", header: "Name", sortable: true, cell: (row) => row.partName },
  { key: "revision", header: "Rev.", align: "right", cell: (row) => <span className="num">{row.revision}</span> },
  { key: "machine", header: "Brake", sortable: true, cell: (row) => row.machine },
  { key: "bends", header: "Bends", sortable: true, align: "right", cell: (row) => <span className="num">{row.bends}</span> },
  { key: "flat", header: "Flat", cell: (row) => <FlatNow sheet={row} /> },
  { key: "releasedAt", header: "Released", sortable: true, cell: (row) => <span className="whitespace-nowrap">{row.releasedAt ? `${formatMoment(row.releasedAt)}, ${row.releasedBy ?? ""}` : "–"}</span> },
  { key: "createdAt", header: "Made", sortable: true, cell: (row) => <span className="whitespace-nowrap">{formatMoment(row.createdAt)}</span> },
];

/** Whether a released sheet's flat still is what the shop would make of it now. */
function FlatNow({ sheet: { state, flatChange } }: { readonly sheet: SheetListItem }) {
  if (flatChange === null) return <span className="text-ink-faint">{state === "released" ? "as released" : "–"}</span>;
  const { then, now } = flatChangeText(flatChange);
  return <><StateMark tone="caution">changed</StateMark><span className="mt-0.5 block text-sm whitespace-nowrap">now <span className="num">{now}</span>, sheet <span className="num">{then}</span></span></>;
}

const states = ["all", "draft", "released", "superseded"] as const;

export function SheetList() {
  const { state, change, param } = useListState({ sort: "createdAt", dir: "desc" });
  const shown = states.find((name) => name === param("state")) ?? "all";
  const filter: { readonly state?: SheetState } = shown === "all" ? {} : { state: shown };
  const { data, error, isFetching } = useSheetList({ ...state, ...filter, sort: sheetSorts.find((sort) => sort === state.sort) ?? "createdAt" });
  return (
    <>
      <PageHeader kicker="Setup sheets" title="From draft to the floor" summary="A sheet is made from a plan, released by an engineer, and frozen from then on." />
      <div className="mb-3 flex flex-wrap items-end gap-3">
        <FilterBox label="Search sheet, part or brake" value={state.q} onChange={(q) => change({ q, page: 1 })} />
        <Choice label="State" labelHidden value={shown} onChange={(name) => change({ state: name === "all" ? "" : name, page: 1 })} options={states.map((value) => ({ value, label: value }))} />
      </div>
      {error ? <Notice tone="wrong" title="The sheets cannot be shown">{error.message}</Notice> : (
        <DataTable caption="Setup sheets" columns={columns} rows={data?.items ?? []} rowKey={(row) => row.id} loading={isFetching && data === undefined}
          list={{ ...state, total: data?.total ?? 0, onChange: (next) => change({ ...next }) }}
          empty={<EmptyState title={state.q || shown !== "all" ? "No sheet matches" : "No setup sheet yet"}>{state.q || shown !== "all" ? "Try another state or fewer letters." : "Open a plan that works and make its setup sheet."}</EmptyState>} />
      )}
    </>
  );
}
