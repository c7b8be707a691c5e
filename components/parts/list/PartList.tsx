"use client";
import { FileUp, Plus } from "lucide-react";
import Link from "next/link";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { DataTable } from "@/components/ui/DataTable";
import { EmptyState } from "@/components/ui/EmptyState";
import { FilterBox } from "@/components/ui/FilterBox";
import { ListBar } from "@/components/ui/ListBar";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { oneOf } from "@/components/ui/oneOf";
import { PageHeader } from "@/components/ui/PageHeader";
import { Select } from "@/components/ui/Select";
import { useListState } from "@/components/ui/useListState";
import { useMaterials } from "@/lib/queries/materials";
import { useFindingCounts } from "@/lib/queries/findingCounts";
import { usePartList } from "@/lib/queries/parts";
import { partSorts } from "@/lib/schemas/partInputs";
import { partColumns } from "./partColumns";

const every = "every";

export function PartList({ mayWrite }: { readonly mayWrite: boolean }) {
  const { state, change, param } = useListState({ sort: "updatedAt", dir: "desc" });
  const materials = useMaterials();
  const material = param("material");
  const list = usePartList({ ...state, sort: oneOf(partSorts, state.sort, "updatedAt"), ...(material === "" ? {} : { material }) });
  const counts = useFindingCounts((list.data?.items ?? []).map(({ id }) => id));
  const narrowed = state.q !== "" || material !== "";
  const add = mayWrite ? (
    <>
      <Link href="/parts/import" className={buttonClasses("plain")}><FileUp aria-hidden />Import drawings</Link>
      <Link href="/parts/new" className={buttonClasses()}><Plus aria-hidden />New part</Link>
    </>
  ) : null;
  return (
    <>
      <PageHeader kicker="Register" title="Parts" summary="Every part that the shop bends, with its newest revision." actions={add} />
      <ListBar>
        <FilterBox label="Number, name or material" value={state.q} onChange={(q) => change({ q })} />
        <Select id="material-filter" label="Material" labelHidden className="w-60" value={material === "" ? every : material} onChange={(value) => change({ material: value === every ? undefined : value })}
          options={[{ value: every, label: "Every material" }, ...(materials.data ?? []).map(({ id, name }) => ({ value: id, label: name }))]} />
      </ListBar>
      {list.isError ? <LoadProblem what="The parts" error={list.error} onRetry={() => void list.refetch()} /> : (
        <DataTable caption="Parts" columns={partColumns(counts.data)} rows={list.data?.items ?? []} rowKey={(part) => part.id} loading={list.isPending || list.isPlaceholderData}
          list={{ ...state, total: list.data?.total ?? 0, onChange: change }}
          empty={narrowed
            ? <EmptyState title="No part matches" action={<button type="button" className="font-medium text-accent-ink underline underline-offset-2" onClick={() => change({ q: "", material: undefined })}>Show every part</button>}>Search looks in numbers, names and materials.</EmptyState>
            : <EmptyState title="No part yet" {...(add === null ? {} : { action: add })}>{mayWrite ? "Begin with a shape, type its lengths, and save it." : "An engineer adds the first one."}</EmptyState>} />
      )}
    </>
  );
}
