"use client";
import { Download, FileUp, Plus } from "lucide-react";
import Link from "next/link";
import { useState } from "react";
import { Choice } from "@/components/ui/Choice";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { EmptyState } from "@/components/ui/EmptyState";
import { FilterBox } from "@/components/ui/FilterBox";
import { ListBar } from "@/components/ui/ListBar";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { PageHeader } from "@/components/ui/PageHeader";
import { StateMark } from "@/components/ui/StateMark";
import { TextLink } from "@/components/ui/TextLink";
import { formatNumber } from "@/lib/format/formatNumber";
import { materialsTablePath, useMaterials } from "@/lib/queries/materials";
import type { MaterialView } from "@/lib/schemas/materialViews";
import { sortMaterials, type MaterialSort } from "./sortMaterials";

const number = (value: number, digits = 0) => <span className="num">{formatNumber(value, digits)}</span>;

const columns: readonly Column<MaterialView>[] = [
  { key: "id", header: "Short name", rowHeader: true, sortable: true, className: "whitespace-nowrap", cell: ({ id, withdrawn }) => <span className="inline-flex items-center gap-2"><TextLink href={`/materials/${encodeURIComponent(id)}`}>{id}</TextLink>{withdrawn === null ? null : <StateMark tone="off">withdrawn</StateMark>}</span> },
  { key: "name", header: "Name", sortable: true, cell: ({ name }) => name },
  { key: "group", header: "Group", sortable: true, cell: ({ group }) => group },
  { key: "standard", header: "Standard", sortable: true, className: "whitespace-nowrap", cell: ({ standard }) => standard },
  { key: "tensile", header: "Tensile, MPa", align: "right", sortable: true, cell: ({ tensile }) => <span className="num whitespace-nowrap">{tensile[0]} to {tensile[1]}</span> },
  { key: "yield", header: "Yield, MPa", align: "right", sortable: true, cell: (material) => number(material.yield) },
  { key: "modulus", header: "Modulus, GPa", align: "right", sortable: true, cell: ({ modulus }) => number(modulus / 1000, 1) },
  { key: "density", header: "Density, kg/m³", align: "right", sortable: true, cell: ({ density }) => number(density) },
  { key: "naturalRadiusRatio", header: "Natural radius / V", align: "right", sortable: true, cell: (material) => number(material.naturalRadiusRatio, 3) },
  { key: "version", header: "Version", align: "right", sortable: true, cell: ({ version }) => number(version) },
  { key: "changedAt", header: "Changed", sortable: true, className: "whitespace-nowrap", cell: ({ changedAt, changedBy }) => <><span className="num">{changedAt.slice(0, 10)}</span> <span className="text-ink-soft">{changedBy}</span></> },
];

/** The materials with the values that are asked for most; each has a page with all of them, their sources and versions. */
export function MaterialList({ mayWrite }: { readonly mayWrite: boolean }) {
  const materials = useMaterials();
  const [q, setQ] = useState("");
  const [shown, setShown] = useState<"used" | "withdrawn" | "all">("used");
  const [order, setOrder] = useState<MaterialSort>({ sort: "id", dir: "asc", page: 1 });
  const words = q.toLowerCase().split(/\s+/).filter((word) => word !== "");
  const found = (materials.data ?? []).filter(({ id, name, group, standard, designation, withdrawn }) =>
    (shown === "all" || (shown === "withdrawn") === (withdrawn !== null)) && words.every((word) => `${id} ${name} ${group} ${standard} ${designation}`.toLowerCase().includes(word)));
  const rows = sortMaterials(found, order);
  const filter = (act: () => void) => { act(); setOrder((old) => ({ ...old, page: 1 })); };
  return (
    <>
      <PageHeader kicker="Register" title="Materials" summary="What the formulas know of each material. The certificate of the sheet in hand decides." actions={<Actions mayWrite={mayWrite} />} />
      <ListBar>
        <FilterBox label="Name, group or standard" value={q} onChange={(next) => filter(() => setQ(next))} />
        <Choice label="Shown" labelHidden value={shown} onChange={(next) => filter(() => setShown(next))} options={[{ value: "used", label: "In use" }, { value: "withdrawn", label: "Withdrawn" }, { value: "all", label: "All" }]} />
      </ListBar>
      {materials.isError ? <LoadProblem what="The materials" error={materials.error} onRetry={() => void materials.refetch()} /> : (
        <DataTable caption="Materials" columns={columns} rows={rows.slice((order.page - 1) * PAGE, order.page * PAGE)} rowKey={({ id }) => id} loading={materials.isPending} dense
          list={{ q, sort: order.sort, dir: order.dir, page: order.page, pageSize: PAGE, total: rows.length, onChange: (change) => setOrder((old) => ({ sort: change.sort ?? old.sort, dir: change.dir ?? old.dir, page: change.page ?? 1 })) }}
          empty={<EmptyState title={q === "" && shown === "used" ? "No material yet" : "No material matches"} />} />
      )}
    </>
  );
}

const PAGE = 50;

function Actions({ mayWrite }: { readonly mayWrite: boolean }) {
  return (
    <>
      <a href={materialsTablePath("comma")} download className={buttonClasses("plain")}><Download aria-hidden />CSV</a>
      <a href={materialsTablePath("semicolon")} download className={buttonClasses("plain")}><Download aria-hidden />CSV with decimal commas</a>
      {mayWrite ? <Link href="/materials/import" className={buttonClasses("plain")}><FileUp aria-hidden />Import</Link> : null}
      {mayWrite ? <Link href="/materials/new" className={buttonClasses()}><Plus aria-hidden />Add a material</Link> : null}
    </>
  );
}
