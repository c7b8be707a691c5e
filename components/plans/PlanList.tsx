"use client";
import Link from "next/link";
import { JobsUnderWay } from "@/components/planJobs/JobsUnderWay";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { EmptyState } from "@/components/ui/EmptyState";
import { FilterBox } from "@/components/ui/FilterBox";
import { Notice } from "@/components/ui/Notice";
import { PageHeader } from "@/components/ui/PageHeader";
import { StateMark } from "@/components/ui/StateMark";
import { useListState } from "@/components/ui/useListState";
import { formatMoment } from "@/lib/format/formatMoment";
import { formatSeconds } from "@/lib/format/formatSeconds";
import { usePlanList } from "@/lib/queries/plans";
import { planSorts } from "@/lib/schemas/planInputs";
import type { PlanListItem } from "@/lib/schemas/views";
import { planStatus } from "./planStatus";

const columns: readonly Column<PlanListItem>[] = [
  { key: "partNumber", header: "Part", sortable: true, rowHeader: true, cell: (row) => <Link href={`/plans/${row.id}`} className="num font-medium text-accent-ink underline">{row.partNumber}</Link> },
  { key: "partName", header: "Name", sortable: true, cell: (row) => row.partName },
  { key: "revision", header: "Rev.", align: "right", cell: (row) => <span className="num">{row.revision}</span> },
  { key: "machine", header: "Brake", sortable: true, cell: (row) => row.machine },
  { key: "status", header: "Status", sortable: true, cell: (row) => <PlanMark status={row.status} /> },
  { key: "steps", header: "Steps", sortable: true, align: "right", cell: (row) => <span className="num">{row.steps}</span> },
  { key: "stations", header: "Stations", align: "right", cell: (row) => <span className="num">{row.stations}</span> },
  { key: "batch", header: "Batch", sortable: true, align: "right", cell: (row) => <span className="num">{row.batch}</span> },
  { key: "secondsPerPart", header: "A part", sortable: true, align: "right", cell: (row) => <span className="num">{row.steps > 0 ? formatSeconds(row.secondsPerPart) : "–"}</span> },
  { key: "createdAt", header: "Planned", sortable: true, cell: (row) => <span className="whitespace-nowrap">{formatMoment(row.createdAt)}</span> },
];

/** The list leaves the gap to the plan's own page. */
function PlanMark({ status }: Pick<PlanListItem, "status">) {
  const { tone, word } = planStatus(status, 0);
  return <StateMark tone={tone}>{status === "feasible" ? "works" : word}</StateMark>;
}

export function PlanList({ mayWrite }: { readonly mayWrite: boolean }) {
  const { state, change } = useListState({ sort: "createdAt", dir: "desc" });
  const { data, error, isFetching } = usePlanList({ ...state, sort: planSorts.find((sort) => sort === state.sort) ?? "createdAt" });
  return (
    <>
      <PageHeader kicker="Plans" title="Bend orders and setups" summary="Every plan as it was computed: the part's revision, the brake, the tools then in service." />
      <JobsUnderWay of={{}} mayWrite={mayWrite} />
      <div className="mb-3"><FilterBox label="Search part or brake" value={state.q} onChange={(q) => change({ q, page: 1 })} /></div>
      {error ? <Notice tone="wrong" title="The plans cannot be shown">{error.message}</Notice> : (
        <DataTable caption="Plans" columns={columns} rows={data?.items ?? []} rowKey={(row) => row.id} loading={isFetching && data === undefined}
          list={{ ...state, total: data?.total ?? 0, onChange: (next) => change({ ...next }) }}
          empty={<EmptyState title={state.q ? "No plan matches" : "No plan yet"}>{state.q ? "Try fewer letters of the part number, its name or the brake." : "Open a part and plan it for a brake."}</EmptyState>} />
      )}
    </>
  );
}
