"use client";
import { NotebookPen } from "lucide-react";
import Link from "next/link";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { EmptyState } from "@/components/ui/EmptyState";
import { ListBar } from "@/components/ui/ListBar";
import { Loading } from "@/components/ui/Loading";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { PageHeader } from "@/components/ui/PageHeader";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { useListState } from "@/components/ui/useListState";
import { useBendCoverage, useBendValues } from "@/lib/queries/bendTable";
import { useMaterials } from "@/lib/queries/materials";
import type { CoverageView } from "@/lib/schemas/bendTableViews";
import { BendTableTabs } from "../BendTableTabs";
import { CoverageGrid } from "./CoverageGrid";
import { Suggestions } from "./Suggestions";

/** Where the shop has measured, where a value is taken between two, and what to bend next. */
export function Coverage({ mayWrite }: { readonly mayWrite: boolean }) {
  const { change, param } = useListState({ sort: "material" });
  const materials = useMaterials();
  const measured = useBendValues({ pageSize: 1, sort: "trials", dir: "desc" });
  const material = param("material") || (measured.data?.items[0]?.material ?? (measured.isSuccess ? (materials.data?.[0]?.id ?? "") : ""));
  const coverage = useBendCoverage(material);
  return (
    <>
      <PageHeader kicker="Bend table" title="Coverage" summary="Sheet against V opening, at 90°: what was measured, what is taken between neighbours, and which trial is worth bending next."
        actions={mayWrite ? <Link href="/bend-table/new" className={buttonClasses()}><NotebookPen aria-hidden />Enter trials</Link> : null} />
      <BendTableTabs />
      <ListBar>
        <Select id="coverage-material" label="Material" className="w-72" value={material} onChange={(value) => change({ material: value })} placeholder="Choose a material"
          options={(materials.data ?? []).map(({ id, name }) => ({ value: id, label: name }))} />
      </ListBar>
      {coverage.isError ? <LoadProblem what="The coverage" error={coverage.error} onRetry={() => void coverage.refetch()} />
        : coverage.data === undefined ? <Loading what="the coverage" /> : <Shown coverage={coverage.data} mayWrite={mayWrite} />}
    </>
  );
}

function Shown({ coverage, mayWrite }: { readonly coverage: CoverageView; readonly mayWrite: boolean }) {
  if (coverage.rows.length === 0) return <EmptyState title={`Nothing of ${coverage.material} yet`}>Neither a trial nor a part is of this material.</EmptyState>;
  return (
    <div className="grid grid-cols-1 gap-x-10 gap-y-8 2xl:grid-cols-[minmax(0,1fr)_minmax(0,30rem)]">
      <CoverageGrid coverage={coverage} />
      <Panel title="Worth bending next"><Suggestions coverage={coverage} mayWrite={mayWrite} /></Panel>
    </div>
  );
}
