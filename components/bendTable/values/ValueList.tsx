"use client";
import { Download, NotebookPen } from "lucide-react";
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
import { useBendValues } from "@/lib/queries/bendTable";
import { useMaterials } from "@/lib/queries/materials";
import { valueSorts, valueStates } from "@/lib/schemas/bendTableInputs";
import { BendTableTabs } from "../BendTableTabs";
import { valueStateWords } from "../valueStates";
import { valueColumns } from "./valueColumns";

const every = "every";
const states = [every, ...valueStates] as const;

/** What the shop has measured: one line for each material, sheet, V, punch and angle. */
export function ValueList({ mayWrite }: { readonly mayWrite: boolean }) {
  const { state, change, param } = useListState({ sort: "material" });
  const materials = useMaterials();
  const material = param("material");
  const shown = oneOf(states, param("state"), every);
  const list = useBendValues({ ...state, sort: oneOf(valueSorts, state.sort, "material"), ...(material === "" ? {} : { material }), ...(shown === every ? {} : { state: shown }) });
  const narrowed = state.q !== "" || material !== "" || shown !== every;
  const enter = mayWrite ? <Link href="/bend-table/new" className={buttonClasses()}><NotebookPen aria-hidden />Enter trials</Link> : null;
  return (
    <>
      <PageHeader kicker="Register" title="Bend table" summary="The shop's own measured bends. Unless a part names a handbook rule or a K, its flat length comes from here."
        actions={<><a href="/api/bend-table/export/values" download className={buttonClasses("plain")}><Download aria-hidden />Values as CSV</a>{enter}</>} />
      <BendTableTabs />
      <ListBar>
        <FilterBox label="Material, V16, R0.8, 90°" value={state.q} onChange={(q) => change({ q })} />
        <Select id="material-filter" label="Material" labelHidden className="w-60" value={material === "" ? every : material} onChange={(value) => change({ material: value === every ? undefined : value })}
          options={[{ value: every, label: "Every material" }, ...(materials.data ?? []).map(({ id, name }) => ({ value: id, label: name }))]} />
        <Select id="state-filter" label="State" labelHidden className="w-44" value={shown} onChange={(value) => change({ state: value === every ? undefined : value })}
          options={[{ value: every, label: "Every state" }, ...valueStates.map((value) => ({ value, label: valueStateWords[value].label }))]} />
      </ListBar>
      {list.isError ? <LoadProblem what="The bend table" error={list.error} onRetry={() => void list.refetch()} /> : (
        <DataTable caption="Measured values" columns={valueColumns} rows={list.data?.items ?? []} rowKey={(value) => value.key} loading={list.isPending || list.isPlaceholderData} dense
          list={{ ...state, total: list.data?.total ?? 0, onChange: change }}
          empty={narrowed
            ? <EmptyState title="No value matches" action={<button type="button" className="font-medium text-accent-ink underline underline-offset-2" onClick={() => change({ q: "", material: undefined, state: undefined })}>Show every value</button>}>Search looks in material, sheet, V, punch radius and angle.</EmptyState>
            : <EmptyState title="Nothing measured yet" {...(enter === null ? {} : { action: enter })}>Bend a strip of known length, measure both flanges, and type it in: from then on the shop has a value of its own.</EmptyState>} />
      )}
      <p className="mt-2 max-w-prose text-sm text-ink-faint">± is the uncertainty of the mean with coverage factor 2 (about 95 %). Spread: standard deviation between trials. Too few: with fewer than three trials no outlier can be told. * not measured: the radius that the V or the punch gives.</p>
    </>
  );
}
