"use client";
import { Download, FileUp, NotebookPen } from "lucide-react";
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
import { useBendTrials } from "@/lib/queries/bendTable";
import { useMaterials } from "@/lib/queries/materials";
import { trialSorts, trialStates } from "@/lib/schemas/bendTableInputs";
import type { TrialView } from "@/lib/schemas/bendTableViews";
import { BendTableTabs } from "../BendTableTabs";
import { TrialActions } from "../TrialActions";
import { trialStateWords } from "../valueStates";
import { trialColumns } from "./trialColumns";

const every = "every";
const states = [every, ...trialStates] as const;
const act = { key: "act", header: "", cell: (trial: TrialView) => <TrialActions trial={trial} /> };

/** Every trial that was ever entered; those that do not count say why. */
export function TrialList({ mayWrite, mayJudge }: { readonly mayWrite: boolean; readonly mayJudge: boolean }) {
  const { state, change, param } = useListState({ sort: "number", dir: "desc" });
  const materials = useMaterials();
  const material = param("material");
  const shown = oneOf(states, param("state"), every);
  const list = useBendTrials({ ...state, sort: oneOf(trialSorts, state.sort, "number"), ...(material === "" ? {} : { material }), ...(shown === every ? {} : { state: shown }) });
  const narrowed = state.q !== "" || material !== "" || shown !== every;
  const enter = mayWrite ? <Link href="/bend-table/new" className={buttonClasses()}><NotebookPen aria-hidden />Enter trials</Link> : null;
  return (
    <>
      <PageHeader kicker="Bend table" title="Trials" summary="Every bent and measured strip, also those that do not count. Lengths in mm."
        actions={<>
          <a href="/api/bend-table/export/trials" download className={buttonClasses("plain")}><Download aria-hidden />Trials as CSV</a>
          {mayWrite ? <Link href="/bend-table/import" className={buttonClasses("plain")}><FileUp aria-hidden />From a file</Link> : null}
          {enter}
        </>} />
      <BendTableTabs />
      <ListBar>
        <FilterBox label="Trial, batch, who or note" value={state.q} onChange={(q) => change({ q })} />
        <Select id="material-filter" label="Material" labelHidden className="w-60" value={material === "" ? every : material} onChange={(value) => change({ material: value === every ? undefined : value })}
          options={[{ value: every, label: "Every material" }, ...(materials.data ?? []).map(({ id, name }) => ({ value: id, label: name }))]} />
        <Select id="state-filter" label="State" labelHidden className="w-44" value={shown} onChange={(value) => change({ state: value === every ? undefined : value })}
          options={[{ value: every, label: "Every state" }, ...trialStates.map((value) => ({ value, label: trialStateWords[value].label }))]} />
      </ListBar>
      {list.isError ? <LoadProblem what="The trials" error={list.error} onRetry={() => void list.refetch()} /> : (
        <DataTable caption="Trials" columns={mayJudge ? [...trialColumns, act] : trialColumns} rows={list.data?.items ?? []} rowKey={({ id }) => id} loading={list.isPending || list.isPlaceholderData} dense
          list={{ ...state, total: list.data?.total ?? 0, onChange: change }}
          empty={narrowed
            ? <EmptyState title="No trial matches">Search looks in numbers, materials, batches, who measured and notes.</EmptyState>
            : <EmptyState title="No trial yet" {...(enter === null ? {} : { action: enter })}>Bend a strip of known length, measure it, and type it in.</EmptyState>} />
      )}
    </>
  );
}
