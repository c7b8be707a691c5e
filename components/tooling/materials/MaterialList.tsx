"use client";
import { useState } from "react";
import type { MaterialFacts } from "@/bending/handbook/material";
import { DataTable, type Column } from "@/components/ui/DataTable";
import { EmptyState } from "@/components/ui/EmptyState";
import { FilterBox } from "@/components/ui/FilterBox";
import { ListBar } from "@/components/ui/ListBar";
import { LoadProblem } from "@/components/ui/LoadProblem";
import { PageHeader } from "@/components/ui/PageHeader";
import { formatNumber } from "@/lib/format/formatNumber";
import { useMaterials } from "@/lib/queries/materials";

const number = (value: number, digits = 0) => <span className="num">{formatNumber(value, digits)}</span>;

const columns: readonly Column<MaterialFacts>[] = [
  { key: "id", header: "Short name", rowHeader: true, className: "whitespace-nowrap", cell: (material) => <span className="font-medium">{material.id}</span> },
  { key: "name", header: "Name", cell: (material) => material.name },
  { key: "group", header: "Group", cell: (material) => material.group },
  { key: "tensile", header: "Tensile, MPa", align: "right", cell: (material) => <span className="num whitespace-nowrap">{material.tensile[0]} to {material.tensile[1]}</span> },
  { key: "yield", header: "Yield, MPa", align: "right", cell: (material) => number(material.yield) },
  { key: "modulus", header: "Modulus, GPa", align: "right", cell: (material) => number(material.modulus / 1000, 1) },
  { key: "density", header: "Density, kg/m³", align: "right", cell: (material) => number(material.density) },
  { key: "radius", header: "Natural radius / V", align: "right", cell: (material) => number(material.naturalRadiusRatio, 3) },
  { key: "default", header: "Usual radius / t", align: "right", cell: (material) => number(material.defaultRadiusPerThickness, 2) },
  { key: "straight", header: "Straight length", cell: (material) => material.straightLengthGroup },
  { key: "source", header: "Source", className: "min-w-56 text-sm text-ink-soft", cell: (material) => <>{material.standard}. {material.origins.tensile.text}</> },
];

/** The materials with every value that the formulas use, and where it was taken from. */
export function MaterialList() {
  const materials = useMaterials();
  const [q, setQ] = useState("");
  const words = q.toLowerCase().split(/\s+/).filter((word) => word !== "");
  const rows = (materials.data ?? []).filter((material) => words.every((word) => `${material.id} ${material.name} ${material.group} ${material.standard}`.toLowerCase().includes(word)));
  return (
    <>
      <PageHeader kicker="Register" title="Materials" summary="What the formulas know of each material. The certificate of the sheet in hand decides." />
      <ListBar><FilterBox label="Name, group or standard" value={q} onChange={setQ} /></ListBar>
      {materials.isError ? <LoadProblem what="The materials" error={materials.error} onRetry={() => void materials.refetch()} /> : (
        <DataTable caption="Materials" columns={columns} rows={rows} rowKey={(material) => material.id} loading={materials.isPending} dense
          empty={<EmptyState title={q === "" ? "No material yet" : "No material matches"} />} />
      )}
    </>
  );
}
