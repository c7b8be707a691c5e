"use client";
import { Plus } from "lucide-react";
import Link from "next/link";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { Choice } from "@/components/ui/Choice";
import { DataTable } from "@/components/ui/DataTable";
import { EmptyState } from "@/components/ui/EmptyState";
import { FilterBox } from "@/components/ui/FilterBox";
import { ListBar } from "@/components/ui/ListBar";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { oneOf } from "@/components/ui/oneOf";
import { PageHeader } from "@/components/ui/PageHeader";
import { useListState } from "@/components/ui/useListState";
import { useToolList } from "@/lib/queries/tools";
import { toolSorts } from "@/lib/schemas/toolInputs";
import { toolColumns } from "./toolColumns";

const kinds = ["every", "punch", "die"] as const;

export function ToolList({ mayWrite }: { readonly mayWrite: boolean }) {
  const { state, change, param } = useListState({ sort: "code" });
  const kind = oneOf(kinds, param("kind"), "every");
  const list = useToolList({ ...state, sort: oneOf(toolSorts, state.sort, "code"), ...(kind === "every" ? {} : { kind }) });
  const add = mayWrite ? <Link href="/tools/new" className={buttonClasses()}><Plus aria-hidden />New tool</Link> : null;
  return (
    <>
      <PageHeader kicker="Register" title="Tools" summary="What the toolroom owns: every punch and die, and how much of it is in service." actions={add} />
      <ListBar>
        <FilterBox label="Code or name" value={state.q} onChange={(q) => change({ q })} />
        <Choice label="Kind" labelHidden value={kind} onChange={(value) => change({ kind: value === "every" ? undefined : value })}
          options={[{ value: "every", label: "All" }, { value: "punch", label: "Punches" }, { value: "die", label: "Dies" }]} />
      </ListBar>
      {list.isError ? <LoadProblem what="The tools" error={list.error} onRetry={() => void list.refetch()} /> : (
        <DataTable caption="Tools" columns={toolColumns} rows={list.data?.items ?? []} rowKey={(tool) => tool.code} loading={list.isPending || list.isPlaceholderData}
          list={{ ...state, total: list.data?.total ?? 0, onChange: change }}
          empty={state.q !== "" || kind !== "every"
            ? <EmptyState title="No tool matches">Search looks in codes and names.</EmptyState>
            : <EmptyState title="No tool yet" {...(add === null ? {} : { action: add })}>Without tools no plan can be made.</EmptyState>} />
      )}
    </>
  );
}
