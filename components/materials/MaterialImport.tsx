"use client";
import { useRouter } from "next/navigation";
import { ImportTable } from "@/components/ui/import/ImportTable";
import { PageHeader } from "@/components/ui/PageHeader";
import { useToast } from "@/components/ui/ToastProvider";
import { columnNotes } from "@/lib/csv/columnNotes";
import { useImportMaterials } from "@/lib/queries/materials";
import { materialCsvColumns } from "@/lib/schemas/materialCsvColumns";

const columns = columnNotes(materialCsvColumns);

/** Materials out of a CSV table, every line's fate shown first. */
export function MaterialImport() {
  const router = useRouter();
  const toast = useToast();
  const { mutateAsync } = useImportMaterials();
  return (
    <>
      <PageHeader kicker="Materials" title="Import a table" summary="A line whose short name is known changes that material and makes a new version of it; any other adds one. A changed value whose source is not in the table counts as the shop’s own from then on." />
      <ImportTable what="materials" columns={columns} run={mutateAsync} onCancel={() => router.push("/materials")}
        onWritten={({ counts }) => { toast("good", "Materials imported", `${counts.add} added, ${counts.change} changed`); router.push("/materials"); }} />
    </>
  );
}
