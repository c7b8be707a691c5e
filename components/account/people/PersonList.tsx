"use client";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { EmptyState } from "@/components/ui/EmptyState";
import { FilterBox } from "@/components/ui/FilterBox";
import { ListBar } from "@/components/ui/ListBar";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { PageHeader } from "@/components/ui/PageHeader";
import { StateMark } from "@/components/ui/StateMark";
import { oneOf } from "@/components/ui/oneOf";
import { useListState } from "@/components/ui/useListState";
import { usePeople } from "@/lib/queries/people";
import { peopleSorts } from "@/lib/schemas/peopleQuery";
import type { PersonItem } from "@/lib/schemas/views";

const does: Readonly<Record<PersonItem["role"], string>> = {
  engineer: "defines parts, plans, releases setup sheets",
  operator: "works from released sheets at the brake",
  toolroom: "keeps the tools and where they lie",
  manager: "sees everything, and who does what",
};

const columns: readonly Column<PersonItem>[] = [
  { key: "name", header: "Name", sortable: true, rowHeader: true, cell: (person) => <span className="font-medium">{person.name}</span> },
  { key: "email", header: "E-mail", sortable: true, cell: (person) => person.email },
  { key: "role", header: "Role", sortable: true, cell: (person) => <>{person.role}<span className="block text-sm text-ink-faint">{does[person.role]}</span></> },
  { key: "active", header: "Account", cell: (person) => (person.active ? <StateMark tone="good">on</StateMark> : <StateMark tone="off">switched off</StateMark>) },
];

export function PersonList() {
  const { state, change } = useListState({ sort: "name" });
  const people = usePeople({ ...state, sort: oneOf(peopleSorts, state.sort, "name") });
  return (
    <>
      <PageHeader kicker="Register" title="People" summary="Who can sign in, and for what work." />
      <ListBar><FilterBox label="Name or e-mail" value={state.q} onChange={(q) => change({ q })} /></ListBar>
      {people.isError ? <LoadProblem what="The people" error={people.error} onRetry={() => void people.refetch()} /> : (
        <DataTable caption="People" columns={columns} rows={people.data?.items ?? []} rowKey={(person) => person.id} loading={people.isPending || people.isPlaceholderData}
          list={{ ...state, total: people.data?.total ?? 0, onChange: change }} empty={<EmptyState title="Nobody matches">Search looks in names and e-mail addresses.</EmptyState>} />
      )}
    </>
  );
}
