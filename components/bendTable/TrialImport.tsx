"use client";
import Link from "next/link";
import { useRouter } from "next/navigation";
import { ImportTable } from "@/components/ui/import/ImportTable";
import { buttonClasses } from "@/components/ui/buttonClasses";
import { PageHeader } from "@/components/ui/PageHeader";
import { useToast } from "@/components/ui/ToastProvider";
import { columnNotes } from "@/lib/csv/columnNotes";
import { importTrials, useRefreshBendTable } from "@/lib/queries/bendTable";
import { bendTrialCsv } from "@/lib/schemas/bendTrialCsv";

const columns = columnNotes(bendTrialCsv);

/** Trials out of a CSV file: what each line would do is shown before anything is written. */
export function TrialImport() {
  const router = useRouter();
  const toast = useToast();
  const refresh = useRefreshBendTable();
  return (
    <>
      <PageHeader kicker="Bend table" title="Trials from a file" summary="New trials are added. A trial that is there already stays as it was measured."
        actions={<Link href="/bend-table/trials" className={buttonClasses("plain")}>Back to the trials</Link>} />
      <ImportTable what="trials" columns={columns} run={importTrials}
        onWritten={({ counts }) => { void refresh(); toast("good", counts.add === 1 ? "1 trial added" : `${counts.add} trials added`); router.push("/bend-table/trials"); }} />
    </>
  );
}
