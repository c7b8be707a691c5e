"use client";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { EmptyState } from "@/components/ui/EmptyState";
import { FilterBox } from "@/components/ui/FilterBox";
import { ListBar } from "@/components/ui/ListBar";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { PageHeader } from "@/components/ui/PageHeader";
import { oneOf } from "@/components/ui/oneOf";
import { useListState } from "@/components/ui/useListState";
import { formatMoment } from "@/lib/format/formatMoment";
import { useActivity } from "@/lib/queries/activity";
import { activitySorts } from "@/lib/schemas/activityQuery";
import type { ActivityItem } from "@/lib/schemas/views";

const columns: readonly Column<ActivityItem>[] = [
  { key: "at", header: "When", sortable: true, className: "whitespace-nowrap", cell: (item) => <span className="num">{formatMoment(item.at)}</span> },
  { key: "actor", header: "Who", sortable: true, className: "whitespace-nowrap", cell: (item) => item.actor },
  { key: "action", header: "Did what", sortable: true, cell: (item) => <span className="font-medium">{item.action}</span> },
  { key: "subject", header: "To what", sortable: true, rowHeader: true, cell: (item) => item.subject },
  { key: "detail", header: "Detail", className: "text-ink-soft break-words", cell: (item) => item.detail },
];

export function ActivityList() {
  const { state, change } = useListState({ sort: "at", dir: "desc" });
  const activity = useActivity({ ...state, sort: oneOf(activitySorts, state.sort, "at") });
  return (
    <>
      <PageHeader kicker="Register" title="Activity" summary="What was changed, by whom, and when. Nothing here can be edited." />
      <ListBar><FilterBox label="Who, what or detail" value={state.q} onChange={(q) => change({ q })} /></ListBar>
      {activity.isError ? <LoadProblem what="The activity" error={activity.error} onRetry={() => void activity.refetch()} /> : (
        <DataTable caption="Activity" columns={columns} rows={activity.data?.items ?? []} rowKey={(item) => item.id} loading={activity.isPending || activity.isPlaceholderData} dense
          list={{ ...state, total: activity.data?.total ?? 0, onChange: change }}
          empty={<EmptyState title={state.q === "" ? "Nothing has happened yet" : "Nothing matches"}>{state.q === "" ? "Sign-ins, saved parts, plans and releases are listed here." : null}</EmptyState>} />
      )}
    </>
  );
}
